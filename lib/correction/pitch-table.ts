import { z } from 'zod';
import { decimals, decimalText, positiveDecimal } from '@/lib/evaluation/decimal-text';
import { refuse } from '@/lib/evaluation/evaluation-error';
import { refuseRepeats, risingOrder, seriesFromTexts } from '@/lib/evaluation/series';
import { divideHalfEven, Fraction } from '@/lib/units/fraction';

const MOST_POINTS = 20_000;

export const pitchTableInput = z.strictObject({
  method: z.literal('correction'),
  kind: z.literal('pitch-table'),
  positions: decimals(2, 'positions'),
  means: z.array(decimalText),
  referencePosition: decimalText,
  start: decimalText,
  end: decimalText,
  interval: positiveDecimal,
  unit: positiveDecimal,
  form: z.enum(['incremental', 'absolute']),
});

/**
 * Pitch compensation table from the mean bidirectional deviations of a positioning test.
 *
 * abs_k = half-even(−(x̄(p_k) − x̄(reference))/unit), x̄ linear between the targets, the end values held outside;
 * incremental: v_0 = abs_0, v_k = abs_k − abs_(k−1), differences of the rounded ones so that nothing drifts.
 *
 * @param positions mm, all different, at least 2; @param means µm, one a position
 * @param referencePosition, start, end, interval mm (start < end); @param unit µm per count
 * @returns points mm (start, start + interval … up to end), values counts
 * @throws EvaluationError lists of different length, a position twice, end not above start, more than 20,000 points
 * @example means 0 and 10 µm at 0 and 100 mm, interval 50, unit 1, absolute → 0, −5, −10
 * Source: common practice.
 */
export function pitchTable(input: z.output<typeof pitchTableInput>) {
  const { positions, means, form } = input;
  if (means.length !== positions.length) refuse(['means'], `${means.length} figures for ${positions.length} positions`);
  const x = seriesFromTexts(positions);
  refuseRepeats(x, (i) => ['positions', i], 'position');
  const knots = risingOrder(x.values).map((i) => ({ x: Fraction.from(positions[i]!), mean: Fraction.from(means[i]!) }));
  const points = pointsOf(input);
  const unit = Fraction.from(input.unit);
  const atReference = meanAt(knots, Fraction.from(input.referencePosition));
  const absolute = points.map((point) => {
    const { n, d } = atReference.minus(meanAt(knots, point)).dividedBy(unit);
    return divideHalfEven(n, d);
  });
  const values =
    form === 'absolute' ? absolute : absolute.map((value, k) => (k === 0 ? value : value - absolute[k - 1]!));
  return {
    method: 'correction' as const,
    kind: 'pitch-table' as const,
    points: points.map((point) => point.toText()),
    values: values.map(String),
    formula:
      form === 'absolute'
        ? 'value = −(mean deviation at the point − mean deviation at the reference) / unit, rounded half-even'
        : 'value = difference of neighbouring rounded absolute values; the first is the absolute one',
    verify: 'Enter the table, reference again and repeat the positioning test over the whole travel.',
  };
}

function pointsOf({ start, end, interval }: z.output<typeof pitchTableInput>): Fraction[] {
  const first = Fraction.from(start);
  const step = Fraction.from(interval);
  const length = Fraction.from(end).minus(first);
  if (length.sign() <= 0) refuse(['end'], 'must lie above start');
  const { n, d } = length.dividedBy(step);
  const count = n / d;
  if (count >= MOST_POINTS) refuse(['interval'], `gives more than ${MOST_POINTS} points`);
  return Array.from({ length: Number(count) + 1 }, (_, k) => first.plus(step.times(Fraction.of(k))));
}

type Knot = { x: Fraction; mean: Fraction };

function meanAt(knots: readonly Knot[], x: Fraction): Fraction {
  const above = firstAtOrAbove(knots, x);
  if (above === 0) return knots[0]!.mean;
  if (above === knots.length) return knots[knots.length - 1]!.mean;
  const [a, b] = [knots[above - 1]!, knots[above]!];
  return a.mean.plus(b.mean.minus(a.mean).times(x.minus(a.x)).dividedBy(b.x.minus(a.x)));
}

/** Place of the first knot at or above x, by halving; their number where there is none. */
function firstAtOrAbove(knots: readonly Knot[], x: Fraction): number {
  let [from, to] = [0, knots.length];
  while (from < to) {
    const middle = (from + to) >> 1;
    if (knots[middle]!.x.compare(x) >= 0) to = middle;
    else from = middle + 1;
  }
  return from;
}
