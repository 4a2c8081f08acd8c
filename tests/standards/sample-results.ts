import { type EvaluationInput, evaluate } from '@/lib/evaluation';

const turn = ['0', '45', '90', '135', '180', '225', '270', '315'];
const readings = ['0', '2', '1', '3', '2', '0', '1', '2'];

/** A small set of readings for each method whose result holds further figures that can have limits of their own. */
const samples: EvaluationInput[] = [
  {
    method: 'positioning',
    kind: 'linear',
    targets: ['0', '105', '198', '311', '402'],
    forward: turn.slice(0, 5).map((_, k) => [String(k), String(k + 1), String(k)]),
    backward: turn.slice(0, 5).map((_, k) => [String(k - 1), String(k - 2), String(k - 1)]),
  },
  {
    method: 'circular',
    clockwise: turn.map((angle, k) => ({ angle, radius: readings[k]! })),
    counterclockwise: turn.map((angle, k) => ({ angle, radius: readings[(k + 3) % 8]! })),
    nominalRadius: '100',
  },
  { method: 'axis-of-rotation', direction: 'radial', turns: [readings, [...readings].reverse()] },
  {
    method: 'drift',
    points: turn.map((_, k) => ({ minutes: String(k * 10), reading: readings[k]!, temperature: String(20 + k) })),
  },
  { method: 'roundness', points: turn.map((angle, k) => ({ angle, reading: readings[k]! })) },
  {
    method: 'angular-deviation',
    positions: ['0', '50', '100'],
    forward: ['0', '2', '1'],
    backward: ['1', '2', '3'],
  },
  { method: 'indexing', radius: '100', stations: [{ name: '1', readings: ['0', '2'] }] },
  { method: 'run-out', insertions: [{ readings }] },
  {
    method: 'diameter-consistency',
    sections: [
      { position: '0', diameter: '30.01' },
      { position: '100', diameter: '30' },
    ],
  },
];

/** Result of a small sample. @throws Error for a method that has none yet */
export function evaluated(method: string) {
  const sample = samples.find((one) => one.method === method);
  if (!sample) throw new Error(`no sample of readings for ${method}`);
  return evaluate(sample);
}
