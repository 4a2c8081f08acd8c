'use client';

import { memo } from 'react';
import type { CellPointer, Field, FieldTable, SheetFields } from '@/lib/sheet/types';
import { ReadingCell } from './reading-cell';
import { useEvaluated, useOpenPass } from './sheet-context';

/** The tables of a set of readings. Drawn again only when fields come or go; figures that change are drawn by their own cells. */
export function FieldTables() {
  const { session, passId } = useOpenPass();
  const shape = useEvaluated(session, passId, (evaluated) => evaluated.shape);
  return <ShapedTables shape={shape} fields={session.evaluation(passId).fields} />;
}

/** Where and how it was taken: the fields above the tables. */
export function SetUpFields() {
  const { session, passId } = useOpenPass();
  const shape = useEvaluated(session, passId, (evaluated) => evaluated.shape);
  return <ShapedSetUp shape={shape} fields={session.evaluation(passId).fields} />;
}

interface Shaped {
  shape: string;
  fields: SheetFields;
}
const sameShape = (before: Shaped, after: Shaped) => before.shape === after.shape;

const ShapedTables = memo(function ShapedTables({ fields }: Shaped) {
  const several = fields.tables.length > 1;
  // Beside each other only where both can be seen whole: five runs at a target take the width for themselves.
  const narrow = fields.tables.every(({ columns }) => columns.length <= 4);
  return (
    <div className={several ? `grid gap-x-8 gap-y-5 ${narrow ? 'sm:grid-cols-2' : 'grid-cols-[minmax(0,1fr)]'}` : ''}>
      {fields.tables.map((table, index) => (
        <OneTable key={table.title ?? index} table={table} index={index} order={fields.order} />
      ))}
    </div>
  );
}, sameShape);

const ShapedSetUp = memo(function ShapedSetUp({ fields }: Shaped) {
  if (fields.setUp.length === 0) return null;
  return (
    <div className="mt-3 grid gap-x-8 gap-y-1.5 sm:grid-cols-2">
      {fields.setUp.map((field) => (
        <div
          key={field.pointer}
          className={`grid items-center gap-x-3 ${field.role === 'choice' ? 'grid-cols-[1fr_minmax(0,13rem)]' : 'grid-cols-[1fr_6.5rem]'}`}
        >
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
}, sameShape);

function OneTable({ table, index, order }: { table: FieldTable; index: number; order: CellPointer[] }) {
  const { session, passId, title } = useOpenPass();
  // The empty row at the end offers its position first; its readings come when it has one.
  const offered = ({ role, pointer }: Field) =>
    role !== 'reading' || order.includes(pointer) || session.textOf(passId, pointer) !== '';
  return (
    <div className="overflow-x-auto">
      <table className={`border-collapse text-left ${table.columns.length === 1 ? 'w-80 max-w-full' : 'w-full'}`}>
        <caption className={table.title ? 'pb-1 text-left font-semibold' : 'sr-only'}>{table.title ?? title}</caption>
        <thead className="border-b-[1.5px] border-ink">
          <tr>
            <td className="w-px" />
            {table.columns.map((column) => (
              <th
                key={column.label}
                scope="col"
                className="px-2 py-1.5 text-right align-bottom text-sm font-semibold text-ink2"
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
              <th scope="row" className="max-w-32 py-0.5 pr-1 text-sm font-normal text-ink2">
                {row.label}
              </th>
              {row.cells.map((cell, column) => (
                <td key={table.columns[column]?.label ?? column} className="px-0.5 py-0.5">
                  {cell && 'field' in cell && offered(cell.field) && <ReadingCell field={cell.field} />}
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
    <span className="flex h-12 items-center justify-end px-2 font-mono tabular-nums text-ink2">
      {figure.replace('-', '−')}
    </span>
  );
}
