import { checkCountWords } from '@/lib/reporting/record-words';
import type { ReportModel } from '@/lib/reporting/report-model';
import { VERDICT_WORDS } from '@/lib/reporting/words';
import { CountsTable } from './counts-table';
import { RemarksTable } from './remarks-section';
import { SummaryTable } from './summary-table';
import { isDeviation } from './summary-words';

/** What a reader has to know before answering: outcome, counts, everything that is not plainly within tolerance, remarks. */
export function ReportInShort({ model }: { model: ReportModel }) {
  const deviating = model.summary.filter(isDeviation);
  const remarked = model.blocks.filter((block) => block.remark);
  return (
    <>
      <p className="mb-4 text-xl font-semibold leading-7">{model.headline}</p>
      <CountsTable counts={model.counts} />
      {model.checks && <p className="mt-2 font-semibold">{checkCountWords(model.checks)}</p>}
      <h3 className="mb-1 mt-6 font-semibold">
        {model.checks ? 'Out of tolerance, not in order, undecided, left out' : 'Out of tolerance, undecided, left out'}
      </h3>
      {deviating.length === 0 ? (
        <p>
          None: every planned test is {VERDICT_WORDS['within-tolerance']}, or for information
          {model.checks ? '; every function check is in order.' : '.'}
        </p>
      ) : (
        <SummaryTable
          rows={deviating}
          caption="Tests out of tolerance, undecided or left out"
          linkOf={(row) => `#test-${row.order}`}
        />
      )}
      {(remarked.length > 0 || model.remarks.length > 0) && <h3 className="mb-1 mt-6 font-semibold">Remarks</h3>}
      {remarked.length > 0 && (
        <ul className="grid gap-1">
          {remarked.map((block) => (
            <li key={block.order}>
              <a href={`#test-${block.order}`} className="text-blue underline">
                {block.order} {block.title}
              </a>
              : {block.remark}
            </li>
          ))}
        </ul>
      )}
      {model.remarks.length > 0 && <RemarksTable remarks={model.remarks} />}
    </>
  );
}
