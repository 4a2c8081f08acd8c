import { describe, expect, it } from 'vitest';
import { EvaluationError, evaluateUnknown } from '@/lib/evaluation';

function refusal(input: unknown): { pointer: string; detail: string }[] {
  try {
    evaluateUnknown(input);
  } catch (error) {
    if (error instanceof EvaluationError) return [...error.issues];
    throw error;
  }
  throw new Error(`was taken: ${JSON.stringify(input)}`);
}

const line = (...positions: string[]) => positions.map((position) => ({ position, reading: '1' }));
const straight = { method: 'straightness', reference: 'least-squares', points: line('0', '1', '2') };
const parallel = { method: 'parallelism', positions: ['0', '1'], readings: { '0': ['0', '1'] } };
const square = { method: 'squareness', first: { measuredArm: { slope: '1' } }, measuringLength: '100' };
const runOut = { method: 'run-out', insertions: [{ readings: ['0', '1', '2'] }] };
const sweep = { '0': '1', '90': '2', '180': '3', '270': '4' };
const coaxial = { method: 'coaxiality', surface: 'outside', sections: [{ position: '0', readings: sweep }] };
const flat = {
  method: 'flatness',
  reference: 'minimum-zone',
  points: [
    { x: '0', y: '0', reading: '0' },
    { x: '1', y: '0', reading: '0' },
    { x: '0', y: '1', reading: '0' },
    { x: '1', y: '1', reading: '0' },
  ],
};
const position = { method: 'positioning', kind: 'linear', targets: ['0', '1'], forward: [['0'], ['0']] };
const circle = ['0', '72', '144', '216', '288'].map((angle) => ({ angle, radius: '0' }));
const circular = { method: 'circular', nominalRadius: '50', clockwise: circle };
const round = { method: 'roundness', points: circle.map(({ angle }) => ({ angle, reading: '0' })) };
const axis = {
  method: 'axis-of-rotation',
  direction: 'radial',
  turns: [
    ['0', '1', '2', '3'],
    ['0', '1', '2', '3'],
  ],
};
const conform = {
  method: 'conformity',
  deviation: '1',
  signed: true,
  tolerance: '5',
  direction: 'either',
  rule: 'simple',
};
const budget = {
  method: 'uncertainty',
  coverage: '0.95',
  components: [{ name: 'a', value: '1', distribution: 'normal' }],
};
const shift = { method: 'reference-shift', target: '1', found: '2', basis: 'radius' };
const pitch = {
  method: 'correction',
  kind: 'pitch-table',
  positions: ['0', '100'],
  means: ['0', '1'],
  referencePosition: '0',
  start: '0',
  end: '100',
  interval: '10',
  unit: '1',
  form: 'absolute',
};
const without = (input: object, field: string) =>
  Object.fromEntries(Object.entries(input).filter(([key]) => key !== field));

