import { decimalsOf } from '@/components/plots/number';
import type { MarkKind } from '@/components/plots/verdict-ink';
import { VERDICT_WORDS } from '@/lib/reporting/words';
import type { SheetOutcome } from '@/lib/sheet/types';
import { convert } from '@/lib/units/convert';
import { Dec } from '@/lib/units/decimal';
import { formatDecimal } from '@/lib/units/format';

export type Judged = Extract<SheetOutcome, { state: 'partial' | 'complete' }>;

export const isJudged = (outcome: SheetOutcome): outcome is Judged =>
  outcome.state === 'partial' || outcome.state === 'complete';

export interface ResultWords {
  mark: MarkKind;
  /** `within tolerance, by 4 of 5 positions`; why there is no result yet. */
  verdict: string;
  /** `free end leans toward the tool, 0.0108 to the limit`; '' when there is nothing to add. */
  beside: string;
}

export function resultWords(outcome: SheetOutcome): ResultWords {
  if (outcome.state === 'empty') return { mark: 'not-measured', verdict: 'not measured', beside: 'No reading yet.' };
  if (!isJudged(outcome)) {
    return { mark: 'not-measured', verdict: `${outcome.filled} of ${outcome.total} readings`, beside: outcome.reason };
  }
  const { judgement, basedOn } = outcome;
  const verdict = VERDICT_WORDS[judgement.verdict];
  return {
    mark: judgement.verdict,
    verdict: basedOn ? `${verdict}, ${basedOn}` : verdict,
    beside: [outcome.directionWords, distanceWords(outcome)].filter(Boolean).join(', '),
  };
}

/**
 * How far it is to the limit, mm: between the limit and the result as it is shown, so that the reader's own subtraction agrees. A result
 * beyond its limit is shown with as many figures as it takes to see it.
 */
export function distanceWords({ judgement, displayed, result }: Judged): string {
  const { limitUm, marginUm, direction } = judgement;
  if (limitUm === null || marginUm === null) return '';
  const beyond = marginUm.startsWith('-');
  const shownUm = new Dec(displayed.textUm).abs();
  // A one-sided figure is held from both ends: by its limit and by zero, and the nearer one counts.
  const byZero = direction !== 'either' && unsigned(marginUm) === unsigned(result.deviation);
  const distanceUm = byZero ? shownUm : new Dec(limitUm).minus(shownUm).abs();
  const mm = formatDecimal(convert(distanceUm.toFixed(), 'µm', 'mm'), { decimals: decimalsOf(displayed.textMm) });
  if (beyond) return byZero ? `${mm} on the side that is not allowed` : `${mm} beyond the limit`;
  if (!/[1-9]/.test(mm)) return 'at the limit';
  return byZero ? `${mm} to zero, the other side is not allowed` : `${mm} to the limit`;
}

const unsigned = (figure: string) => figure.replace('-', '');
