import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { AnnexSection } from './annex-section';
import { ConditionsSection } from './conditions-section';
import { InstrumentsSection } from './instruments-section';
import { Headline, Letterhead } from './letterhead';
import { MachineAndJob } from './machine-and-job';
import { NotInPlanList } from './not-in-plan-list';
import { RemarksTable } from './remarks-section';
import { ReportSection } from './report-section';
import { SignatureList } from './signature-list';
import { SummaryTable } from './summary-table';
import { TestBlockView } from './test-block-view';

/**
 * The acceptance report as a page: the same content in the same order as its PDF, for every screen, for screen readers and for paper.
 * Shows what the frozen model says and computes nothing. `photosAt`: address below which its photographs are found.
 */
export function ReportPage(props: { model: ReportModel; photosAt: string }) {
  const { model, photosAt } = props;
  const draft = model.document.state === 'draft';
  return (
    <article
      lang={model.language}
      aria-label={
        draft ? `${REPORT_WORDS.title}, ${REPORT_WORDS.draft}` : `${REPORT_WORDS.title} ${model.document.number}`
      }
      className="relative max-w-[64rem] rounded border-[1.5px] border-line bg-leaf p-4 sm:p-8 print:max-w-none print:border-0 print:p-0"
    >
      {/* On A4 a rem of 11 px gives the page the proportions that it has on a desk. */}
      <style>{'@media print { html { font-size: 11px } @page { margin: 14mm } }'}</style>
      {draft && (
        <p
          aria-hidden="true"
          className="pointer-events-none fixed inset-0 hidden -rotate-45 items-center justify-center text-[9rem] font-semibold text-hair print:flex"
        >
          {REPORT_WORDS.draftMark}
        </p>
      )}
      <Letterhead model={model} />
      <Headline model={model} />
      <MachineAndJob model={model} />
      <ConditionsSection conditions={model.conditions} />
      <InstrumentsSection instruments={model.instruments} />
      <ReportSection title={REPORT_WORDS.summary.heading}>
        <SummaryTable rows={model.summary} linkOf={(row) => `#test-${row.order}`} />
      </ReportSection>
      {model.notInPlan.length > 0 && (
        <ReportSection title={REPORT_WORDS.notInPlan.heading}>
          <NotInPlanList entries={model.notInPlan} />
        </ReportSection>
      )}
      {model.blocks.map((block) => (
        <TestBlockView key={block.order} block={block} photosAt={photosAt} />
      ))}
      {model.remarks.length > 0 && (
        <ReportSection title={REPORT_WORDS.remarks.heading}>
          <RemarksTable remarks={model.remarks} />
        </ReportSection>
      )}
      <ReportSection title={REPORT_WORDS.signatures.heading}>
        <SignatureList signatures={model.signatures} />
      </ReportSection>
      <ReportSection title={REPORT_WORDS.statement}>
        <p className="max-w-prose">{model.statement}</p>
        <p className="mt-1 text-sm text-ink2">
          {REPORT_WORDS.program} {model.document.programVersion}
        </p>
      </ReportSection>
      {model.annex && model.annex.length > 0 && <AnnexSection entries={model.annex} />}
    </article>
  );
}
