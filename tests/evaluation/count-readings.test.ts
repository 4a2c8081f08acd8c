import { expect, it } from 'vitest';
import { type EvaluationMethod, evaluationInput } from '@/lib/evaluation';
import { countReadings } from '@/lib/evaluation/count-readings';

const point = { position: '0', reading: '1' };
const sweep = { '0': '1', '90': '2', '180': '3', '270': '4' };

/** An input of each method, and how many figures of readings stand in it, counted by hand. */
const counted: Record<EvaluationMethod, [input: object, readings: number][]> = {
  straightness: [[{ points: [point, point, point], localLength: '100' }, 3]],
  'straightness-from-angles': [
    [{ stepLength: '100', angles: ['1', '2', '3'] }, 3],
    [{ stepLength: '100', angles: ['1', '2', '3'], returnAngles: ['1', '2', '3'] }, 6],
  ],
  'straightness-reversal': [[{ positions: ['0', '1', '2'], first: ['1', '2', '3'], second: ['4', '5', '6'] }, 6]],
  flatness: [[{ points: [1, 2, 3, 4].map((x) => ({ x: String(x), y: '0', reading: '0' })), three: [0, 1, 2] }, 4]],
  parallelism: [[{ positions: ['0', '1'], readings: { '0': ['1', '2'], '180': ['3', '4'] }, sag: ['0', '1'] }, 4]],
  'squareness-to-axis': [[{ positions: ['0', '1', '2'], readings: { '0': ['1', '2', '3'] } }, 3]],
  squareness: [
    [{ first: { measuredArm: { slope: '3' } }, measuringLength: '100' }, 1],
    [{ first: { referenceArm: { slope: '1' }, measuredArm: { points: [point, point] } } }, 3],
    [{ first: { measuredArm: { slope: '3' } }, second: { measuredArm: { points: [point, point, point] } } }, 4],
  ],
  'run-out': [
    [{ angles: ['0', '90', '180'], insertions: [{ readings: ['1', '2', '3'] }, { readings: ['4', '5'] }] }, 5],
  ],
  'axial-run-out': [[{ circles: [{ name: 'inner', readings: ['1', '2'] }, { readings: ['3', '4', '5'] }] }, 5]],
  coaxiality: [
    [
      {
        sections: [
          { position: '0', readings: sweep },
          { position: '9', readings: sweep },
        ],
        sag: '3',
      },
      8,
    ],
  ],
  'centre-height': [
    [{ sweep, surface: 'bore', radii: ['1', '2'] }, 4],
    [{ top: '1', bottom: '2', surface: 'outside' }, 2],
    [{ toolHeight: '1', spindleHeight: '2' }, 2],
  ],
  'angular-deviation': [[{ positions: ['0', '1'], forward: ['1', '2'], backward: ['3', '4'] }, 4]],
  positioning: [
    [
      {
        targets: ['0', '1'],
        forward: [
          ['1', '2', '3'],
          ['4', '5', '6'],
        ],
        backward: [['1'], ['2']],
      },
      8,
    ],
  ],
  circular: [[{ clockwise: [{ angle: '0', radius: '1' }], counterclockwise: [{ angle: '0', radius: '1' }] }, 2]],
  'axis-of-rotation': [
    [
      {
        turns: [
          ['1', '2', '3', '4'],
          ['1', '2', '3', '4'],
        ],
        angles: ['0', '90', '180', '270'],
      },
      8,
    ],
  ],
  indexing: [
    [
      {
        stations: [
          { name: '1', readings: ['1', '2'] },
          { name: '2', readings: ['1', '2'] },
        ],
      },
      4,
    ],
  ],
  'lost-motion': [[{ places: [{ feed: 'rapid', pairs: [{ forward: '1', backward: '2' }] }, { pairs: [] }] }, 2]],
  'reference-shift': [[{ target: '40', found: '40.02' }, 1]],
  roundness: [
    [
      {
        points: [
          { angle: '0', reading: '1' },
          { angle: '9', reading: '1' },
        ],
      },
      2,
    ],
  ],
  'diameter-consistency': [
    [
      {
        sections: [
          { position: '0', diameter: '40' },
          { position: '9', diameter: '40' },
        ],
      },
      2,
    ],
  ],
  drift: [
    [
      {
        points: [
          { minutes: '0', reading: '0', temperature: '20' },
          { minutes: '5', reading: '1' },
        ],
      },
      2,
    ],
  ],
  'two-collar': [[{ D1: '30.012', D2: '30.007', distance: '100' }, 2]],
  uncertainty: [
    [
      {
        components: [
          { name: 'a', value: '1', sensitivity: '2' },
          { name: 'b', value: '1' },
        ],
      },
      2,
    ],
  ],
  conformity: [[{ deviation: '1', tolerance: '2' }, 1]],
  rounding: [[{ value: '1', resolution: '0.1' }, 1]],
  tolerance: [[{ base: '10', baseLength: '300', length: '100' }, 1]],
  correction: [
    [{ kind: 'pitch-table', positions: ['0', '1', '2'], means: ['1', '2', '3'] }, 3],
    [
      { kind: 'lost-motion', cuttingFeed: { present: '1', lostMotion: '2' }, rapid: { present: 1, lostMotion: '2' } },
      2,
    ],
    [{ kind: 'turret-parallel-and-centre', slope: '1', height: '2' }, 2],
  ],
};

it('every method has an example', () => {
  const methods = evaluationInput.options.map((option) =>
    'shape' in option ? option.shape.method.value : option.options[0].shape.method.value,
  );
  expect(Object.keys(counted).sort()).toEqual(methods.sort());
});

it.each(Object.entries(counted).flatMap(([method, cases]) => cases.map((one) => [method, ...one] as const)))(
  '%s %j: %i',
  (method, input, readings) => {
    expect(countReadings({ method, ...input })).toBe(readings);
  },
);

it('what is no input holds no readings', () => {
  const circle: Record<string, unknown> = { method: 'run-out' };
  for (const odd of [
    null,
    undefined,
    7,
    'run-out',
    [],
    {},
    { method: 'guess', points: ['1'] },
    { method: 'toString' },
  ]) {
    expect(countReadings(odd)).toBe(0);
  }
  for (const insertions of [null, 'x', 5, {}, [null], [['1']], [{ readings: null }], [{ readings: {} }]]) {
    expect(countReadings({ ...circle, insertions })).toBe(0);
  }
});

it('5,000 nested figures are counted one by one', () => {
  const runs = Array.from({ length: 250 }, (_, i) => Array.from({ length: 10 }, (_, j) => `${i}.${j}`));
  const input = { method: 'positioning', kind: 'linear', targets: [], forward: runs, backward: runs };
  expect(countReadings(input)).toBe(5000);
  input.backward = [...runs, ['1']];
  expect(countReadings(input)).toBe(5001);
});
