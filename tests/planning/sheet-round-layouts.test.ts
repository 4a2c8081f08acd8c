import { describe, expect, it } from 'vitest';
import { figures } from '@/lib/sheet/figures';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Layout } from '@/standards/types';
import {
  cellsOf,
  judged,
  limit,
  list,
  orderOf,
  outcomeOf,
  ownDefinition,
  reasonOf,
  type Typed,
} from './data/own-sheet';

const eighths = ['0', '45', '90', '135', '180', '225', '270', '315'];
const labels = (outcome: Parameters<typeof figures>[0]) => figures(outcome).map(({ label }) => label);
const value = (outcome: Parameters<typeof figures>[0], start: string) =>
  figures(outcome).find(({ label }) => label.startsWith(start))?.value;

describe('circular test', () => {
  const layout: Layout = { kind: 'circle-trace', anglesDeg: eighths, nominalRadiusMm: '50', arcDeg: '360' };
  const definition = ownDefinition('circular', layout, { judge: 'Gb' });
  /** 3 cos 2θ: the first axis travels too far by 6 µm on the diameter. */
  const oval = ['3', '0', '-3', '0', '3', '0', '-3', '0'];
  const trace = (way: string, radii: string[]): Typed => ({
    ...list(`/${way}`, eighths, '/angle'),
    ...list(`/${way}`, radii, '/radius'),
  });
  const both = { '/nominalRadius': '50', ...trace('counterclockwise', oval), ...trace('clockwise', oval) };

  it('goes round counterclockwise first, then clockwise', () => {
    const order = orderOf(definition, both);
    expect(order).toHaveLength(16);
    expect([order[0], order[8]]).toEqual(['/counterclockwise/0/radius', '/clockwise/0/radius']);
  });

  it('judges both directions together', () => {
    const outcome = judged(outcomeOf(definition, both, limit('6.5')));
    expect([outcome.state, outcome.displayed.textUm, outcome.judgement.verdict]).toEqual([
      'complete',
      '6.0',
      'within-tolerance',
    ]);
    expect(value(outcome, 'difference of the scales')).toBe('120.0 µm/m');
    expect(value(outcome, 'squareness')).toBe('0.0 µm/m');
    expect(value(outcome, 'F, clockwise')).toBe('−3.0 µm to 3.0 µm');
    expect(value(outcome, 'D, ')).toBe('0.0 µm');
    expect(outcome.plot).toMatchObject({ kind: 'polar', points: { length: 16 } });
  });

  it('judges one direction by its own width, and says so', () => {
    const one = { '/nominalRadius': '50', ...trace('counterclockwise', oval) };
    const outcome = judged(outcomeOf(definition, one));
    expect([outcome.state, outcome.basedOn, outcome.displayed.textUm]).toEqual([
      'partial',
      'one direction alone',
      '6.0',
    ]);
    expect(labels(outcome)).not.toContain('Gb, both directions together');
  });

  it('leaves out angles that were not read, and asks for five', () => {
    expect(judged(outcomeOf(definition, { ...both, '/clockwise/3/radius': '' })).basedOn).toBe('by 15 of 16 angles');
    const four = { '/nominalRadius': '50', ...trace('clockwise', oval.slice(0, 4)) };
    expect(reasonOf(outcomeOf(definition, four))).toBe('Five angles of one circle are needed; 4 so far.');
    const twice = { ...both, '/clockwise/7/angle': '0' };
    expect(reasonOf(outcomeOf(definition, twice))).toMatch(/angle/i);
  });
});

describe('axis of rotation', () => {
  const layout: Layout = {
    kind: 'rotation-turns',
    turns: 2,
    anglesDeg: ['0', '90', '180', '270'],
    direction: 'radial',
  };
  const definition = ownDefinition('axis-of-rotation', layout, { judge: 'total' });
  const angles = list('/angles', ['0', '90', '180', '270']);
  const first = list('/turns/0', ['1', '0', '-1', '0']);
  const second = list('/turns/1', ['1.2', '0', '-1', '0']);

  it('takes turn after turn, and takes the eccentricity out', () => {
    expect(orderOf(definition, angles)).toEqual([...Object.keys(first), ...Object.keys(second)]);
    const outcome = judged(outcomeOf(definition, { ...angles, ...first, ...second }, limit('0.2')));
    expect([outcome.state, outcome.judgement.verdict]).toEqual(['complete', 'within-tolerance']);
    // Mean 1.1, 0, −1, 0; fit 0.025 + 1.05 cos θ; residuals ±0.025.
    const [total, synchronous, asynchronous] = ['total', 'synchronous', 'asynchronous'].map((name) =>
      value(outcome, name),
    );
    expect([total, synchronous, asynchronous]).toEqual(['0.20 µm', '0.05 µm', '0.20 µm']);
    expect(value(outcome, 'eccentricity')).toBe('1.05 µm');
  });

  it('leaves out a row whose angle was taken away, and a turn that is not whole', () => {
    const five = { ...angles, '/angles/4': '300', ...first, ...second, '/turns/0/4': '9', '/turns/1/4': '9' };
    const outcome = judged(outcomeOf(definition, { ...five, '/angles/4': '' }));
    expect(outcome.input).toMatchObject({
      angles: Object.values(angles),
      turns: [Object.values(first), Object.values(second)],
    });
    const three = { ...definition, layout: { ...layout, turns: 3 } };
    expect(judged(outcomeOf(three, { ...angles, ...first, ...second })).basedOn).toBe('by 2 of 3 turns');
    expect(reasonOf(outcomeOf(definition, { ...angles, ...first }))).toBe('Two whole turns are needed; 1 of 2 so far.');
    expect(reasonOf(outcomeOf(definition, { ...angles, '/angles/2': '', ...first, ...second }))).toMatch(/Four angles/);
  });

  it('offers a row more, and reads tilt in µm/m', () => {
    expect(sheetFields(definition, cellsOf(angles)).tables[0]!.rows).toHaveLength(5);
    const tilt = ownDefinition('axis-of-rotation', { ...layout, direction: 'tilt' }, { shownIn: 'mm/m' });
    expect(sheetFields(tilt, cellsOf(angles)).tables[0]!.columns[1]).toEqual({ label: 'turn 1', unit: 'µm/m' });
    expect(value(judged(outcomeOf(tilt, { ...angles, ...first, ...second })), 'total')).toBe('0.2 µm/m');
  });
});

