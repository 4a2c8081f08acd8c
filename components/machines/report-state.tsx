import { dayIn } from '@/lib/dates';

const words: Record<string, string> = {
  draft: 'draft',
  checked: 'checked',
  issued: 'issued, waits for the customer',
  signed: 'signed',
  'signed-with-remarks': 'signed with remarks',
  refused: 'refused',
  superseded: 'superseded',
};

const inks: Record<string, string> = { issued: 'text-brass', refused: 'text-oxide', superseded: 'text-ink2' };

/** A report's state as a word; what waits is brass, a refusal oxide. */
export function ReportStateWord(props: { state: string; signedAt?: Date | null; timeZone?: string }) {
  const { state, signedAt, timeZone } = props;
  return (
    <span className={`font-medium ${inks[state] ?? ''}`}>
      {words[state] ?? state}
      {signedAt && timeZone && state !== 'superseded' && ` on ${dayIn(signedAt, timeZone)}`}
    </span>
  );
}
