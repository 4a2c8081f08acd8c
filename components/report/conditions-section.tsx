import { DataCell, HeadCell, Row, Table, TableHead } from '@/components/ui/table';
import type { ReportModel } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { Facts, known } from './facts';
import { ReportSection } from './report-section';

/** Place, warm-up, compensation and the like; the temperatures as they were noted. */
export function ConditionsSection({ conditions }: { conditions: ReportModel['conditions'] }) {
  const words = REPORT_WORDS.conditions;
  const { place, airRange, lines, temperatures } = conditions;
  if (!place && !airRange && lines.length === 0 && temperatures.length === 0) return null;
  return (
    <ReportSection title={words.heading}>
      <Facts
        facts={known([
          [words.place, place],
          [words.airRange, airRange],
          ...lines.map(({ label, value }) => [label, value] as const),
        ])}
      />
      {temperatures.length > 0 && (
        <div className="mt-2 max-w-xl">
          <Table caption={words.airRange} className="text-sm">
            <TableHead>
              <HeadCell>{words.time}</HeadCell>
              <HeadCell figure>{words.air}</HeadCell>
              <HeadCell figure>{words.machine}</HeadCell>
            </TableHead>
            <tbody>
              {temperatures.map(({ at, air, machine }, index) => (
                <Row key={index}>
                  <DataCell className="py-1">{longDate(at)}</DataCell>
                  <DataCell figure className="py-1">
                    {air ?? REPORT_WORDS.none}
                  </DataCell>
                  <DataCell figure className="py-1">
                    {machine ?? REPORT_WORDS.none}
                  </DataCell>
                </Row>
              ))}
            </tbody>
          </Table>
        </div>
      )}
    </ReportSection>
  );
}
