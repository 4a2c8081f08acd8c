import { VerdictMark } from '@/components/ui/verdict-mark';
import type { PassBlock } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { passResultText } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { CheckItems } from './check-items';
import { ReadingTables } from './reading-tables';

/** Passes with readings of their own beside each other where they fit; adjusting ones, and an as left that is as found, in a line each. */
export function PassReadings({ passes, of }: { passes: PassBlock[]; of: string }) {
  const full = passes.filter((pass) => pass.kind !== 'adjusting' && !pass.linkedWords);
  const short = passes.filter((pass) => !full.includes(pass));
  return (
    <div className="min-w-0">
      <div className="flex flex-wrap gap-x-8 gap-y-4">
        {full.map((pass) => (
          <FullPass key={`${pass.kindWords}${pass.takenAt}`} pass={pass} of={of} />
        ))}
      </div>
      {short.map((pass) => (
        <p key={`${pass.kindWords}${pass.takenAt}`} className="mt-2 flex flex-wrap items-center gap-x-3 text-sm">
          <span className="font-semibold">{pass.kindWords}</span>
          <PassResult pass={pass} />
          <span className="text-ink2">{pass.linkedWords ?? takenWords(pass)}</span>
        </p>
      ))}
    </div>
  );
}

function FullPass({ pass, of }: { pass: PassBlock; of: string }) {
  return (
    <div className="min-w-0 max-w-full">
      <p className="flex flex-wrap items-baseline gap-x-2.5">
        <span className="font-semibold">{pass.kindWords}</span>
        <span className="text-sm text-ink2">
          {[takenWords(pass), pass.temperature].filter((part) => part).join(' · ')}
        </span>
      </p>
      {pass.setUp.length > 0 && (
        <p className="text-sm text-ink2">
          {REPORT_WORDS.block.setUp}: {pass.setUp.map(({ label, value }) => `${label} ${value}`).join(' · ')}
        </p>
      )}
      {pass.items && <CheckItems items={pass.items} name={`${of}, ${pass.kindWords}`} />}
      <ReadingTables tables={pass.tables} name={`${of}, ${pass.kindWords}`} />
      <p className="mt-1.5 text-sm">
        <PassResult pass={pass} />
      </p>
      {pass.figures.length > 0 && (
        <p className="text-sm text-ink2">{pass.figures.map(({ label, value }) => `${label} ${value}`).join(' · ')}</p>
      )}
    </div>
  );
}

function PassResult({ pass }: { pass: PassBlock }) {
  const verdict = pass.judgement?.verdict ?? 'not-measured';
  return (
    <>
      <VerdictMark verdict={verdict} words={passResultText(pass)} />
      {pass.resultWords && <span className="text-ink2"> · {pass.resultWords}</span>}
    </>
  );
}

const takenWords = (pass: PassBlock): string =>
  [pass.takenAt ? longDate(pass.takenAt) : '', pass.by ?? ''].filter((part) => part !== '').join(' · ');
