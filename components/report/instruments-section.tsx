import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { ReportModel } from '@/lib/reporting/report-model';
import { sentence } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { ReportSection } from './report-section';

const show = (text: string | null) => text ?? REPORT_WORDS.none;

/** Instruments used, with certificate and due date; who allowed one that was out of date stands below. */
export function InstrumentsSection({ instruments }: { instruments: ReportModel['instruments'] }) {
  if (instruments.length === 0) return null;
  const words = REPORT_WORDS.instruments;
  return (
    <ReportSection title={words.heading}>
      <Table caption={words.heading} className="text-sm">
        <TableHead>
          <HeadCell>{words.number}</HeadCell>
          <HeadCell>{words.name}</HeadCell>
          <HeadCell>{words.resolution}</HeadCell>
          <HeadCell>{words.uncertainty}</HeadCell>
          <HeadCell>{words.certificate}</HeadCell>
          <HeadCell>{words.calibrated}</HeadCell>
          <HeadCell>{words.due}</HeadCell>
        </TableHead>
        <tbody>
          {instruments.map((instrument) => (
            <Row key={instrument.number}>
              <RowHead className="whitespace-nowrap font-mono">{instrument.number}</RowHead>
              <DataCell className="min-w-40">{instrument.name}</DataCell>
              <DataCell className="whitespace-nowrap font-mono">{show(instrument.resolution)}</DataCell>
              <DataCell className="whitespace-nowrap font-mono">{show(instrument.uncertainty)}</DataCell>
              <DataCell className="whitespace-nowrap font-mono">{show(instrument.certificate)}</DataCell>
              <DataCell className="whitespace-nowrap font-mono">{show(instrument.calibrated)}</DataCell>
              <DataCell className="whitespace-nowrap font-mono">{show(instrument.due)}</DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
      {instruments
        .filter((instrument) => instrument.override)
        .map((instrument) => (
          <p key={instrument.number} className="mt-2 border-l-4 border-brass pl-3">
            {instrument.number}: {sentence(instrument.override ?? '').replace(/\.$/, '')}.
          </p>
        ))}
    </ReportSection>
  );
}
