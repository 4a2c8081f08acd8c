import { directionSign, judge, type MeasuredResult } from '@/lib/evaluation';
import { convert } from '@/lib/units/convert';
import { placesToText, splitDecimal } from '@/lib/units/fraction';
import { displayRounded } from '@/lib/units/round';
import type { DecimalText, TestDefinition } from '@/standards/types';
import { atLimit } from './at-limit';
import type { ScaledTolerance } from './scale-tolerance';
import type { DisplayedResult, FurtherJudgement, Judgement, SheetRules, Verdict } from './types';

const severity: Verdict[] = ['within-tolerance', 'for-information', 'undecided', 'out-of-tolerance'];

/** Verdict on a result; a local tolerance and the limits of further figures must hold too, the worst verdict counts. */
export function judgeResult(rules: SheetRules, result: MeasuredResult, scaled: ScaledTolerance | null): Judgement {
  const direction = result.signed ? rules.direction : 'either';
  if (!rules.tolerance || !scaled) {
    const nothing = { toleranceUm: null, toleranceArithmetic: null, limitUm: null, marginUm: null, local: null };
    return { verdict: 'for-information', signed: result.signed, ...nothing, direction };
  }
  const whole = verdictOn(rules, result.deviation, result.signed, scaled.toleranceUm);
  const local = localJudgement(rules, result);
  const also = furtherJudgements(rules, result);
  return {
    verdict: [local, ...also].reduce<Verdict>(
      (worst, next) => (next ? worse(worst, next.verdict) : worst),
      whole.verdict,
    ),
    signed: result.signed,
    toleranceUm: scaled.toleranceUm,
    toleranceArithmetic: scaled.arithmetic,
    limitUm: whole.limit,
    marginUm: whole.margin,
    direction,
    local,
    ...(also.length > 0 ? { also } : {}),
  };
}

/** Figures of the method that have a limit of their own; one that was not evaluated (a single run has no R) is not judged. */
function furtherJudgements(rules: SheetRules, result: MeasuredResult): FurtherJudgement[] {
  return (rules.tolerance?.also ?? []).flatMap(({ figure, label, toleranceUm }) => {
    const value = (result as unknown as Record<string, unknown>)[figure];
    if (typeof value !== 'string') return [];
    // A mean reversal has a sign that says only which way; its amount is judged.
    const deviationUm = value.replace(/^-/, '');
    const { verdict } = verdictOn(rules, deviationUm, false, toleranceUm);
    return [{ figure, label, deviationUm, toleranceUm, verdict }];
  });
}

function verdictOn(rules: SheetRules, deviation: DecimalText, signed: boolean, tolerance: DecimalText) {
  const u = rules.standardUncertaintyUm ?? undefined;
  if (rules.decisionRule === 'guarded' && u === undefined)
    return { verdict: 'undecided' as const, limit: null, margin: null };
  return judge({
    deviation: atLimit(deviation, tolerance),
    signed,
    tolerance,
    direction: signed ? rules.direction : 'either',
    rule: rules.decisionRule,
    ...(u === undefined ? {} : { standardUncertainty: u }),
  });
}

function localJudgement(rules: SheetRules, result: MeasuredResult): Judgement['local'] {
  const local = rules.tolerance?.local;
  const deviationUm = 'local' in result ? result.local : undefined;
  if (!local || typeof deviationUm !== 'string') return null;
  const { toleranceUm, lengthMm } = local;
  const { verdict } = verdictOn(rules, deviationUm, false, toleranceUm);
  return { deviationUm, toleranceUm, lengthMm, verdict };
}

function worse(a: Verdict, b: Verdict): Verdict {
  return severity.indexOf(a) >= severity.indexOf(b) ? a : b;
}

/** The result rounded once, with as many more digits as it takes to show that its limit is passed. */
export function displayResult(
  definition: TestDefinition,
  result: MeasuredResult,
  judgement: Judgement,
  form: string | undefined,
): DisplayedResult {
  const { valueUm, byForm } = definition.resolution;
  const bounds = boundsOf(result.signed, judgement);
  const { toleranceUm } = judgement;
  const figure = toleranceUm === null ? result.deviation : atLimit(result.deviation, toleranceUm);
  return displayFigure(definition, figure, (form && byForm?.[form]) || valueUm, bounds);
}

interface Bounds {
  lower?: string;
  upper?: string;
  limit?: string;
}

/**
 * A figure rounded once in the unit in which it is shown: mm for lengths, mm/m for angles of slides (both three places from the
 * stored unit), seconds of arc for rotary axes, whose resolution is then meant in seconds.
 */
function displayFigure(
  definition: TestDefinition,
  figure: string,
  resolution: string,
  bounds: Bounds,
): DisplayedResult {
  const { rule } = definition.resolution;
  const unit = definition.shownIn;
  if (unit === '″') {
    const seconds = (value: string) => convert(value, 'µm/m', 'arcsec');
    const inSeconds = Object.fromEntries(Object.entries(bounds).map(([name, value]) => [name, seconds(value)]));
    const { text, extraDigits } = displayRounded({ value: seconds(figure), resolution, rule, ...inSeconds });
    return { textUm: text, textMm: text, extraDigits, unit };
  }
  const { text, extraDigits } = displayRounded({ value: figure, resolution, rule, ...bounds });
  const { digits, places } = splitDecimal(text);
  return { textUm: text, textMm: placesToText(digits, places + 3, true), extraDigits, ...(unit ? { unit } : {}) };
}

function boundsOf(signed: boolean, { toleranceUm, direction }: Judgement): Bounds {
  if (toleranceUm === null) return {};
  const sign = signed ? directionSign(direction) : 0;
  if (sign === 0) return signed ? { limit: toleranceUm } : { upper: toleranceUm };
  return sign > 0 ? { lower: '0', upper: toleranceUm } : { lower: `-${toleranceUm}`, upper: '0' };
}

/** Words for the sign; none where the figure has no sign or is shown as 0. */
export function directionWords(
  definition: TestDefinition,
  result: MeasuredResult,
  displayed: DisplayedResult,
): string | null {
  if (!result.signed || !/[1-9]/.test(displayed.textUm)) return null;
  const words = displayed.textUm.startsWith('-') ? definition.negativeMeans : definition.positiveMeans;
  return words ?? null;
}