describe('refusals name the field', () => {
  it.each([
    ['no method', {}, '/method'],
    ['unknown method', { method: 'guess' }, '/method'],
    ['not an object', 'straightness', ''],
    ['unknown field', { ...straight, colour: 'red' }, '/colour'],
    [
      'unknown field inside',
      { ...straight, points: [{ position: '0', reading: '1', note: '' }, ...line('1', '2')] },
      '/points/0/note',
    ],
    ['missing field', without(straight, 'reference'), '/reference'],
    ['unknown kind of correction', { method: 'correction', kind: 'guess' }, '/kind'],
    ['two points', { ...straight, points: line('0', '1') }, '/points'],
    ['empty list', { ...straight, points: [] }, '/points'],
    ['equal positions', { ...straight, points: line('0', '1', '0.0') }, '/points/2/position'],
    [
      'equal positions, end points',
      { ...straight, reference: 'end-points', points: line('0', '1e1', '10') },
      '/points/2/position',
    ],
    ['local length 0', { ...straight, localLength: '0' }, '/localLength'],
    [
      'one angle',
      { method: 'straightness-from-angles', reference: 'end-points', stepLength: '100', angles: ['1'] },
      '/angles',
    ],
    [
      'return run of another length',
      {
        method: 'straightness-from-angles',
        reference: 'end-points',
        stepLength: '100',
        angles: ['1', '2'],
        returnAngles: ['1'],
      },
      '/returnAngles',
    ],
    [
      'step 0',
      { method: 'straightness-from-angles', reference: 'end-points', stepLength: '0.0', angles: ['1', '2'] },
      '/stepLength',
    ],
    [
      'reversal of other length',
      { method: 'straightness-reversal', positions: ['0', '1', '2'], first: ['0', '0', '0'], second: ['0'] },
      '/second',
    ],
    ['three points of a plane', { ...flat, points: flat.points.slice(0, 3) }, '/points'],
    ['collinear points', { ...flat, points: ['0', '1', '2', '3'].map((x) => ({ x, y: x, reading: '0' })) }, '/points'],
    [
      'collinear points, least squares',
      { ...flat, reference: 'least-squares', points: ['0', '1', '2', '3'].map((x) => ({ x, y: '0', reading: '0' })) },
      '/points',
    ],
    ['a place twice', { ...flat, points: [...flat.points, { x: '1.0', y: '1', reading: '2' }] }, '/points/4'],
    ['three missing', { ...flat, reference: 'three-points' }, '/three'],
    ['three with another reference', { ...flat, three: [0, 1, 2] }, '/three'],
    ['three collinear', { ...flat, reference: 'three-points', three: [0, 1, 1] }, '/three'],
    ['index out of range', { ...flat, reference: 'three-points', three: [0, 1, 4] }, '/three/2'],
    ['index not whole', { ...flat, reference: 'three-points', three: [0, '1.5', 2] }, '/three/1'],
    ['one position', { ...parallel, positions: ['0'], readings: { '0': ['0'] } }, '/positions'],
    ['no readings', { ...parallel, readings: {} }, '/readings'],
    ['three angles', { ...parallel, readings: { '0': ['0', '1'], '120': ['0', '1'], '240': ['0', '1'] } }, '/readings'],
    ['uneven angles', { ...parallel, readings: { '0': ['0', '1'], '90': ['0', '1'] } }, '/readings'],
    ['one angle by two names', { ...parallel, readings: { '0': ['0', '1'], '360': ['0', '1'] } }, '/readings'],
    ['a key that is no angle', { ...parallel, readings: { top: ['0', '1'] } }, '/readings/top'],
    ['lists of different length', { ...parallel, readings: { '0': ['0'] } }, '/readings/0'],
    ['sag of other length', { ...parallel, sag: ['0'] }, '/sag'],
    ['positions twice', { ...parallel, method: 'squareness-to-axis', positions: ['5', '5.0'] }, '/positions/1'],
    [
      'slope and points',
      { ...square, first: { measuredArm: { slope: '1', points: line('0', '1') } } },
      '/first/measuredArm',
    ],
    ['neither slope nor points', { ...square, first: { measuredArm: {} } }, '/first/measuredArm'],
    [
      'error of the square twice',
      { ...square, second: { measuredArm: { slope: '1' } }, squareError: '1' },
      '/squareError',
    ],
    ['one point of an arm', { ...square, first: { measuredArm: { points: line('0') } } }, '/first/measuredArm/points'],
    ['no insertion', { ...runOut, insertions: [] }, '/insertions'],
    ['one reading', { ...runOut, insertions: [{ readings: ['1'] }] }, '/insertions/0/readings'],
    ['angles of other length', { ...runOut, angles: ['0', '90'] }, '/angles'],
    ['two different angles', { ...runOut, angles: ['0', '180', '360'] }, '/angles'],
    [
      'angles of an insertion',
      { ...runOut, insertions: [{ readings: ['0', '1'], angles: ['0', '180'] }] },
      '/insertions/0/angles',
    ],
    [
      'a quarter missing',
      { ...coaxial, sections: [{ position: '0', readings: { '0': '1', '90': '2', '180': '3' } }] },
      '/sections/0/readings/270',
    ],
    ['negative sag', { ...coaxial, sag: '-1' }, '/sag'],
    ['no form of height', { method: 'centre-height' }, ''],
    ['half a form', { method: 'centre-height', toolHeight: '1' }, '/spindleHeight'],
    [
      'two forms',
      { method: 'centre-height', toolHeight: '1', spindleHeight: '1', top: '2', bottom: '3', surface: 'bore' },
      '/toolHeight',
    ],
    ['sweep without surface', { method: 'centre-height', sweep }, '/surface'],
    ['radius 0', { method: 'centre-height', toolHeight: '1', spindleHeight: '1', radii: ['0'] }, '/radii/0'],
    [
      'backward of other length',
      { method: 'angular-deviation', positions: ['0', '1'], forward: ['0', '1'], backward: ['0'] },
      '/backward',
    ],
    ['one target', { ...position, targets: ['0'], forward: [['0']] }, '/targets'],
    ['a target twice', { ...position, targets: ['1', '1.0'] }, '/targets/1'],
    ['uneven cycles', { ...position, forward: [['0', '1'], ['0']] }, '/forward/1'],
    ['uneven cycles backward', { ...position, backward: [['0'], ['0', '1']] }, '/backward/1'],
    ['lists of runs missing', { ...position, forward: [['0']] }, '/forward'],
    [
      'temperature of a rotary axis',
      { ...position, kind: 'rotary', temperature: { celsius: '21', alpha: '11' } },
      '/temperature',
    ],
    ['judging what is not evaluated', { ...position, judge: 'A' }, '/judge'],
    ['no direction', without(circular, 'clockwise'), ''],
    ['four points', { ...circular, clockwise: circle.slice(1) }, '/clockwise'],
    [
      'an angle twice on a circle',
      { ...circular, clockwise: [...circle, { angle: '360', radius: '0' }] },
      '/clockwise/5/angle',
    ],
    ['arc above a turn', { ...circular, arc: '361' }, '/arc'],
    ['Gb of one direction', { ...circular, judge: 'Gb' }, '/judge'],
    [
      'a radius below zero',
      { ...circular, nominalRadius: '0.001', clockwise: circle.map((p) => ({ ...p, radius: '-1' })) },
      '/clockwise/0/radius',
    ],
    ['roundness of three', { ...round, points: round.points.slice(2) }, '/points'],
    [
      'roundness, an angle twice',
      { ...round, points: [...round.points, { angle: '-72', reading: '1' }] },
      '/points/5/angle',
    ],
    ['one turn', { ...axis, turns: [axis.turns[0]] }, '/turns'],
    ['turns of different length', { ...axis, turns: [axis.turns[0], [...axis.turns[1]!, '4']] }, '/turns/1'],
    [
      'three readings a turn',
      {
        ...axis,
        turns: [
          ['0', '1', '2'],
          ['0', '1', '2'],
        ],
      },
      '/turns/0',
    ],
    ['angles of another count', { ...axis, angles: ['0', '90'] }, '/angles'],
    [
      'station of one reading',
      { method: 'indexing', stations: [{ name: '1', readings: ['0'] }] },
      '/stations/0/readings',
    ],
    ['no pair', { method: 'lost-motion', places: [{ feed: 'rapid', pairs: [] }] }, '/places/0/pairs'],
    [
      'unknown feed',
      { method: 'lost-motion', places: [{ feed: 'slow', pairs: [{ forward: '0', backward: '0' }] }] },
      '/places/0/feed',
    ],
    ['control factor 3', { ...shift, controlFactor: 3 }, '/controlFactor'],
    ['one section', { method: 'diameter-consistency', sections: [{ position: '0', diameter: '30' }] }, '/sections'],
    [
      'a time twice',
      {
        method: 'drift',
        points: [
          { minutes: '0', reading: '1' },
          { minutes: '0', reading: '2' },
        ],
      },
      '/points/1/minutes',
    ],
    ['distance 0', { method: 'two-collar', D1: '1', D2: '1', distance: '0' }, '/distance'],
    [
      'negative value',
      { ...budget, components: [{ name: 'a', value: '-1', distribution: 'normal' }] },
      '/components/0/value',
    ],
    [
      'no degrees of freedom',
      { ...budget, components: [{ name: 'a', value: '1', distribution: 'normal', degreesOfFreedom: 0 }] },
      '/components/0/degreesOfFreedom',
    ],
    ['no component', { ...budget, components: [] }, '/components'],
    ['another coverage', { ...budget, coverage: 0.9 }, '/coverage'],
    [
      'another distribution',
      { ...budget, components: [{ name: 'a', value: '1', distribution: 'flat' }] },
      '/components/0/distribution',
    ],
    ['tolerance 0', { ...conform, tolerance: '0' }, '/tolerance'],
    ['negative figure without sign', { ...conform, signed: false, deviation: '-1' }, '/deviation'],
    ['one-sided figure without sign', { ...conform, signed: false, direction: 'concave-only' }, '/direction'],
    ['guarded without uncertainty', { ...conform, rule: 'guarded' }, '/standardUncertainty'],
    ['resolution 0', { method: 'rounding', value: '1', resolution: '0' }, '/resolution'],
    ['negative floor', { method: 'tolerance', base: '1', baseLength: '1', length: '1', minimum: '-1' }, '/minimum'],
    ['no feed', { method: 'correction', kind: 'lost-motion', unit: '1', basis: 'radius' }, ''],
    ['means of another length', { ...pitch, means: ['0'] }, '/means'],
    ['end before start', { ...pitch, end: '0' }, '/end'],
    ['too many points', { ...pitch, interval: '0.0001' }, '/interval'],
    [
      'jacks at one place',
      {
        method: 'correction',
        kind: 'turret-parallel-and-centre',
        slope: '1',
        height: '1',
        heightPosition: '0',
        jackA: '5',
        jackB: '5.0',
      },
      '/jackB',
    ],
    [
      'beyond the mandrel',
      { method: 'correction', kind: 'mandrel-sag', length: '300', diameter: '40', at: '301' },
      '/at',
    ],
  ] as [string, unknown, string][])('%s', (_, input, pointer) => {
    const issues = refusal(input);
    expect(issues.map((issue) => issue.pointer)).toContain(pointer);
    for (const { detail } of issues) expect(detail).toMatch(/\w{2,}/);
  });

  it.each([
    '',
    ' ',
    '1 ',
    ' 1',
    '1,5',
    'NaN',
    'Infinity',
    '1e',
    '1e100',
    '.',
    '-',
    '--1',
    '0x1',
    '１',
    '1_0',
    `0.${'1'.repeat(60)}`,
    1,
    null,
    true,
    ['1'],
  ])('a reading %j is no decimal text', (reading) => {
    const input = { ...straight, points: [{ position: '0', reading }, ...line('1', '2')] };
    expect(refusal(input).map((issue) => issue.pointer)).toEqual(['/points/0/reading']);
  });

  it.each(['0', '-0', '+1', '1.', '.5', '-.5', '1e3', '1E-2', '+1.5e+10'])(
    'a reading %j is decimal text',
    (reading) => {
      expect(() =>
        evaluateUnknown({ ...straight, points: [{ position: '0', reading }, ...line('1', '2')] }),
      ).not.toThrow();
    },
  );

  it('names every wrong field at once', () => {
    const issues = refusal({ method: 'two-collar', D1: '1,5', D2: 2, length: '1' });
    expect(issues.map((issue) => issue.pointer).sort()).toEqual(['/D1', '/D2', '/distance', '/length']);
  });
});

