import { decimalsOf } from '@/components/plots/number';
import type { MarkKind } from '@/components/plots/verdict-ink';
import { VERDICT_WORDS } from '@/lib/reporting/words';
import type { SheetOutcome } from '@/lib/sheet/types';
import { convert } from '@/lib/units/convert';
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

/** How far it is to the limit, mm, in the resolution of the result; a distance is never rounded to nothing. */
export function distanceWords({ judgement, displayed, result }: Judged): string {
  if (judgement.marginUm === null) return '';
  const beyond = judgement.marginUm.startsWith('-');
  const shown = millimetres(unsigned(judgement.marginUm), decimalsOf(displayed.textMm));
  // A one-sided figure is held from both ends: by its limit and by zero, and the nearer one counts.
  const byZero = judgement.direction !== 'either' && unsigned(judgement.marginUm) === unsigned(result.deviation);
  if (beyond) return byZero ? `${shown} on the side that is not allowed` : `${shown} beyond the limit`;
  return byZero ? `${shown} to zero, the other side is not allowed` : `${shown} to the limit`;
}

const unsigned = (figure: string) => figure.replace('-', '');

function millimetres(um: string, decimals: number): string {
  const mm = convert(um, 'µm', 'mm');
  if (!/[1-9]/.test(mm)) return formatDecimal(mm, { decimals });
  for (let places = decimals; places < decimals + 12; places++) {
    const shown = formatDecimal(mm, { decimals: places });
    if (/[1-9]/.test(shown)) return shown;
  }
  return formatDecimal(mm, {});
}
