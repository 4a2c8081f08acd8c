import { type EvaluationInput, evaluate, evaluateUnknown, judge } from '@/lib/evaluation';
import { minimumZoneLine } from '@/lib/evaluation/minimum-zone-line';
import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import type { BenchLine } from './bench-line';
import { percentile, timeKeystrokes } from './keystroke';
import { timeInBrowser } from './throttled-browser';

const READINGS = 200;
const milliseconds = (time: number) => `${time.toFixed(2)} ms`;

/** The lines of the part `evaluation`: a keystroke, a whole job, the minimum zone, verdicts at exact ties. */
export async function bench(): Promise<BenchLine[]> {
  return [...keystrokes(), await throttledKeystroke(), hullAgainstDecimals(), wholeJob(), ...longProfiles(), ties()];
}

function keystrokes(): BenchLine[] {
  timeKeystrokes(READINGS, 200);
  const times = timeKeystrokes(READINGS, 1000);
  const p95 = percentile(times, 0.95);
  return [
    {
      name: `keystroke on a ${READINGS}-reading sheet: all texts parsed, least squares, minimum zone, verdict, p95`,
      ours: milliseconds(p95),
      reference: `p50 ${milliseconds(percentile(times, 0.5))}`,
      ratio: '–',
      bar: 'p95 ≤ 2 ms',
      meets: p95 <= 2,
    },
  ];
}

async function throttledKeystroke(): Promise<BenchLine> {
  const times = await timeInBrowser(4, READINGS, 400);
  const p95 = times && percentile(times, 0.95);
  return {
    name: 'the same in Chromium, CPU slowed down 4 ×, p95',
    ours: p95 === null ? 'not measured: no Chromium here' : milliseconds(p95),
    reference: times ? `p50 ${milliseconds(percentile(times, 0.5))}` : '–',
    ratio: '–',
    bar: 'p95 ≤ 8 ms',
    meets: p95 === null ? null : p95 <= 8,
  };
}

/** The same hull in whole numbers and in decimals, runs interleaved, medians compared. */
function hullAgainstDecimals(): BenchLine {
  const y = Array.from(
    { length: READINGS },
    (_, i) => BigInt((i * 7919) % 997) - (BigInt(i) * BigInt(READINGS - i)) / 20n,
  );
  const x = y.map((_, i) => BigInt(i * 50));
  const [xDec, yDec] = [x, y].map((list) => list.map((value) => new Dec(value.toString())));
  const ours: number[] = [];
  const theirs: number[] = [];
  for (let run = 0; run < 60; run++) {
    ours.push(timeOf(() => minimumZoneLine({ x, y }, 0, READINGS - 1)));
    theirs.push(timeOf(() => decimalZone(xDec!, yDec!)));
  }
  const [a, b] = [percentile(ours, 0.5), percentile(theirs, 0.5)];
  return {
    name: `minimum zone of ${READINGS} readings, exact whole numbers against decimals`,
    ours: milliseconds(a),
    reference: milliseconds(b),
    ratio: (a / b).toFixed(3),
    bar: 'no bar',
    meets: null,
  };
}

/** Both hulls and the largest height between them, in decimals. */
function decimalZone(x: readonly Dec[], y: readonly Dec[]): Dec {
  const hull = (side: 1 | -1) => {
    const kept: number[] = [];
    for (let i = 0; i < x.length; i++) {
      while (kept.length >= 2) {
        const [a, b] = [kept[kept.length - 2]!, kept[kept.length - 1]!];
        const turn = x[b]!.minus(x[a]!)
          .times(y[i]!.minus(y[a]!))
          .minus(y[b]!.minus(y[a]!).times(x[i]!.minus(x[a]!)));
        if (turn.times(side).gt(0)) break;
        kept.pop();
      }
      kept.push(i);
    }
    return kept;
  };
  const [upper, lower] = [hull(-1), hull(1)];
  const at = (edges: readonly number[], i: number) => {
    let k = 0;
    while (k < edges.length - 2 && x[edges[k + 1]!]!.lt(x[i]!)) k++;
    const [a, b] = [edges[k]!, edges[k + 1]!];
    return y[a]!.plus(y[b]!.minus(y[a]!).times(x[i]!.minus(x[a]!)).div(x[b]!.minus(x[a]!)));
  };
  const gaps = [...upper.map((i) => y[i]!.minus(at(lower, i))), ...lower.map((i) => at(upper, i).minus(y[i]!))];
  return Dec.max(...gaps);
}

