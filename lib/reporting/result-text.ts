import { toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import type { Judgement, Verdict } from '@/lib/sheet/types';
import { convert } from '@/lib/units/convert';
import { Dec } from '@/lib/units/decimal';
import { formatDecimal } from '@/lib/units/format';
import { displayRounded } from '@/lib/units/round';
import type { DecimalText, ShownIn } from '@/standards/types';
import type { PassBlock, SummaryRow } from './report-model';
import { CHECK_VERDICT_WORDS, REPORT_WORDS, SHORT_VERDICT_WORDS, VERDICT_WORDS } from './words';

/** The verdict's word: of a measured result, or of a function check, which is in order or not and has no tolerance. */
export function verdictText(verdict: keyof typeof VERDICT_WORDS, unit: ShownIn = 'mm', short = false): string {
  if (unit === 'items') return CHECK_VERDICT_WORDS[verdict];
  return (short ? SHORT_VERDICT_WORDS : VERDICT_WORDS)[verdict];
}

/** `0.0042 mm, within tolerance`; of a check `2 items not in order`, `in order`; `no result`. */
export function passResultText(pass: Pick<PassBlock, 'resultMm' | 'resultUnit' | 'judgement'>): string {
  const { resultMm, resultUnit = 'mm', judgement } = pass;
  const verdict = verdictText(judgement?.verdict ?? 'not-measured', resultUnit);
  if (resultUnit === 'items') return judgement ? checkText(judgement.verdict, resultMm) : verdict;
  return resultMm === null ? REPORT_WORDS.block.noResult : `${withUnit(resultMm, resultUnit)}, ${verdict}`;
}

function checkText(verdict: Verdict, count: string | null): string {
  if (verdict !== 'out-of-tolerance' || count === null || !/[1-9]/.test(count)) return verdictText(verdict, 'items');
  return `${count} ${count === '1' ? 'item' : 'items'} ${verdictText(verdict, 'items')}`;
}

/** A figure of the judgement as it prints beside the result: lengths in µm, angles in the unit of the result. */
export function judgedFigureText(
  um: DecimalText,
  pass: Pick<PassBlock, 'resultMm' | 'resultUm' | 'resultUnit'>,
): string {
  const unit = pass.resultUnit ?? 'mm';
  // At least a tenth, so that a small margin is not lost.
  if (unit === 'mm') return `${formatDecimal(um, { decimals: Math.max(1, decimalsIn(pass.resultUm ?? '')) })} µm`;
  const figure = toleranceShown(um, unit);
  return withUnit(formatDecimal(figure, { decimals: Math.max(1, decimalsIn(pass.resultMm ?? '')) }), unit);
}

/** Limit of a judgement as it prints beside such a figure; cut off at a tenth of a micrometre, never rounded up. */
export function limitText(um: DecimalText, unit: ShownIn = 'mm'): string {
  if (unit === 'mm') return `${formatDecimal(new Dec(um).toDecimalPlaces(1, Dec.ROUND_DOWN).toString())} µm`;
  return withUnit(formatDecimal(toleranceShown(um, unit)), unit);
}

export interface FurtherFigure {
  label: string;
  value: string;
  limit: string;
  verdict: Verdict;
  words: string;
}

/**
 * Further figures of the same readings with their own limits, in the unit of the result and as finely as the result; with more digits
 * where it takes them to show that a limit is passed.
 * @param shown the result as it is shown, and its unit
 */
export function furtherFigures(
  judgement: Judgement | null,
  shown: { text: string | null; unit?: ShownIn },
): FurtherFigure[] {
  const { unit = 'mm' } = shown;
  const places = decimalsIn(shown.text ?? '');
  const resolution = places === 0 ? '1' : `0.${'0'.repeat(places - 1)}1`;
  return (judgement?.also ?? []).map(({ label, deviationUm, toleranceUm, verdict }) => {
    const limit = toleranceShown(toleranceUm, unit);
    const { text } = displayRounded({
      value: unit === '″' ? convert(deviationUm, 'µm/m', 'arcsec') : toleranceShown(deviationUm, unit),
      resolution,
      limit,
    });
    return {
      label,
      value: withUnit(formatDecimal(text), unit),
      limit: withUnit(formatDecimal(limit), unit),
      verdict,
      words: verdictText(verdict),
    };
  });
}

/** Which other limit decides, where the result itself is within its own: `because of R`; '' otherwise. */
export function becauseOf(judgement: Judgement): string {
  const { verdict, marginUm, local, also = [] } = judgement;
  if (verdict !== 'out-of-tolerance' || marginUm === null || marginUm.startsWith('-')) return '';
  const labels = also.filter((each) => each.verdict === verdict).map(({ label }) => label);
  if (local?.verdict === verdict) labels.unshift(`the local limit over ${local.lengthMm} mm`);
  return labels.length ? `because of ${labels.join(', ')}` : '';
}

/**
 * The result as a limit rule takes it: µm, of angles µm/m. Results of rotary axes are kept as they are shown, in seconds of arc.
 * null where there is none.
 */
export function ruleDeviation({
  resultUm,
  resultUnit,
}: Pick<PassBlock, 'resultUm' | 'resultUnit'>): DecimalText | null {
  const plain = resultUm?.replace('−', '-') ?? null;
  return plain !== null && resultUnit === '″' ? convert(plain, 'arcsec', 'µm/m') : plain;
}

/** The tolerance of a summary row: mm stands in the head of its column, every other unit beside its figure. */
export function summaryTolerance({ toleranceMm, unit = 'mm' }: Pick<SummaryRow, 'toleranceMm' | 'unit'>): string {
  if (unit === 'mm' || unit === 'items') return toleranceMm ?? REPORT_WORDS.none;
  return toleranceMm === null ? `${REPORT_WORDS.none} ${unit}` : withUnit(toleranceMm, unit);
}

const decimalsIn = (shown: string): number => shown.match(/[.,](\d+)/)?.[1]?.length ?? 0;
