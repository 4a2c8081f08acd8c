'use client';

import { FieldErrorLine } from '@/components/ui/field';
import { NumberText, Select, TextInput } from '@/components/ui/inputs';
import { HeadCell, Table, TableHead } from '@/components/ui/table';
import type { Field, FieldTable } from '@/lib/sheet/types';

/** Rows of fields; an empty one more than are filled. */
export function PlainTable(props: {
  table: FieldTable;
  texts: Record<string, string>;
  problems: Record<string, string>;
  onType: (pointer: string, text: string) => void;
}) {
  const { table, texts, problems, onType } = props;
  return (
    <div className="mt-4">
      <Table caption={table.title ?? 'Rows'} showCaption>
        <TableHead>
          {table.columns.map(({ label, unit }) => (
            <HeadCell key={label}>{unit ? `${label}, ${unit}` : label}</HeadCell>
          ))}
        </TableHead>
        <tbody>
          {table.rows.map((row) => (
            <tr key={row.label} className="border-b border-hair align-top">
              {row.cells.map((cell) =>
                cell && 'field' in cell ? (
                  <td key={cell.field.pointer} className="min-w-28 px-1 py-1">
                    <Cell
                      field={cell.field}
                      text={texts[cell.field.pointer] ?? ''}
                      problem={problems[cell.field.pointer]}
                      onType={onType}
                    />
                  </td>
                ) : null,
              )}
            </tr>
          ))}
        </tbody>
      </Table>
    </div>
  );
}

function Cell(props: {
  field: Field;
  text: string;
  problem: string | undefined;
  onType: (pointer: string, text: string) => void;
}) {
  const { field, text, problem, onType } = props;
  const errorId = `${field.pointer.slice(1).replaceAll('/', '-')}-error`;
  const common = {
    value: text,
    'aria-label': field.label,
    ...(problem ? { 'aria-invalid': true as const, 'aria-describedby': errorId } : {}),
    onChange: (event: { target: { value: string } }) => onType(field.pointer, event.target.value),
  };
  const isWord = field.role === 'set-up' && field.unit === null;
  return (
    <>
      {field.options && (
        <Select {...common}>
          {field.options.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </Select>
      )}
      {!field.options && (isWord ? <TextInput {...common} /> : <NumberText {...common} />)}
      {problem && <FieldErrorLine id={errorId}>{problem}</FieldErrorLine>}
    </>
  );
}
