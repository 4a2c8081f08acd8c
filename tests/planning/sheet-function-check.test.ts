import { describe, expect, it } from 'vitest';
import { figures } from '@/lib/sheet/figures';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { CheckItem, Layout } from '@/standards/types';
import { judged, orderOf, outcomeOf, ownDefinition, reasonOf } from './data/own-sheet';

const items: CheckItem[] = [
  { id: 'stop', question: 'Every emergency stop stops all movement' },
  { id: 'air', question: 'Air pressure holds', value: { label: 'pressure', unit: 'bar', lower: '5', upper: '7' } },
  { id: 'hours', question: 'The hour meter counts', value: { label: 'hours', unit: 'h' } },
];
const layout: Layout = { kind: 'check-list', items };
const definition = ownDefinition('function-check', layout, { shownIn: 'items' });
const good = {
  '/items/stop/answer': 'yes',
  '/items/air/answer': 'yes',
  '/items/air/value': '6,2',
  '/items/hours/answer': 'yes',
};

describe('function check', () => {
  it('asks item by item, and for a figure where it has limits', () => {
    expect(orderOf(definition, {})).toEqual([
      '/items/stop/answer',
      '/items/air/answer',
      '/items/air/value',
      '/items/hours/answer',
    ]);
    const roles = new Map(allFields(sheetFields(definition, {})).map(({ pointer, role }) => [pointer, role]));
    expect(
      ['/items/air/value', '/items/hours/value', '/items/stop/remark'].map((pointer) => roles.get(pointer)),
    ).toEqual(['reading', 'set-up', 'set-up']);
  });

  it('is in order when every item is', () => {
    const outcome = judged(outcomeOf(definition, { ...good, '/items/stop/remark': 'six of them' }));
    expect([outcome.state, outcome.filled, outcome.total]).toEqual(['complete', 4, 4]);
    expect(outcome.judgement).toMatchObject({ verdict: 'within-tolerance', toleranceUm: null });
    expect(outcome.displayed).toEqual({ textUm: '0', textMm: '0', extraDigits: 0, unit: 'items' });
    expect(outcome.input).toBeNull();
    expect(outcome.result).toMatchObject({ method: 'function-check', deviation: '0', notFitted: 0 });
    expect(figures(outcome)).toEqual([{ label: 'items in order', value: '3 of 3' }]);
  });

  it('counts a no, and a yes whose figure is outside its limits', () => {
    const no = judged(outcomeOf(definition, { ...good, '/items/stop/answer': 'no' }));
    expect([no.result.deviation, no.judgement.verdict]).toEqual(['1', 'out-of-tolerance']);
    for (const [figure, deviation] of [
      ['4.99', '1'],
      ['5', '0'],
      ['7.0', '0'],
      ['7,01', '1'],
    ] as const) {
      const outcome = judged(outcomeOf(definition, { ...good, '/items/air/value': figure }));
      expect(outcome.result.deviation).toBe(deviation);
      expect(outcome.result).toMatchObject({ items: { 1: { withinLimits: deviation === '0' } } });
    }
  });

  it('keeps a figure that has no limits as it is', () => {
    const { result } = judged(outcomeOf(definition, { ...good, '/items/hours/value': '38412' }));
    expect(result).toMatchObject({ items: { 2: { value: '38412', withinLimits: null, inOrder: true } } });
  });

  it('neither counts nor asks further for what is not fitted', () => {
    const outcome = judged(
      outcomeOf(definition, { ...good, '/items/air/answer': 'not-fitted', '/items/air/value': '' }),
    );
    expect([outcome.state, outcome.filled, outcome.total]).toEqual(['complete', 3, 3]);
    expect(outcome.result).toMatchObject({ deviation: '0', notFitted: 1, items: { 1: { inOrder: null } } });
    expect(figures(outcome)).toContainEqual({ label: 'not fitted', value: '1' });
  });

  it('says how many items are answered', () => {
    const { '/items/hours/answer': _, ...two } = good;
    const outcome = judged(outcomeOf(definition, two));
    expect([outcome.state, outcome.basedOn]).toEqual(['partial', 'by 2 of 3 items']);
    const noFigure = judged(outcomeOf(definition, { ...good, '/items/air/value': '' }));
    expect([noFigure.state, noFigure.basedOn]).toEqual(['partial', 'by 2 of 3 items']);
  });

  it('stops at a figure that cannot be read, and at an answer that is none', () => {
    expect(reasonOf(outcomeOf(definition, { ...good, '/items/air/value': '6 mm' }))).toMatch(/understood in bar/);
    expect(reasonOf(outcomeOf(definition, { ...good, '/items/stop/answer': 'perhaps' }))).toMatch(/Choose one of/);
    expect(outcomeOf(definition, {}).state).toBe('empty');
  });
});
