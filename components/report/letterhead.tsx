import { Nameplate } from '@/components/ui/nameplate';
import { checkCountWords } from '@/lib/reporting/record-words';
import type { ReportModel } from '@/lib/reporting/report-model';
import { dateSpan, sentence, standingWords } from '@/lib/reporting/report-text';
import { toleranceSourceWords } from '@/lib/reporting/tolerance-source';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { CountsTable } from './counts-table';

/** Who made the report at the left; what it is, its number, revision and state at the right; the machine's plate below. */
export function Letterhead({ model }: { model: ReportModel }) {
  const { letterhead, document, machine, customer } = model;
  const words = REPORT_WORDS.machine;
  const draft = document.state === 'draft';
  return (
    <header>
      <div className="mb-4 flex flex-wrap items-start justify-between gap-x-8 gap-y-3">
        <div>
          <p className="text-lg font-semibold">{letterhead.name}</p>
          <p className="text-sm text-ink2">{letterhead.addressLines.join(' · ')}</p>
          {letterhead.contact && <p className="text-sm text-ink2">{letterhead.contact}</p>}
        </div>
        <div className="sm:text-right">
          <p className="text-2xl font-semibold">{REPORT_WORDS.title}</p>
          {draft ? (
            <p className="mt-1 inline-block border-[1.5px] border-brass bg-brass-wash px-2.5 font-mono font-medium text-brass">
              {REPORT_WORDS.draftMark}
            </p>
          ) : (
            <>
              <p className="font-mono">
                {document.number} · {REPORT_WORDS.revision} {document.revision}
              </p>
              <p className="text-sm text-ink2">{standingWords(document)}</p>
            </>
          )}
        </div>
      </div>
      <Nameplate
        fields={[
          { label: words.maker, value: machine.manufacturer },
          { label: words.model, value: machine.model },
          ...(machine.year === null ? [] : [{ label: words.year, value: machine.year }]),
          { label: words.customer, value: customer.name },
          { label: words.serial, value: machine.serialNumber, serial: true },
        ]}
      />
    </header>
  );
}

/** The outcome in one sentence, what it rests on in the next, and the counts. */
export function Headline({ model }: { model: ReportModel }) {
  const { job, conditions } = model;
  const rests = [
    `${sentence(job.purpose)}, ${dateSpan(job.from, job.to)}.`,
    job.codes.length ? `${job.codes.join(', ')}.` : '',
    `${REPORT_WORDS.decisionRule}: ${job.decisionRule}.`,
    conditions.airRange ? `${sentence(conditions.airRange)}.` : '',
    toleranceSourceWords(model.toleranceSources),
  ];
  return (
    <div className="mt-5">
      <p className="text-xl font-semibold leading-7">{model.headline}</p>
      <p className="mb-4 mt-1 text-ink2">
        {rests
          .filter((part) => part !== '')
          .join(' ')
          .replaceAll('..', '.')}
      </p>
      <CountsTable counts={model.counts} />
      {model.checks && <p className="mt-2 font-semibold">{checkCountWords(model.checks)}</p>}
    </div>
  );
}
