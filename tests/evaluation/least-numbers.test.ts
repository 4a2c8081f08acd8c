import { describe, expect, it } from 'vitest';
import { EvaluationError, evaluateUnknown } from '@/lib/evaluation';

const texts = (count: number) => Array.from({ length: count }, (_, i) => String((i * 7) % 5));
const places = (count: number) => Array.from({ length: count }, (_, i) => String(i * 10));
const points = (count: number) => texts(count).map((reading, i) => ({ position: String(i), reading }));
const surface = (count: number) => texts(count).map((reading, i) => ({ x: String(i), y: String(i * i), reading }));
const angled = (count: number, figure: 'reading' | 'radius') =>
  texts(count).map((text, i) => ({ angle: String(i * 40), [figure]: text }));

/** Of each method the smallest number that it takes; one less is refused. */
const least: [what: string, least: number, input: (count: number) => object][] = [
  ...['end-points', 'least-squares', 'minimum-zone'].map((reference): [string, number, (count: number) => object] => [
    `straightness, ${reference}`,
    3,
    (count) => ({ method: 'straightness', reference, points: points(count) }),
  ]),
  [
    'straightness from angles, steps',
    2,
    (count) => ({
      method: 'straightness-from-angles',
      reference: 'end-points',
      stepLength: '100',
      angles: texts(count),
    }),
  ],
  [
    'straightness by reversal',
    3,
    (count) => ({
      method: 'straightness-reversal',
      positions: places(count),
      first: texts(count),
      second: texts(count),
    }),
  ],
  ['flatness', 4, (count) => ({ method: 'flatness', reference: 'minimum-zone', points: surface(count) })],
  [
    'parallelism, positions',
    2,
    (count) => ({ method: 'parallelism', positions: places(count), readings: { '0': texts(count) } }),
  ],
  [
    'squareness to an axis, positions',
    2,
    (count) => ({ method: 'squareness-to-axis', positions: places(count), readings: { '0': texts(count) } }),
  ],
  [
    'squareness, points of an arm',
    2,
    (count) => ({ method: 'squareness', first: { measuredArm: { points: points(count) } }, measuringLength: '100' }),
  ],
  ['run-out, readings', 2, (count) => ({ method: 'run-out', insertions: [{ readings: texts(count) }] })],
  [
    'run-out, angles',
    3,
    (count) => ({ method: 'run-out', angles: places(count), insertions: [{ readings: texts(count) }] }),
  ],
  ['axial run-out', 2, (count) => ({ method: 'axial-run-out', circles: [{ readings: texts(count) }] })],
  [
    'positioning, targets',
    2,
    (count) => ({
      method: 'positioning',
      kind: 'linear',
      targets: places(count),
      forward: texts(count).map((text) => [text]),
    }),
  ],
  ['circular', 5, (count) => ({ method: 'circular', nominalRadius: '50', clockwise: angled(count, 'radius') })],
  ['roundness', 4, (count) => ({ method: 'roundness', points: angled(count, 'reading') })],
  [
    'axis of rotation, turns',
    2,
    (count) => ({ method: 'axis-of-rotation', direction: 'axial', turns: Array(count).fill(texts(4)) }),
  ],
  [
    'axis of rotation, angles',
    4,
    (count) => ({ method: 'axis-of-rotation', direction: 'axial', turns: [texts(count), texts(count)] }),
  ],
  [
    'indexing, readings of a station',
    2,
    (count) => ({ method: 'indexing', stations: [{ name: '1', readings: texts(count) }] }),
  ],
  [
    'diameters',
    2,
    (count) => ({
      method: 'diameter-consistency',
      sections: places(count).map((position) => ({ position, diameter: '40' })),
    }),
  ],
  ['drift', 2, (count) => ({ method: 'drift', points: places(count).map((minutes) => ({ minutes, reading: '1' })) })],
];

describe('how many readings a method needs', () => {
  it.each(least)('%s: %i', (_, count, input) => {
    expect(evaluateUnknown(input(count))).toHaveProperty('deviation');
    expect(() => evaluateUnknown(input(count - 1))).toThrow(EvaluationError);
    expect(() => evaluateUnknown(input(0))).toThrow(EvaluationError);
  });

  it('equal places are refused also where they are written differently', () => {
    const refused: object[] = [
      { method: 'straightness', reference: 'least-squares', points: [...points(3), { position: '2.0', reading: '1' }] },
      { method: 'flatness', reference: 'least-squares', points: [...surface(4), { x: '3.00', y: '9', reading: '1' }] },
      { method: 'parallelism', positions: ['0', '0.0', '5'], readings: { '0': texts(3) } },
      { method: 'positioning', kind: 'linear', targets: ['1e1', '10'], forward: [['1'], ['2']] },
      { method: 'roundness', points: [...angled(4, 'reading'), { angle: '360', reading: '0' }] },
      {
        method: 'circular',
        nominalRadius: '50',
        clockwise: [...angled(5, 'radius'), { angle: '-360.0', radius: '0' }],
      },
      { method: 'drift', points: ['0', '60', '60.0'].map((minutes) => ({ minutes, reading: '1' })) },
      {
        method: 'diameter-consistency',
        sections: ['0', '1', '+1'].map((position) => ({ position, diameter: '40' })),
      },
      { method: 'angular-deviation', positions: ['0', '0'], forward: ['1', '2'] },
    ];
    for (const input of refused) expect(() => evaluateUnknown(input), JSON.stringify(input)).toThrow(EvaluationError);
  });

  it('run-out may be closed at 360', () => {
    const angles = ['0', '90', '180', '270', '360'];
    const { perInsertion } = evaluateUnknown({ method: 'run-out', angles, insertions: [{ readings: texts(5) }] }) as {
      perInsertion: { eccentricity: string }[];
    };
    expect(perInsertion[0]).toHaveProperty('eccentricity');
  });
});
