import { ExplanationTable } from '@/components/explain/explanation';
import type { AnnexEntry } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { ReportSection } from './report-section';

/** On demand: how every result came about. */
export function AnnexSection({ entries }: { entries: AnnexEntry[] }) {
  return (
    <ReportSection title={REPORT_WORDS.annex.heading}>
      <p className="text-sm text-ink2">{REPORT_WORDS.annex.note}</p>
      {entries.map(({ sheetOrder, title, passWords, explanation }) => (
        <section key={`${sheetOrder} ${passWords}`} className="mt-5" aria-label={`${title}, ${passWords}`}>
          <p className="font-semibold">
            {sheetOrder} · {title}, {passWords}
          </p>
          <ExplanationTable explanation={explanation} />
        </section>
      ))}
    </ReportSection>
  );
}
