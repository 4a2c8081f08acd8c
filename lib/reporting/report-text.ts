import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS, STATE_WORDS } from '@/lib/reporting/words';

const DATE = /^(\d{4})-(\d{2})-(\d{2})$/;
const DAY_AND_TIME = /^(\d{4}-\d{2}-\d{2})[ T](\d{2}:\d{2})(?: ([A-Za-z_/+\-0-9]+))?$/;
const INSTANT = /^(\d{4}-\d{2}-\d{2})T(\d{2}:\d{2})(?::\d{2}(?:\.\d+)?)?(Z|[+-]\d{2}:?\d{2})$/;

/** `2026-03-12` as `12 March 2026`; a moment with its time and zone as typed; anything else unchanged. Never converted to another zone. */
export function longDate(text: string): string {
  const date = DATE.exec(text);
  if (date) return `${Number(date[3])} ${REPORT_WORDS.monthNames[Number(date[2]) - 1] ?? date[2]} ${date[1]}`;
  const local = DAY_AND_TIME.exec(text);
  if (local) return [`${longDate(local[1] ?? '')}, ${local[2]}`, local[3] ?? ''].join(' ').trimEnd();
  const instant = INSTANT.exec(text);
  if (!instant) return text;
  const zone = instant[3] === 'Z' ? 'UTC' : `UTC${instant[3]?.replace('-', '−')}`;
  return `${longDate(instant[1] ?? '')}, ${instant[2]} ${zone}`;
}

/** `10 to 12 March 2026`: what both dates share is said once. */
export function dateSpan(from: string, to: string | null): string {
  if (to === null || to === from) return longDate(from);
  const [first, last] = [DATE.exec(from), DATE.exec(to)];
  if (!first || !last) return `${longDate(from)} ${REPORT_WORDS.to} ${longDate(to)}`;
  const month = (parts: RegExpExecArray) => REPORT_WORDS.monthNames[Number(parts[2]) - 1] ?? parts[2];
  if (first[1] !== last[1]) return `${longDate(from)} ${REPORT_WORDS.to} ${longDate(to)}`;
  if (first[2] !== last[2]) return `${Number(first[3])} ${month(first)} ${REPORT_WORDS.to} ${longDate(to)}`;
  return `${Number(first[3])} ${REPORT_WORDS.to} ${longDate(to)}`;
}

/** `issued 12 March 2026, 11:30 · signed with remarks`: the time is that of issuing, whatever came after. */
export function standingWords({ state, issuedAt }: ReportModel['document']): string {
  if (issuedAt === null) return STATE_WORDS[state];
  const issued = `${STATE_WORDS.issued} ${longDate(issuedAt)}`;
  return state === 'issued' ? issued : `${issued} · ${STATE_WORDS[state]}`;
}

/** First letter large, for the beginning of a sentence. */
export function sentence(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
