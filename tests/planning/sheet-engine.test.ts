import { describe, expect, it } from 'vitest';
import { planSheets } from '@/lib/planning/plan-sheets';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { mandrelSagCells } from '@/lib/sheet/mandrel-sag-cells';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, SheetOutcome, SheetRules } from '@/lib/sheet/types';
import { findDefinition } from '@/standards/registry';
import { newestDefinitions } from './data/newest-definitions';
import { workedMachine } from './data/worked-machine';

const plan = planSheets(workedMachine, newestDefinitions);

function sheet(key: string) {
  const planned = plan.find((one) => one.key === key)!;
  const { id, code, edition, version } = planned.definition;
  const definition = findDefinition(id, code, edition, version)!;
  const rules: SheetRules = { ...planned, decisionRule: 'simple' };
  const cells = (readings: Record<string, string>): Cells => ({
    ...planned.setUp,
    ...Object.fromEntries(Object.entries(readings).map(([pointer, text]) => [pointer, { text, unit: null }])),
  });
  const outcome = (readings: Record<string, string>, change: Partial<SheetRules> = {}): SheetOutcome =>
    judgeSheet({ ...rules, ...change }, definition, cells(readings));
  return { planned, definition, rules, cells, outcome };
}

const list = (prefix: string, texts: string[]) => Object.fromEntries(texts.map((text, k) => [`${prefix}/${k}`, text]));
const judged = (outcome: SheetOutcome) => {
  if (outcome.state !== 'partial' && outcome.state !== 'complete') throw new Error(JSON.stringify(outcome));
  return outcome;
};

describe('missing is never read as 0', () => {
  const { outcome } = sheet('AX-1a:Z1:S1');
  const first = list('/readings/0', ['0', '3', '5', '9', '11']);

  it('leaves out a position that lacks a reading, and says so', () => {
    const { '/readings/180/2': _, ...second } = list('/readings/180', ['4', '5', '4', '5', '5']);
    const result = judged(outcome({ ...first, ...second }));
    expect([result.state, result.basedOn, result.filled, result.total]).toEqual([
      'partial',
      'by 4 of 5 positions',
      9,
      10,
    ]);
    expect(result.input).toMatchObject({ positions: ['30', '90', '210', '270'] });
  });

  it('scales the tolerance with the positions that count', () => {
    const { '/readings/180/4': _, ...second } = list('/readings/180', ['4', '5', '4', '5', '5']);
    const { judgement } = judged(outcome({ ...first, ...second }));
    expect(judgement.toleranceArithmetic).toBe('15·180/300 = 9, above the floor of 5');
    expect(judgement.toleranceUm).toBe('9');
  });

  it('waits for the other angle', () => {
    expect(outcome(first)).toMatchObject({
      state: 'not-yet',
      reason: 'The readings with the spindle at 180° are still to be taken.',
      plot: { points: { length: 5 } },
    });
  });

  it('uses no reading without a position, and closes the gap', () => {
    const second = list('/readings/180', ['4', '5', '4', '5', '5']);
    const result = judged(outcome({ ...first, ...second, '/positions/1': '' }));
    expect(result.input).toMatchObject({
      positions: ['30', '150', '210', '270'],
      readings: { '0': ['0', '5', '9', '11'] },
    });
  });

  it('drops a turn that was not finished', () => {
    const bore = sheet('SP-2a:S1');
    const turn = (k: number, n: number) =>
      list(`/insertions/${k}/readings`, ['0', '1', '2', '3', '2', '1', '0', '1'].slice(0, n));
    const result = judged(bore.outcome({ ...turn(0, 8), ...turn(1, 8), ...turn(2, 5) }));
    expect([result.state, result.basedOn]).toEqual(['partial', 'by 2 of 4 insertions']);
    expect(bore.outcome(turn(0, 7))).toMatchObject({
      state: 'not-yet',
      reason: 'A whole turn is needed: 7 of 8 angles are read so far.',
    });
  });

  it('takes a turn whose closing reading is missing, and asks when it does not close', () => {
    const nose = sheet('SP-1a:S1');
    const turn = ['0', '1', '2', '3', '2', '1', '0', '1'];
    const open = judged(nose.outcome(list('/insertions/0/readings', turn)));
    expect([open.state, open.basedOn]).toEqual(['partial', 'without the closing reading']);
    const drifted = judged(nose.outcome(list('/insertions/0/readings', [...turn, '1'])));
    expect(drifted.problems).toMatchObject([{ pointer: '/insertions/0/readings/8', severity: 'unusual' }]);
    expect(judged(nose.outcome(list('/insertions/0/readings', [...turn, '0,8']))).problems).toEqual([]);
  });

  it('judges lost motion by the pairs that are whole', () => {
    const z = sheet('PO-B:Z1');
    const result = judged(
      z.outcome({
        '/places/3/pairs/0/forward': '1',
        '/places/3/pairs/0/backward': '0',
        '/places/0/pairs/0/forward': '9',
      }),
    );
    expect(result.basedOn).toBe('by 1 of 42 pairs');
    expect(result.input).toMatchObject({ places: [{ feed: 'rapid', place: 'near end' }] });
    expect(result.judgement).toMatchObject({ verdict: 'for-information', toleranceUm: null, limitUm: null });
  });
});

