import type { SignatureBlock } from '@/lib/reporting/report-model';
import { longDate, sentence } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { SignatureMark } from './signature-mark';

/** Who measured, who checked, who answered: the mark above a line; name, time and outcome below it. */
export function SignatureList({ signatures }: { signatures: SignatureBlock[] }) {
  const words = REPORT_WORDS.signatures;
  return (
    <ul className="grid gap-x-10 gap-y-6 sm:grid-cols-2">
      {signatures.map((signature) => (
        <li key={signature.role} className="break-inside-avoid">
          <p className="text-sm font-semibold text-ink2">{signature.roleWords}</p>
          <div className="border-b-[1.5px] border-ink pb-1">
            <SignatureMark strokes={signature.strokes} typed={signature.typed} />
          </div>
          <p className="mt-1 font-semibold">
            {[signature.name, signature.function, signature.company].filter(Boolean).join(', ')}
          </p>
          <p className="text-ink2">
            {[signature.signedAt ? longDate(signature.signedAt) : words.unsigned, signature.outcome]
              .filter(Boolean)
              .join(' · ')}
          </p>
          {signature.reason && (
            <p>
              {sentence(words.reason)}: {signature.reason}
            </p>
          )}
        </li>
      ))}
    </ul>
  );
}