describe('size and form of answers', () => {
  const many = Array.from({ length: 5000 }, (_, i) => ({ position: String(i), reading: String((i * 7919) % 997) }));

  it('takes 5,000 readings by every line', () => {
    for (const reference of ['end-points', 'least-squares', 'minimum-zone']) {
      const result = evaluateUnknown({ method: 'straightness', reference, points: many, localLength: '50' });
      expect(result).toMatchObject({ deviation: expect.stringMatching(/^\d+(\.\d+)?$/) });
    }
  });

  it('takes 5,000 readings of a surface and of a circle', () => {
    const surface = many.map(({ reading }, i) => ({ x: String(i % 71), y: String(Math.floor(i / 71)), reading }));
    expect(evaluateUnknown({ method: 'flatness', reference: 'minimum-zone', points: surface })).toHaveProperty(
      'deviation',
    );
    const points = many.map(({ reading }, i) => ({ angle: String(i * 0.072), reading }));
    expect(evaluateUnknown({ method: 'roundness', points })).toHaveProperty('deviation');
  });

  it('gives plain text without exponent or minus zero from very large and very small figures', () => {
    const points = [
      { position: '-1e30', reading: '-1e-30' },
      { position: '0', reading: '1e30' },
      { position: '1e-30', reading: '-0' },
      { position: '1e30', reading: '1e-30' },
    ];
    for (const reference of ['end-points', 'least-squares', 'minimum-zone']) {
      const text = JSON.stringify(evaluateUnknown({ method: 'straightness', reference, points }));
      expect(text).not.toMatch(/\de[+-]?\d|"-0(\.0*)?"/i);
    }
  });

  it('every measured result names what is judged', () => {
    for (const input of [straight, parallel, square, runOut, coaxial, flat, position, circular, round, axis, shift]) {
      expect(evaluateUnknown(input)).toMatchObject({
        method: input.method,
        deviation: expect.stringMatching(/^-?\d+(\.\d+)?$/),
        judgedBy: expect.stringMatching(/\w+ \w+/),
        signed: ['parallelism', 'squareness'].includes(input.method),
      });
    }
  });
});