describe('what was typed', () => {
  const straight = sheet('AX-5:Z1:ZX');
  const readings = (texts: string[]) => Object.fromEntries(texts.map((text, k) => [`/points/${k}/reading`, text]));

  it('converts units, typed or of the column', () => {
    const cells = straight.cells(readings(['0', '-0,6', '0,0008 mm', '2.6']));
    cells['/points/3/reading'] = { text: '0.0026', unit: 'mm' };
    const result = judged(judgeSheet(straight.rules, straight.definition, cells));
    expect(result.input).toMatchObject({
      points: [{ reading: '0' }, { reading: '-0.6' }, { reading: '0.8' }, { reading: '2.6' }],
    });
    expect(result.basedOn).toBe('by 4 of 11 positions');
  });

  it.each([
    ['1.2.3', /^Reading at position 50 mm: /],
    ['5 °C', /°C does not fit here\. Write it in mm or µm or in\./],
  ])('stops at %s, with the field named', (text, message) => {
    const outcome = straight.outcome(readings(['0', text, '1', '2']));
    if (outcome.state !== 'not-yet') throw new Error(outcome.state);
    expect(outcome.reason).toMatch(message);
    expect(outcome.problems).toMatchObject([{ pointer: '/points/1/reading', severity: 'cannot-read' }]);
  });

  it('asks about a reading far from its neighbours, and about inches', () => {
    const far = judged(straight.outcome(readings(['0', '1', '2', '250', '1'])));
    expect(far.problems).toMatchObject([{ pointer: '/points/3/reading', severity: 'unusual' }]);
    const inch = judged(straight.outcome(readings(['2', '2', '50,8', '2', '2'])));
    expect(inch.problems[0]?.message).toMatch(/inches/);
    expect(judged(straight.outcome(readings(['2', '2', '4', '1', '2']))).problems).toEqual([]);
  });

  it('says in words why an input is not taken', () => {
    const twice = straight.outcome({ ...readings(['0', '1', '2']), '/points/1/position': '0' });
    expect(twice).toMatchObject({ state: 'not-yet' });
    expect((twice as { reason: string }).reason).toMatch(/position/i);
  });

  it('offers one empty row more after the last, and orders only rows with a position', () => {
    const { definition, planned } = straight;
    const rows = (cells: Cells) => sheetFields(definition, cells).tables[0]!.rows.length;
    expect(rows(planned.setUp)).toBe(12);
    expect(sheetFields(definition, planned.setUp).order).toHaveLength(11);
    const grown: Cells = { ...planned.setUp, '/points/11/position': { text: '510', unit: 'mm' } };
    expect(rows(grown)).toBe(13);
    expect(sheetFields(definition, grown).order.at(-1)).toBe('/points/11/reading');
    expect(rows({})).toBe(1);
  });

  it('goes down the positions at the first angle, then at the next', () => {
    const { definition, planned } = sheet('AX-2:X1:S1');
    const { order } = sheetFields(definition, planned.setUp);
    expect(order.slice(3, 6)).toEqual(['/readings/0/3', '/readings/180/0', '/readings/180/1']);
  });

  it('takes either form of a tool hole, and no other choice', () => {
    const hole = sheet('TU-3:T1:S1');
    const heights = { '/form': 'heights', '/toolHeight': '0,0136 mm', '/spindleHeight': '14' };
    expect(judged(hole.outcome(heights)).displayed).toEqual({ textUm: '0', textMm: '0.000', extraDigits: 0 });
    const sweep = { '/sweep/0': '73', '/sweep/90': '100', '/sweep/180': '27', '/sweep/270': '-1' };
    const noSag = judged(hole.outcome(sweep));
    expect(noSag.problems).toMatchObject([{ pointer: '/sag', severity: 'unusual' }]);
    expect(noSag.displayed.textUm).toBe('-50.5');
    expect(hole.outcome({ ...sweep, '/form': 'guess' })).toMatchObject({ state: 'not-yet' });
  });
});