/** 60 sheets of 200 readings: 20 straightness, 10 each of parallelism, run-out, positioning and lost motion. */
function wholeJob(): BenchLine {
  const sheets = Array.from({ length: 60 }, (_, k) => sheet(k));
  const times: number[] = [];
  for (let run = 0; run < 12; run++) {
    times.push(
      timeOf(() => {
        for (const input of sheets) {
          const result = evaluateUnknown(input);
          if ('deviation' in result) {
            judge({
              deviation: result.deviation,
              signed: result.signed,
              tolerance: '10',
              direction: 'either',
              rule: 'simple',
            });
          }
        }
      }),
    );
  }
  const median = percentile(times.slice(2), 0.5);
  return {
    name: 'a whole job of 60 sheets × 200 readings, median',
    ours: milliseconds(median),
    reference: `best ${milliseconds(Math.min(...times))}`,
    ratio: '–',
    bar: '≤ 100 ms',
    meets: median <= 100,
  };
}

function sheet(k: number): EvaluationInput {
  const figure = (i: number) => Fraction.of(((i + k) * 7919) % 197, 10).toText();
  const list = (from: number, count: number) => Array.from({ length: count }, (_, i) => figure(from + i));
  const positions = (count: number, step: number) => Array.from({ length: count }, (_, i) => String(i * step));
  switch (k % 6) {
    case 0:
      return {
        method: 'parallelism',
        positions: positions(100, 5),
        readings: { '0': list(0, 100), '180': list(100, 100) },
      };
    case 1: {
      const insertions = [0, 50, 100, 150].map((from) => ({ readings: list(from, 50) }));
      return { method: 'run-out', angles: positions(50, 7), insertions };
    }
    case 2: {
      const runs = (from: number) => Array.from({ length: 20 }, (_, i) => list(from + 5 * i, 5));
      return {
        method: 'positioning',
        kind: 'linear',
        targets: positions(20, 31),
        forward: runs(0),
        backward: runs(100),
      };
    }
    case 3: {
      const pairs = Array.from({ length: 100 }, (_, i) => ({ forward: figure(i), backward: figure(100 + i) }));
      return { method: 'lost-motion', places: [{ feed: 'rapid', pairs }] };
    }
    default: {
      const points = positions(READINGS, 50).map((position, i) => ({ position, reading: figure(i) }));
      return { method: 'straightness', reference: k % 2 ? 'minimum-zone' : 'least-squares', points };
    }
  }
}

function longProfiles(): BenchLine[] {
  const figure = (i: number) => String((i * 7919) % 997);
  const points = Array.from({ length: 5000 }, (_, i) => ({ position: String(i), reading: figure(i) }));
  const surface = points.map(({ reading }, i) => ({ x: String(i % 71), y: String(Math.floor(i / 71)), reading }));
  const circle = points.map(({ reading }, i) => ({ angle: Fraction.of(72 * i, 1000).toText(), reading }));
  const inputs: [string, EvaluationInput][] = [
    ['straightness', { method: 'straightness', reference: 'minimum-zone', points }],
    ['flatness', { method: 'flatness', reference: 'minimum-zone', points: surface }],
    ['roundness', { method: 'roundness', points: circle }],
    [
      'circular test by true geometry',
      {
        method: 'circular',
        nominalRadius: '100',
        clockwise: circle.map(({ angle, reading }) => ({ angle, radius: reading })),
      },
    ],
  ];
  return inputs.map(([name, input]) => {
    const time = timeOf(() => evaluateUnknown(input));
    return {
      name: `minimum zone of 5,000 readings, ${name}`,
      ours: milliseconds(time),
      reference: '–',
      ratio: '–',
      bar: '≤ 5,000 ms',
      meets: time <= 5000,
    };
  });
}

/** Mean total readings that are exactly the tolerance; doubles, asked the same, are the positive control. */
function ties(): BenchLine {
  let wrong = 0;
  let wrongInDoubles = 0;
  const count = 2000;
  for (let k = 0; k < count; k++) {
    const tenths = 5 + ((k * 7919) % 211);
    const shift = (k * 31) % tenths;
    const totals = [tenths - shift, tenths, tenths + shift].map((t) => Fraction.of(3 + t, 10).toText());
    const tolerance = Fraction.of(tenths, 10).toText();
    const { deviation } = evaluate({ method: 'run-out', insertions: totals.map((t) => ({ readings: ['0.3', t] })) });
    const { verdict } = judge({ deviation, signed: false, tolerance, direction: 'either', rule: 'simple' });
    if (verdict !== 'within-tolerance') wrong++;
    if (totals.reduce((sum, t) => sum + (Number(t) - 0.3), 0) / 3 > Number(tolerance)) wrongInDoubles++;
  }
  return {
    name: `verdicts wrong of ${count} exact ties with the tolerance`,
    ours: String(wrong),
    reference: `${wrongInDoubles} in doubles`,
    ratio: '–',
    bar: '0, and doubles get some wrong',
    meets: wrong === 0 && wrongInDoubles > 0,
  };
}

function timeOf(work: () => unknown): number {
  const start = performance.now();
  work();
  return performance.now() - start;
}
