'use client';

import { memo } from 'react';
import type { FieldTable, SheetFields } from '@/lib/sheet/types';
import { ReadingCell } from './reading-cell';
import { useEvaluated, useOpenPass } from './sheet-context';

/** The fields of a set of readings. Drawn again only when fields come or go; figures that change are drawn by their own cells. */
export function FieldTables() {
  const { session, passId } = useOpenPass();
  const shape = useEvaluated(session, passId, (evaluated) => evaluated.shape);
  return <ShapedTables key={passId} shape={shape} fields={session.evaluation(passId).fields} />;
}

const ShapedTables = memo(
  function ShapedTables({ fields }: { shape: string; fields: SheetFields }) {
    const several = fields.tables.length > 1;
    return (
      <>
        {fields.setUp.length > 0 && <SetUpFields fields={fields} />}
        <div className={several ? 'grid gap-x-8 gap-y-5 sm:grid-cols-2' : ''}>
          {fields.tables.map((table, index) => (
            <OneTable key={table.title ?? index} table={table} index={index} />
          ))}
        </div>
      </>
    );
  },
  (before, after) => before.shape === after.shape,
);

function SetUpFields({ fields }: { fields: SheetFields }) {
  return (
    <div className="mb-4 grid gap-x-5 gap-y-2 sm:grid-cols-2">
      {fields.setUp.map((field) => (
        <div key={field.pointer} className="grid grid-cols-[1fr_minmax(6.5rem,auto)] items-center gap-x-3">
          <span aria-hidden="true" className="text-sm leading-tight text-ink2">
            {field.label}
            {field.unit && `, ${field.unit}`}
          </span>
          <div className="min-w-0">
            <ReadingCell field={field} framed />
          </div>
        </div>
      ))}
    </div>
  );
}

function OneTable({ table, index }: { table: FieldTable; index: number }) {
  const { title } = useOpenPass();
  return (
    <div className="overflow-x-auto">
      <table className="w-full border-collapse text-left">
        <caption className={table.title ? 'pb-1 text-left font-semibold' : 'sr-only'}>{table.title ?? title}</caption>
        <thead className="border-b-[1.5px] border-ink">
          <tr>
            <td className="w-px" />
            {table.columns.map((column) => (
              <th
                key={column.label}
                scope="col"
                className="px-2.5 py-1.5 text-right align-bottom text-sm font-semibold text-ink2"
              >
                {column.label}
                {column.unit && `, ${column.unit}`}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map((row, rowIndex) => (
            <tr key={row.label} className="border-b border-hair">
              <th scope="row" className="max-w-32 py-0.5 pr-2 text-sm font-normal text-ink2">
                {row.label}
              </th>
              {row.cells.map((cell, column) => (
                <td key={table.columns[column]?.label ?? column} className="px-0.5 py-0.5">
                  {cell && 'field' in cell && <ReadingCell field={cell.field} />}
                  {cell && 'derived' in cell && <DerivedCell table={index} row={rowIndex} column={column} />}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function DerivedCell({ table, row, column }: { table: number; row: number; column: number }) {
  const { session, passId } = useOpenPass();
  const figure = useEvaluated(session, passId, ({ fields }) => {
    const cell = fields.tables[table]?.rows[row]?.cells[column];
    return cell && 'derived' in cell ? cell.derived : '';
  });
  return (
    <span className="flex h-12 items-center justify-end px-2.5 font-mono tabular-nums text-ink2">
      {figure.replace('-', '−')}
    </span>
  );
}