describe('verdict', () => {
  const cross = sheet('AX-2:X1:S1');
  const readings = (outer: string) => ({
    ...list('/readings/0', ['0', '0', '0', outer]),
    ...list('/readings/180', ['0', '0', '0', outer]),
  });

  it('allows a concave face only, and shows why a hair of convex is out', () => {
    expect(judged(cross.outcome(readings('-2'))).judgement.verdict).toBe('within-tolerance');
    const convex = judged(cross.outcome(readings('0.1')));
    expect(convex.judgement.verdict).toBe('out-of-tolerance');
    expect(convex.displayed).toEqual({ textUm: '-0.09', textMm: '-0.00009', extraDigits: 1 });
    expect(convex.directionWords).toBe('convex');
  });

  it('follows the direction of the sheet, not of the catalogue', () => {
    expect(judged(cross.outcome(readings('0.1'), { direction: 'either' })).judgement.verdict).toBe('within-tolerance');
  });

  it('guards the limit by the uncertainty, and decides nothing without one', () => {
    const guarded = { decisionRule: 'guarded' as const };
    expect(judged(cross.outcome(readings('-2'), guarded)).judgement).toMatchObject({
      verdict: 'undecided',
      limitUm: null,
    });
    const close = judged(cross.outcome(readings('-6'), { ...guarded, standardUncertaintyUm: '2' })).judgement;
    expect(close).toMatchObject({ verdict: 'undecided', limitUm: '2.7' });
    expect(judged(cross.outcome(readings('-2'), { ...guarded, standardUncertaintyUm: '1' })).judgement.verdict).toBe(
      'within-tolerance',
    );
  });

  it('lets the worse of the whole and the local limit count', () => {
    const straight = sheet('AX-5:Z1:ZX');
    const texts = ['0', '0', '0', '0', '7', '0', '0', '0', '0', '0', '0'];
    const { judgement } = judged(
      straight.outcome(Object.fromEntries(texts.map((text, k) => [`/points/${k}/reading`, text]))),
    );
    expect(judgement.local).toMatchObject({
      deviationUm: '7',
      toleranceUm: '6',
      lengthMm: '300',
      verdict: 'out-of-tolerance',
    });
    expect(judgement.marginUm).toBe('3');
    expect(judgement.verdict).toBe('out-of-tolerance');
  });

  it('caps a tolerance at its maximum', () => {
    const { planned } = cross;
    const perLength = { baseLengthMm: '30', minimumUm: '5', maximumUm: '30' };
    const tolerance = { ...planned.tolerance!, perLength };
    expect(judged(cross.outcome(readings('-2'), { tolerance })).judgement).toMatchObject({
      toleranceUm: '30',
      toleranceArithmetic: '20·90/30 = 60, cut to the most of 30',
    });
  });
});

it('proposes the sag of a mandrel at each position', () => {
  const { planned } = sheet('AX-1b:Z1:S1');
  const proposed = mandrelSagCells(planned.setUp, { lengthMm: '300', diameterMm: '40' });
  expect(Object.values(proposed).map(({ text }) => text)).toEqual(['0.07', '0.56', '1.34', '2.28', '3.28']);
  expect(mandrelSagCells(planned.setUp, { lengthMm: '200', diameterMm: '40' })).not.toHaveProperty('/sag/4');
});
