'use client';

import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/inputs';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { columnsOf, mappingOf, unitsFor } from '@/lib/sheet/text-import/import-text';
import type { ColumnRole, ImportChoices } from '@/lib/sheet/text-import/types';
import { readTextTable } from '@/lib/sheet/text-table';
import type { Unit } from '@/lib/units/unit';
import type { TestDefinition } from '@/standards/types';

const rowsShown = 6;

/** The first lines of the text, and above each column what it holds. */
export function ColumnChoices(props: {
  definition: TestDefinition;
  text: string;
  choices: ImportChoices;
  onChange: (change: Partial<ImportChoices>) => void;
}) {
  const { definition, text, choices, onChange } = props;
  const kinds = mappingOf(definition.layout)?.columns(definition.layout) ?? [];
  const columns = columnsOf(text, choices);
  const rows = readTextTable(text, choices).slice(0, rowsShown);
  const setRole = (column: number, role: ColumnRole | null) => {
    const isAlone = !kinds.find((kind) => kind.role === role)?.several;
    const next = columns.map((other) => {
      if (other === column) return role;
      const had = choices.columns[other] ?? null;
      return isAlone && had === role ? null : had;
    });
    onChange({ columns: next });
  };
  const used = kinds.filter(({ role, unit }) => unit !== null && choices.columns.includes(role));
  return (
    <section aria-label="What the columns hold" className="grid gap-3">
      <h3 className="font-semibold">What the columns hold</h3>
      <Table caption="The first lines of the text">
        <TableHead>
          <HeadCell>line</HeadCell>
          {columns.map((column) => (
            <HeadCell key={column} className="min-w-36">
              <Select
                aria-label={`Column ${column + 1} holds`}
                value={choices.columns[column] ?? ''}
                onChange={(event) => setRole(column, (event.target.value || null) as ColumnRole | null)}
              >
                <option value="">not used</option>
                {kinds.map(({ role, label }) => (
                  <option key={role} value={role}>
                    {label}
                  </option>
                ))}
              </Select>
            </HeadCell>
          ))}
        </TableHead>
        <tbody>
          {rows.map(({ line, cells }) => (
            <Row key={line}>
              <RowHead className="text-sm text-ink2">{line}</RowHead>
              {columns.map((column) => (
                <DataCell key={column} figure className="text-sm">
                  {cells[column] ?? ''}
                </DataCell>
              ))}
            </Row>
          ))}
        </tbody>
      </Table>
      {used.length > 0 && (
        <div className="flex flex-wrap gap-4">
          {used.map((kind) => (
            <Field key={kind.role} label={`Unit of ${kind.label}`}>
              <Select
                value={choices.units[kind.role] ?? kind.unit ?? ''}
                onChange={(event) => onChange({ units: { ...choices.units, [kind.role]: event.target.value as Unit } })}
              >
                {unitsFor(kind).map((unit) => (
                  <option key={unit} value={unit}>
                    {unit}
                  </option>
                ))}
              </Select>
            </Field>
          ))}
        </div>
      )}
    </section>
  );
}
