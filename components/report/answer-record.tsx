import { Notice, type NoticeTone } from '@/components/ui/notice';
import { formatTime } from '@/lib/reporting/format-time';
import { signedOutcomeWords } from '@/lib/reporting/record-words';
import type { ReportModel } from '@/lib/reporting/report-model';
import { longDate, sentence } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { Facts } from './facts';
import { RemarksTable } from './remarks-section';
import { SignatureMark } from './signature-mark';

/** A signature as it is kept. */
export interface RecordedAnswer {
  outcome: string;
  name: string;
  functionTitle: string | null;
  company: string | null;
  place: string | null;
  typed: string | null;
  strokes: string[] | null;
  reason: string | null;
  intentText: string;
  method: 'on-tablet' | 'signed-in' | 'signing-link';
  witness: string | null;
  modelSha256: string;
  deviceTimeZone: string | null;
  signedAt: Date;
}

const tones: Record<string, NoticeTone> = { refuse: 'oxide' };

/** `Accepted with remarks by C. Vale, Ashdown Turned Parts, on 12 March 2026, 11:45 Europe/Berlin.` */
export function answerWords(answer: RecordedAnswer, timeZone: string): string {
  const who = [answer.name, answer.company].filter(Boolean).join(', ');
  const words = signedOutcomeWords[answer.outcome] ?? answer.outcome;
  return `${sentence(words)} by ${who} on ${timeWords(answer.signedAt, timeZone)}.`;
}

const timeWords = (moment: Date, timeZone: string) => `${longDate(formatTime(moment, timeZone))} ${timeZone}`;

const methods: Record<RecordedAnswer['method'], string> = {
  'signed-in': 'signed in with an account of their own',
  'on-tablet': 'signed on the inspector’s tablet',
  'signing-link': 'signed through a signing link',
};

/** The answer in one sentence, as it stands at the head of the report. */
export function AnswerNotice({ answer, timeZone }: { answer: RecordedAnswer; timeZone: string }) {
  return (
    <Notice tone={tones[answer.outcome] ?? 'blue'} title={answerWords(answer, timeZone)}>
      <p>
        {sentence(methods[answer.method])}
        {answer.witness && `, witnessed by ${answer.witness}`}.{answer.reason && ` Reason: ${answer.reason}`}
      </p>
    </Notice>
  );
}

/** What was recorded with the answer; what is not known is said so, never left empty. */
export function AnswerRecord(props: {
  answer: RecordedAnswer;
  remarks: ReportModel['remarks'];
  document: { number: string; revision: number };
  timeZone: string;
}) {
  const { answer, remarks, document, timeZone } = props;
  const kept = (text: string | null) => text || REPORT_WORDS.notRecorded;
  return (
    <div className="grid gap-4">
      <div className="max-w-80 border-b-[1.5px] border-ink pb-1">
        <SignatureMark strokes={answer.strokes} typed={answer.typed} />
      </div>
      <Facts
        facts={[
          { label: 'Answer', value: <strong>{signedOutcomeWords[answer.outcome]}</strong> },
          ...(answer.reason ? [{ label: 'Reason', value: answer.reason }] : []),
          { label: 'Name', value: answer.name },
          { label: 'Function', value: kept(answer.functionTitle) },
          { label: 'Company', value: kept(answer.company) },
          { label: 'Place', value: kept(answer.place) },
          { label: 'Time', value: timeWords(answer.signedAt, timeZone) },
          { label: 'Device’s zone', value: kept(answer.deviceTimeZone) },
          { label: 'How', value: methods[answer.method] },
          ...(answer.method === 'on-tablet' ? [{ label: 'Witness', value: kept(answer.witness) }] : []),
          { label: 'Sentence', value: `“${answer.intentText}”` },
          { label: 'Document', value: `${document.number}, revision ${document.revision}` },
          { label: 'Its SHA-256', value: <span className="break-all font-mono text-sm">{answer.modelSha256}</span> },
        ]}
      />
      {remarks.length > 0 && <RemarksTable remarks={remarks} />}
    </div>
  );
}
