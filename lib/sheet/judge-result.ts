import { directionSign, judge, type MeasuredResult } from '@/lib/evaluation';
import { placesToText, splitDecimal } from '@/lib/units/fraction';
import { displayRounded } from '@/lib/units/round';
import type { DecimalText, TestDefinition } from '@/standards/types';
import type { ScaledTolerance } from './scale-tolerance';
import type { DisplayedResult, Judgement, SheetRules, Verdict } from './types';

const severity: Verdict[] = ['within-tolerance', 'for-information', 'undecided', 'out-of-tolerance'];

/** Verdict on a result; a local tolerance must hold too, the worse verdict counts. */
export function judgeResult(rules: SheetRules, result: MeasuredResult, scaled: ScaledTolerance | null): Judgement {
  const direction = result.signed ? rules.direction : 'either';
  if (!rules.tolerance || !scaled) {
    const nothing = { toleranceUm: null, toleranceArithmetic: null, limitUm: null, marginUm: null, local: null };
    return { verdict: 'for-information', signed: result.signed, ...nothing, direction };
  }
  const whole = verdictOn(rules, result.deviation, result.signed, scaled.toleranceUm);
  const local = localJudgement(rules, result);
  return {
    verdict: local ? worse(whole.verdict, local.verdict) : whole.verdict,
    signed: result.signed,
    toleranceUm: scaled.toleranceUm,
    toleranceArithmetic: scaled.arithmetic,
    limitUm: whole.limit,
    marginUm: whole.margin,
    direction,
    local,
  };
}

function verdictOn(rules: SheetRules, deviation: DecimalText, signed: boolean, tolerance: DecimalText) {
  const u = rules.standardUncertaintyUm ?? undefined;
  if (rules.decisionRule === 'guarded' && u === undefined)
    return { verdict: 'undecided' as const, limit: null, margin: null };
  return judge({
    deviation,
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
  const { valueUm, rule, byForm } = definition.resolution;
  const resolution = (form && byForm?.[form]) || valueUm;
  const { text, extraDigits } = displayRounded({
    value: result.deviation,
    resolution,
    rule,
    ...boundsOf(result.signed, judgement),
  });
  const { digits, places } = splitDecimal(text);
  return { textUm: text, textMm: placesToText(digits, places + 3, true), extraDigits };
}

function boundsOf(
  signed: boolean,
  { toleranceUm, direction }: Judgement,
): { lower?: string; upper?: string; limit?: string } {
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
