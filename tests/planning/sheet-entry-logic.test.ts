import { describe, expect, it } from 'vitest';
import { inColumn, nextField, spreadPaste } from '@/components/sheet/cell-path';
import { fitsKind } from '@/components/sheet/fits-kind';
import { KeyBurst } from '@/components/sheet/key-burst';
import { distanceWords, isJudged, resultWords } from '@/components/sheet/result-words';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, SheetRules } from '@/lib/sheet/types';
import { currentDefinitions } from '@/standards/registry';
import type { Direction } from '@/standards/types';

const definitionOf = (id: string) => currentDefinitions().find((one) => one.id === id)!;
const cells = (texts: Record<string, string>): Cells =>
  Object.fromEntries(Object.entries(texts).map(([pointer, text]) => [pointer, { text, unit: null }]));

const mandrel = cells({ '/positions/0': '30', '/positions/1': '150', '/positions/2': '270' });
const fields = sheetFields(definitionOf('AX-1a'), mandrel);

describe('Enter', () => {
  const filled = () => false;
  it('goes down the first angle, then on to the next', () => {
    expect(nextField(fields, '/readings/0/1', 1, filled)).toBe('/readings/0/2');
    expect(nextField(fields, '/readings/0/2', 1, filled)).toBe('/readings/180/0');
    expect(nextField(fields, '/readings/180/0', -1, filled)).toBe('/readings/0/2');
  });
  it('ends at the last reading', () => {
    expect(nextField(fields, '/readings/180/2', 1, filled)).toBeNull();
    expect(nextField(fields, '/readings/0/0', -1, filled)).toBeNull();
  });
  it('leads from the set-up to the first reading that is empty', () => {
    expect(nextField(fields, '/positions/3', 1, (pointer) => pointer === '/readings/0/2')).toBe('/readings/0/2');
    expect(nextField(fields, '/positions/0', 1, filled)).toBe('/positions/1');
  });
});

describe('arrows', () => {
  it('stay in the column', () => {
    expect(inColumn(fields, '/readings/0/1', 1)).toBe('/readings/0/2');
    expect(inColumn(fields, '/readings/180/1', -1)).toBe('/readings/180/0');
    expect(inColumn(fields, '/readings/0/0', -1)).toBeNull();
  });
  it('go on in the next table', () => {
    const pairs = sheetFields(definitionOf('PO-B'), {});
    expect(inColumn(pairs, '/places/0/pairs/6/backward', 1)).toBe('/places/1/pairs/0/backward');
    expect(inColumn(pairs, '/places/1/pairs/0/forward', -1)).toBe('/places/0/pairs/6/forward');
  });
});

describe('a pasted column', () => {
  it('is left to the browser when it is one value', () => {
    expect(spreadPaste(fields, '/readings/0/0', '1,25\n')).toBeNull();
  });
  it('fills along the order taken, commas being decimal marks', () => {
    expect(spreadPaste(fields, '/readings/0/1', '1,5\r\n2,5\r\n3,5\r\n')?.fills).toEqual([
      { pointer: '/readings/0/1', text: '1,5' },
      { pointer: '/readings/0/2', text: '2,5' },
      { pointer: '/readings/180/0', text: '3,5' },
    ]);
  });
  it('drops no value in silence', () => {
    const spread = spreadPaste(fields, '/readings/180/2', '1\n2\n3');
    expect(spread?.fills).toHaveLength(1);
    expect(spread?.left).toEqual(['2', '3']);
  });
  it('lays a block to the right as well', () => {
    expect(spreadPaste(fields, '/readings/0/0', '1\t2\n3\t4')?.fills).toEqual([
      { pointer: '/readings/0/0', text: '1' },
      { pointer: '/readings/180/0', text: '2' },
      { pointer: '/readings/0/1', text: '3' },
      { pointer: '/readings/180/1', text: '4' },
    ]);
  });
});

describe('an instrument that types', () => {
  const typed = (steps: number[], repeated = false) => {
    const burst = new KeyBurst();
    let at = 1000;
    for (const step of [0, ...steps]) {
      at += step;
      burst.key(at, repeated);
    }
    return burst.isDevice();
  };
  it.each([5, 10, 20])('is known by its steps of %i ms', (step) => {
    expect(typed(Array.from({ length: 5 }, () => step))).toBe(true);
  });
  it('is not a hand, not a held-down key, and not one key', () => {
    expect(typed([90, 110, 80, 120])).toBe(false);
    expect(typed([33, 33, 33, 33], true)).toBe(false);
    expect(typed([])).toBe(false);
  });
});

describe('words beside the limit rule', () => {
  const judge = (readings: [string, string, string], direction: Direction) => {
    const definition = definitionOf('AX-1a');
    const rules: SheetRules = {
      definition: { id: 'AX-1a', code: definition.code, edition: definition.edition, version: definition.version },
      tolerance: { baseUm: '10', foundBy: 'test', provenance: { kind: 'contract', text: 'test' } },
      direction,
      decisionRule: 'simple',
    };
    const taken = readings.flatMap((text, row) => [
      [`/readings/0/${row}`, text],
      [`/readings/180/${row}`, text],
    ]);
    const outcome = judgeSheet(rules, definition, { ...mandrel, ...cells(Object.fromEntries(taken)) });
    if (!isJudged(outcome)) throw new Error(`not judged: ${outcome.state}`);
    return outcome;
  };
  it('subtract the result as it is shown', () => {
    expect(distanceWords(judge(['0', '2', '4'], 'either'))).toBe('0.0060 to the limit');
    expect(distanceWords(judge(['0', '6', '12'], 'either'))).toBe('0.0020 beyond the limit');
    expect(distanceWords(judge(['0', '5', '10'], 'either'))).toBe('at the limit');
  });
  it('tell the forbidden side of a one-sided limit', () => {
    expect(distanceWords(judge(['0', '-1', '-2'], 'toward-tool'))).toBe('0.0020 on the side that is not allowed');
    expect(distanceWords(judge(['0', '1', '2'], 'toward-tool'))).toBe('0.0020 to zero, the other side is not allowed');
  });
  it('say what a partial result rests on, and why there is none', () => {
    const definition = definitionOf('AX-1a');
    const rules = judge(['0', '2', '4'], 'either');
    expect(resultWords(rules).verdict).toBe('within tolerance');
    const begun = judgeSheet(
      { definition: { ...definition }, tolerance: null, direction: 'either', decisionRule: 'simple' },
      definition,
      { ...mandrel, ...cells({ '/readings/0/0': '1' }) },
    );
    expect(resultWords(begun)).toMatchObject({ mark: 'not-measured', verdict: '1 of 6 readings' });
  });
});

it('a dial indicator is an indicator, an indicator stand is not', () => {
  expect(fitsKind('dial indicator', ['indicator', 'test mandrel'])).toBe(true);
  expect(fitsKind('test mandrel', ['indicator', 'test mandrel'])).toBe(true);
  expect(fitsKind('indicator stand', ['indicator'])).toBe(false);
});