describe('circles of a face', () => {
  const layout: Layout = {
    kind: 'circles',
    names: ['outer circle', 'inner circle'],
    anglesDeg: ['0', '90', '180', '270'],
  };
  const definition = ownDefinition('axial-run-out', layout);
  const outer = list('/circles/0/readings', ['0', '3', '5', '2']);
  const inner = list('/circles/1/readings', ['0', '1', '2', '1']);

  it('counts the largest of them', () => {
    const outcome = judged(outcomeOf(definition, { ...outer, ...inner }, limit('5')));
    expect([outcome.state, outcome.result.deviation, outcome.judgement.verdict]).toEqual([
      'complete',
      '5',
      'within-tolerance',
    ]);
    expect(figures(outcome)).toEqual([
      { label: 'outer circle', value: '5.0 µm' },
      { label: 'inner circle', value: '2.0 µm' },
    ]);
  });

  it('leaves out a circle that is not whole', () => {
    const { '/circles/0/readings/2': _, ...gap } = outer;
    const outcome = judged(outcomeOf(definition, { ...gap, ...inner }));
    expect([outcome.basedOn, outcome.result.deviation]).toEqual(['by 1 of 2 circles', '2']);
    expect(figures(outcome)).toEqual([{ label: 'inner circle', value: '2.0 µm' }]);
    expect(reasonOf(outcomeOf(definition, gap))).toMatch(/A whole circle is needed/);
  });
});

describe('roundness', () => {
  const layout: Layout = { kind: 'round-trace', anglesDeg: eighths, surface: 'outside' };
  const definition = ownDefinition('roundness', layout);
  const places = { '/surface': 'outside', ...list('/points', eighths, '/angle') };

  it('is the width about either centre: oval by 2 µm', () => {
    const readings = list('/points', ['1', '0', '-1', '0', '1', '0', '-1', '0'], '/reading');
    const outcome = judged(outcomeOf(definition, { ...places, ...readings }, limit('2')));
    expect([outcome.state, outcome.result.deviation, outcome.judgement.verdict]).toEqual([
      'complete',
      '2',
      'within-tolerance',
    ]);
    expect(figures(outcome).map((figure) => figure.value)).toEqual(['2.0 µm', '2.0 µm']);
    expect(judged(outcomeOf(definition, { ...places, ...readings, '/points/1/reading': '' })).basedOn).toBe(
      'by 7 of 8 angles',
    );
  });

  it('asks for four angles', () => {
    const three = list('/points', ['1', '0', '-1'], '/reading');
    expect(reasonOf(outcomeOf(definition, { ...places, ...three }))).toBe(
      'Four angles with a reading are needed; 3 so far.',
    );
  });
});

describe('turns with names', () => {
  const layout: Layout = {
    kind: 'turns',
    insertions: 2,
    anglesDeg: ['0', '90', '180', '270'],
    insertionLabel: 'turn',
    names: ['at the nose', 'at 300 mm'],
  };
  const definition = ownDefinition('run-out', layout, { judge: 'largest' });

  it('says where each was read, and judges what the definition says', () => {
    const fields = sheetFields(definition, {});
    expect(fields.tables[0]!.columns.map(({ label }) => label)).toEqual(['at the nose', 'at 300 mm']);
    const typed = {
      ...list('/insertions/0/readings', ['0', '1', '2', '1']),
      ...list('/insertions/1/readings', ['0', '3', '4', '1']),
    };
    expect(judged(outcomeOf(definition, typed)).result.deviation).toBe('4');
    expect(judged(outcomeOf({ ...definition, judge: 'mean' }, typed)).result.deviation).toBe('3');
  });
});
