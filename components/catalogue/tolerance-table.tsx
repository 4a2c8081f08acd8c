import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { toleranceLines, toleranceNotes, toleranceUnit } from '@/lib/planning/tolerance-words';
import { provenanceWords } from '@/lib/reporting/record-words';
import type { Provenance, ToleranceRule } from '@/standards/types';

/** Tolerances in mm with where they come from, said beside them. */
export function ToleranceTable({ rule }: { rule: ToleranceRule | null }) {
  if (!rule) return <p>None is given; the result is for information.</p>;
  return (
    <>
      <Table caption="Tolerances">
        <TableHead>
          <HeadCell>Holds for</HeadCell>
          <HeadCell figure>Tolerance, {toleranceUnit(rule)}</HeadCell>
        </TableHead>
        <tbody>
          {toleranceLines(rule).map(({ when, tolerance }) => (
            <Row key={when}>
              <RowHead className="font-normal">{when}</RowHead>
              <DataCell figure>{tolerance}</DataCell>
            </Row>
          ))}
        </tbody>
      </Table>
      {toleranceNotes(rule).map((note) => (
        <p key={note} className="mt-2">
          {note}
        </p>
      ))}
      <ProvenanceLine provenance={rule.provenance} />
      {rule.local && <ProvenanceLine provenance={rule.local.provenance} />}
    </>
  );
}

const sureness = { high: 'fairly sure', medium: 'moderately sure', low: 'not sure' } as const;

/** Where something comes from, in words. */
export function ProvenanceLine({ provenance }: { provenance: Provenance }) {
  const { kind, text, confidence } = provenance;
  return (
    <p className="mt-2 text-sm text-ink2">
      <span className={kind === 'from-memory' ? 'font-semibold text-brass' : 'font-semibold'}>
        {provenanceWords[kind]}
      </span>
      : {text}
      {confidence && ` (${sureness[confidence]})`}
    </p>
  );
}
