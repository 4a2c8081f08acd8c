import type { EvaluationInput, ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { alike, fig, negative, rising, um } from './figures';

type Input = Extract<EvaluationInput, { method: 'correction'; kind: 'pitch-table' }>;
type Result = Extract<ResultOf<'correction'>, { kind: 'pitch-table' }>;

/** First three points of a pitch table and the last one. */
export function pitchSteps(input: Input, result: Result): ExplainedStep[] {
  const { points, values } = result;
  const reference = meanAt(input, input.referencePosition);
  const shown = [...new Set([0, 1, 2, points.length - 1])].filter((k) => k < points.length);
  const step = (k: number): ExplainedStep[] => {
    const here = meanAt(input, points[k]!);
    const absolute: ExplainedStep = {
      what: `At ${fig(points[k]!)} mm, before rounding to whole counts`,
      formula: '−(mean at the point − mean at the reference) / unit',
      withNumbers: `−(${fig(here)} − ${negative(reference)}) / ${fig(input.unit)}`,
      value: `${fig(counts(here, reference, input.unit))} counts`,
    };
    const entered: ExplainedStep = {
      what: `To enter at ${fig(points[k]!)} mm`,
      formula: input.form === 'absolute' ? 'nearest whole count' : 'whole count less that of the point before',
      withNumbers: '',
      value: `${fig(values[k]!)} counts`,
    };
    return [absolute, entered];
  };
  return [
    {
      what: `Mean deviation at the reference, ${fig(input.referencePosition)} mm; in a straight line between the targets`,
      formula: 'x̄(reference)',
      withNumbers: '',
      value: um(reference),
    },
    ...shown.slice(0, 3).flatMap(step),
    ...alike(points.length - shown.length),
    ...shown.slice(3).flatMap(step),
  ];
}

const counts = (here: string, reference: string, unit: string) =>
  Fraction.from(reference).minus(Fraction.from(here)).dividedBy(Fraction.from(unit)).toText();

/** Mean deviation at a place: straight between the targets, the end values outside. For the reader; the table was made elsewhere. */
function meanAt({ positions, means }: Input, place: string): string {
  const at = Fraction.from(place);
  const knots = rising(positions).map((k) => ({ x: Fraction.from(positions[k]!), mean: Fraction.from(means[k]!) }));
  const above = knots.findIndex(({ x }) => x.compare(at) >= 0);
  if (above === 0) return knots[0]!.mean.toText();
  if (above < 0) return knots.at(-1)!.mean.toText();
  const [a, b] = [knots[above - 1]!, knots[above]!];
  const share = at.minus(a.x).dividedBy(b.x.minus(a.x));
  return a.mean.plus(b.mean.minus(a.mean).times(share)).toText();
}
