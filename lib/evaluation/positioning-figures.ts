import { Dec, plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';

export const POSITIONING_FIGURES = [
  'A',
  'Aforward',
  'Abackward',
  'E',
  'Eforward',
  'Ebackward',
  'R',
  'Rforward',
  'Rbackward',
  'B',
  'meanB',
  'M',
] as const;
type Figure = (typeof POSITIONING_FIGURES)[number];
type Place = { max: string; min: string };
type Run = { mean: Fraction; s: Dec | null };
type Valued<T> = { value: T; target: string };

/** Differences below this part of the larger figure are the last digits of a square root: a tie. */
const TIE = new Dec('1e-38');

/**
 * All figures of a positioning test. ↑ forward, ↓ backward, i target, j cycle:
 *
 * x̄i = mean over j; B_i = x̄i↑ − x̄i↓; B = max|B_i|; meanB = mean B_i; s_i = √(Σ(x − x̄)²/(n−1));
 * R_i↑ = 4s_i↑; R_i = max(2s_i↑ + 2s_i↓ + |B_i|; R_i↑; R_i↓); R = max R_i;
 * E↑ = range of x̄i↑; E = range over both; M = range of (x̄i↑ + x̄i↓)/2;
 * A↑ = max(x̄i↑ + 2s_i↑) − min(x̄i↑ − 2s_i↑); A the same over both.
 *
 * @param order targets by rising position: which of equal extremes is named
 * Source: ISO 230-2:2014 (from memory).
 */
export function positioningFigures(
  targets: readonly Fraction[],
  forward: readonly Fraction[][],
  backward: readonly Fraction[][] | null,
  order: readonly number[],
) {
  const names = targets.map((target) => target.toText());
  const up = forward.map(runOf);
  const down = backward?.map(runOf) ?? null;
  const figures: Partial<Record<Figure, string>> = {};
  const at: Partial<Record<'B' | 'R' | 'Rforward' | 'Rbackward', string>> &
    Partial<Record<'A' | 'Aforward' | 'Abackward' | 'E' | 'Eforward' | 'Ebackward' | 'M', Place>> = {};
  const inOrder = <T>(list: readonly T[]): Valued<T>[] => order.map((i) => ({ value: list[i]!, target: names[i]! }));
  const spread = (key: 'E' | 'Eforward' | 'Ebackward' | 'M', lists: Fraction[][]) => {
    const { max, min } = extremes(lists.map(inOrder), compareFractions);
    figures[key] = max.value.minus(min.value).toText();
    at[key] = { max: max.target, min: min.target };
  };
  const band = (key: 'A' | 'Aforward' | 'Abackward', runs: Run[][]) => {
    const edges = (sign: 2 | -2) =>
      runs.map((list) => inOrder(list.map(({ mean, s }) => mean.toDec().plus(s!.times(sign)))));
    const { max } = extremes(edges(2), compareDecs);
    const { min } = extremes(edges(-2), compareDecs);
    figures[key] = plain(max.value.minus(min.value));
    at[key] = { max: max.target, min: min.target };
  };
  const largest = (key: 'R' | 'Rforward' | 'Rbackward', list: Dec[]) => {
    const { max } = extremes([inOrder(list)], compareDecs);
    figures[key] = plain(max.value);
    at[key] = max.target;
  };
  const spreads = up.every((run) => run.s !== null);
  const means = (runs: Run[]) => runs.map((run) => run.mean);
  const reversal = down ? up.map((run, i) => run.mean.minus(down[i]!.mean)) : null;
  const half = Fraction.of(1, 2);
  const middle = down ? up.map((run, i) => run.mean.plus(down[i]!.mean).times(half)) : null;
  const both = spreads && down ? up.map((run, i) => repeatability(run, down[i]!, reversal![i]!)) : null;

  spread('Eforward', [means(up)]);
  if (spreads) {
    band('Aforward', [up]);
    largest('Rforward', up.map(fourFold));
  }
  if (down && reversal && middle) {
    spread('Ebackward', [means(down)]);
    spread('E', [means(up), means(down)]);
    spread('M', [middle]);
    const { max } = extremes([inOrder(reversal.map((b) => b.abs()))], compareFractions);
    figures.B = max.value.toText();
    at.B = max.target;
    figures.meanB = Fraction.mean(reversal).toText();
    if (both) {
      band('Abackward', [down]);
      band('A', [up, down]);
      largest('Rbackward', down.map(fourFold));
      largest('R', both);
    }
  }
  const positions = names.map((target, i) => ({
    target,
    meanForward: up[i]!.mean.toText(),
    ...(down && {
      meanBackward: down[i]!.mean.toText(),
      mean: middle![i]!.toText(),
      B: reversal![i]!.toText(),
    }),
    ...(spreads && { sForward: plain(up[i]!.s!), Rforward: plain(fourFold(up[i]!)) }),
    ...(both && { sBackward: plain(down![i]!.s!), Rbackward: plain(fourFold(down![i]!)), R: plain(both[i]!) }),
  }));
  const judgeable: Partial<Record<Figure, string>> = { ...figures };
  if (figures.meanB !== undefined) judgeable.meanB = figures.meanB.replace('-', '');
  return { figures, at, positions, judgeable };
}

function runOf(readings: readonly Fraction[]): Run {
  const mean = Fraction.mean(readings);
  if (readings.length < 2) return { mean, s: null };
  const squares = Fraction.sum(readings.map((reading) => reading.minus(mean).squared()));
  return { mean, s: squares.dividedBy(Fraction.of(readings.length - 1)).squareRoot() };
}

function fourFold({ s }: Run): Dec {
  return s!.times(4);
}

function repeatability(up: Run, down: Run, reversal: Fraction): Dec {
  const joint = up.s!.plus(down.s!).times(2).plus(reversal.abs().toDec());
  return Dec.max(joint, fourFold(up), fourFold(down));
}

function compareFractions(a: Fraction, b: Fraction): number {
  return a.compare(b);
}

function compareDecs(a: Dec, b: Dec): number {
  const difference = a.minus(b);
  return difference.abs().lte(Dec.max(a.abs(), b.abs()).times(TIE)) ? 0 : difference.cmp(0);
}

/** Largest and smallest over lists in the same order of targets; the first target of equal ones. */
function extremes<T>(
  lists: readonly Valued<T>[][],
  compare: (a: T, b: T) => number,
): { max: Valued<T>; min: Valued<T> } {
  let max = lists[0]![0]!;
  let min = max;
  for (let k = 0; k < lists[0]!.length; k++) {
    for (const list of lists) {
      const candidate = list[k]!;
      if (compare(candidate.value, max.value) > 0) max = candidate;
      if (compare(candidate.value, min.value) < 0) min = candidate;
    }
  }
  return { max, min };
}
