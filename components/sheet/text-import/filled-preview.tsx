'use client';

import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import type { TextImport } from '@/lib/sheet/text-import/import-text';
import type { FieldTable } from '@/lib/sheet/types';

const rowsShown = 12;

/** The sheet as it would be. What comes from the text is in ink, what stands there already is grey. */
export function FilledPreview({ made }: { made: TextImport }) {
  const taken = new Set(made.fills.map(({ pointer }) => pointer));
  return (
    <section aria-label="What will be filled in" className="grid gap-3">
      <h3 className="font-semibold">
        What will be filled in: {made.fills.filter(({ text }) => text !== '').length} figures
      </h3>
      {made.fields.tables.map((table, index) => (
        <OneTable key={table.title ?? index} table={table} made={made} taken={taken} />
      ))}
    </section>
  );
}

function OneTable(props: { table: FieldTable; made: TextImport; taken: ReadonlySet<string> }) {
  const { table, made, taken } = props;
  const rows = table.rows.filter((row) =>
    row.cells.some((cell) => cell && 'field' in cell && textAt(cell.field.pointer)),
  );
  function textAt(pointer: string): string {
    return made.cells[pointer]?.text ?? '';
  }
  if (rows.length === 0) return null;
  return (
    <div>
      <Table caption={table.title ?? 'Readings'} showCaption={table.title !== null}>
        <TableHead>
          <HeadCell>
            <span className="sr-only">row</span>
          </HeadCell>
          {table.columns.map(({ label, unit }) => (
            <HeadCell key={label} figure>
              {label}
              {unit && `, ${unit}`}
            </HeadCell>
          ))}
        </TableHead>
        <tbody>
          {rows.slice(0, rowsShown).map((row) => (
            <Row key={row.label}>
              <RowHead className="text-sm text-ink2">{row.label}</RowHead>
              {row.cells.map((cell, column) => {
                const pointer = cell && 'field' in cell ? cell.field.pointer : null;
                return (
                  <DataCell
                    key={table.columns[column]?.label ?? column}
                    figure
                    className={`text-sm ${pointer && taken.has(pointer) ? '' : 'text-ink2'}`}
                  >
                    {pointer ? textAt(pointer) : ''}
                  </DataCell>
                );
              })}
            </Row>
          ))}
        </tbody>
      </Table>
      {rows.length > rowsShown && <p className="pt-1 text-sm text-ink2">And {rows.length - rowsShown} more rows.</p>}
    </div>
  );
}
