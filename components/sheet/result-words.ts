import { decimalsOf } from '@/components/plots/number';
import type { MarkKind } from '@/components/plots/verdict-ink';
import { becauseOf, verdictText } from '@/lib/reporting/result-text';
import { VERDICT_WORDS } from '@/lib/reporting/words';
import { shownUnit, toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import type { SheetOutcome } from '@/lib/sheet/types';
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

/** @param items how many items a function check has; absent: a measured test */
export function resultWords(outcome: SheetOutcome, items?: number): ResultWords {
  if (items !== undefined) return checkWords(outcome, items);
  if (outcome.state === 'empty') return { mark: 'not-measured', verdict: 'not measured', beside: 'No reading yet.' };
  if (!isJudged(outcome)) {
    return { mark: 'not-measured', verdict: `${outcome.filled} of ${outcome.total} readings`, beside: outcome.reason };
  }
  const { judgement, basedOn } = outcome;
  const verdict = VERDICT_WORDS[judgement.verdict];
  return {
    mark: judgement.verdict,
    verdict: basedOn ? `${verdict}, ${basedOn}` : verdict,
    beside: [becauseOf(judgement), outcome.directionWords, distanceWords(outcome)].filter(Boolean).join(', '),
  };
}

/** `6 of 8 answered, all in order`; `8 of 8 answered, 2 not in order`. */
function checkWords(outcome: SheetOutcome, items: number): ResultWords {
  if (outcome.state === 'empty')
    return { mark: 'not-measured', verdict: verdictText('not-measured', 'items'), beside: 'No item is answered yet.' };
  if (!isJudged(outcome))
    return { mark: 'not-measured', verdict: verdictText('not-measured', 'items'), beside: outcome.reason };
  const { result, judgement, displayed } = outcome;
  const done = result.method === 'function-check' ? result.items.length : 0;
  const order = displayed.textMm === '0' ? 'all in order' : `${displayed.textMm} not in order`;
  return { mark: judgement.verdict, verdict: `${answered(done, items)}, ${order}`, beside: '' };
}

const answered = (done: number, total: number) => `${done} of ${total} answered`;

/**
 * How far it is to the limit, in the unit of the result: between the limit and the result as it is shown, so that the reader's own subtraction agrees. A result
 * beyond its limit is shown with as many figures as it takes to see it.
 */
export function distanceWords({ judgement, displayed, result }: Judged): string {
  const { limitUm, marginUm, direction } = judgement;
  if (limitUm === null || marginUm === null) return '';
  const beyond = marginUm.startsWith('-');
  const unit = shownUnit(displayed);
  const shown = new Dec(displayed.textMm).abs();
  // A one-sided figure is held from both ends: by its limit and by zero, and the nearer one counts.
  const byZero = direction !== 'either' && unsigned(marginUm) === unsigned(result.deviation);
  const distance = byZero ? shown : new Dec(toleranceShown(limitUm, unit)).minus(shown).abs();
  const figure = formatDecimal(distance.toFixed(), { decimals: decimalsOf(displayed.textMm) });
  const words = unit === 'mm' ? figure : withUnit(figure, unit);
  if (beyond) return byZero ? `${words} on the side that is not allowed` : `${words} beyond the limit`;
  if (!/[1-9]/.test(figure)) return 'at the limit';
  return byZero ? `${words} to zero, the other side is not allowed` : `${words} to the limit`;
}

const unsigned = (figure: string) => figure.replace('-', '');
