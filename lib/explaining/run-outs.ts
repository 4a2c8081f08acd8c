import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { alike, extremes, fig, meanText, rangeOf, um } from './figures';

const MOST_CIRCLES = 6;

export function runOutSteps(
  input: { judge?: string; insertions: { readings: string[] }[] },
  result: ResultOf<'run-out'>,
): ExplainedStep[] {
  const { insertions } = input;
  const totals = result.perInsertion.map(({ totalIndicatorReading }) => totalIndicatorReading);
  const total = (k: number) =>
    totalStep(insertions.length === 1 ? '' : ` ${k + 1}`, insertions[k]!.readings, totals[k]!, k);
  if (insertions.length === 1) return [total(0)];
  const { atLargest } = extremes(totals);
  const largest = input.judge === 'largest';
  const shown = insertions.length <= 4 || !largest ? shownOf(insertions.length, 4) : [0, 1, 2, atLargest];
  return [
    ...[...new Set(shown)].map(total),
    ...alike(insertions.length - new Set(shown).size),
    largest ? largestOf(totals, result.deviation) : meanStep(totals, result.deviation),
  ];
}

const shownOf = (count: number, most: number) => Array.from({ length: Math.min(count, most) }, (_, k) => k);

const totalStep = (name: string, readings: string[], value: string, k: number): ExplainedStep => ({
  what: `Total indicator reading${name}`,
  formula: 'T = max r − min r',
  withNumbers: rangeOf(readings),
  value: um(value),
  readings: [extremes(readings).atLargest, extremes(readings).atSmallest].map(
    (at) => `/insertions/${k}/readings/${at}`,
  ),
});

const meanStep = (totals: readonly string[], value: string): ExplainedStep => ({
  what: 'Mean over the insertions',
  formula: `ΣT / ${totals.length}`,
  withNumbers: meanText(totals),
  value: um(value),
});

function largestOf(totals: readonly string[], value: string): ExplainedStep {
  return { what: 'The largest of them', formula: 'max T', withNumbers: maximum(totals), value: um(value) };
}

/** `max(3; 5; 4)`; of many the largest alone. */
export function maximum(values: readonly string[]): string {
  if (values.length <= 8) return `max(${values.map(fig).join('; ')})`;
  return `max(${fig(extremes(values).largest)}; … ${values.length - 1} smaller)`;
}

export function axialSteps(
  input: { circles: { name?: string; readings: string[] }[] },
  result: ResultOf<'axial-run-out'>,
): ExplainedStep[] {
  const { circles } = input;
  const { atLargest } = extremes(result.perCircle);
  const shown = [...new Set([...shownOf(circles.length, MOST_CIRCLES), atLargest])];
  return [
    ...shown.map((k) => ({
      what: `Total reading, ${circles[k]!.name ?? `circle ${k + 1}`}`,
      formula: 'T = max r − min r',
      withNumbers: rangeOf(circles[k]!.readings),
      value: um(result.perCircle[k]!),
    })),
    ...alike(circles.length - shown.length),
    largestOf(result.perCircle, result.deviation),
  ];
}
