import { EvaluationError, type EvaluationInput, type EvaluationResult, evaluateUnknown } from '@/lib/evaluation';
import { rowsToOffer } from '@/lib/sheet/layouts/parts';
import { read } from '@/lib/sheet/read-cell';
import type { CellProblem, Cells, Field, SheetFields } from '@/lib/sheet/types';
import { parseNumber } from '@/lib/units/parse-number';
import type { FieldList, ListField } from './field-lists';
import type { MethodGuide } from './method-guide';

export type ListOutcome = { problems: CellProblem[] } & (
  | { state: 'not-yet'; reason: string }
  | { state: 'complete'; input: EvaluationInput; result: EvaluationResult }
);

const mostRows = 60;
type Columns = NonNullable<FieldList['rows']>['columns'];
const pointerIn = ({ at: [before, after] }: Columns[number], row: number) => `${before}${row}${after}`;
const rowPointers = (columns: Columns, row: number) => columns.map((column) => pointerIn(column, row));

function asField({ pointer, label, unit, kind, optional, options }: ListField): Field {
  return {
    ...{ pointer, label, unit },
    role: kind === 'choice' || kind === 'yes-no' ? 'choice' : 'set-up',
    ...(optional ? { optional } : {}),
    ...(options ? { options } : {}),
  };
}

const isChoice = ({ kind }: Pick<ListField, 'kind'>) => kind === 'choice' || kind === 'yes-no';

/** Rows with something written in them; a choice alone is nothing written. */
function writtenRows(columns: Columns, cells: Cells): number[] {
  const typed = columns.filter((column) => !isChoice(column));
  return Array.from({ length: mostRows }, (_, row) => row).filter((row) =>
    rowPointers(typed, row).some((pointer) => (cells[pointer]?.text.trim() ?? '') !== ''),
  );
}

/** The fields of a helper or a correction, for the same tables as those of a sheet. */
export function listFields({ fields, rows }: FieldList, cells: Cells): SheetFields {
  const count = rows
    ? Math.max(
        rows.least,
        rowsToOffer(
          cells,
          (row) =>
            rowPointers(
              rows.columns.filter((column) => !isChoice(column)),
              row,
            ),
          mostRows,
        ),
      )
    : 0;
  return {
    setUp: fields.map((field) =>
      asField({ ...field, label: `${field.label}${field.optional ? ' (may stay empty)' : ''}` }),
    ),
    tables: rows
      ? [
          {
            title: rows.title,
            columns: rows.columns.map(({ label, unit }) => ({ label, unit })),
            rows: Array.from({ length: count }, (_, row) => ({
              label: `${row + 1}`,
              cells: rows.columns.map((column) => ({
                field: asField({
                  ...column,
                  pointer: pointerIn(column, row),
                  label: `${column.label}, row ${row + 1}`,
                }),
              })),
            })),
          },
        ]
      : [],
    order: [],
  };
}

/** What stands in one field, in the form that the input wants it; null: nothing. */
function readField(field: ListField, cells: Cells): { value: string | boolean } | { problem: string } | null {
  const { text = '', unit = null } = cells[field.pointer] ?? {};
  const typed = text.trim();
  if (field.kind === 'yes-no') return { value: (typed || field.options?.[0]?.value) === 'true' };
  if (field.kind === 'choice') return { value: typed || field.options?.[0]?.value || '' };
  if (typed === '') return null;
  if (field.kind === 'text') return { value: typed };
  if (field.unit !== null) {
    const outcome = read({ text, unit }, field.unit);
    return outcome.state === 'ok'
      ? { value: outcome.value }
      : outcome.state === 'bad'
        ? { problem: outcome.problem }
        : null;
  }
  const parsed = parseNumber(text);
  if (!parsed.ok) return { problem: parsed.problem };
  return parsed.unit === null
    ? { value: parsed.value }
    : { problem: `This figure has no unit here; leave out ${parsed.unit}.` };
}

type Tree = { [name: string]: Tree | string | boolean } | (Tree | string | boolean)[];

/** Puts a value where its pointer says; numbers in a pointer are places of a list. */
function put(tree: Tree, pointer: string, value: string | boolean): void {
  const names = pointer.slice(1).split('/');
  let at = tree as Record<string, Tree | string | boolean>;
  names.forEach((name, depth) => {
    const next = names[depth + 1];
    if (next === undefined) at[name] = value;
    else {
      at[name] ??= /^\d+$/.test(next) ? [] : {};
      at = at[name] as Record<string, Tree | string | boolean>;
    }
  });
}

/**
 * Reads the fields, puts the input together and evaluates it; a refusal is said at the field that it names. Rows that are empty close up.
 */
export function evaluateList(guide: MethodGuide, list: FieldList, cells: Cells): ListOutcome {
  const columns = list.rows?.columns ?? [];
  const written = writtenRows(columns, cells);
  const inRows = written.flatMap((row, place) =>
    columns.map((column) => ({
      field: { ...column, pointer: pointerIn(column, row), label: `${column.label}, row ${row + 1}` },
      goesTo: pointerIn(column, place),
    })),
  );
  const all: { field: ListField; goesTo: string }[] = [
    ...list.fields.map((field) => ({ field, goesTo: field.pointer })),
    ...inRows,
  ];
  const problems: CellProblem[] = [];
  const missing: string[] = [];
  const { kind } = guide.example.input as { kind?: string };
  const input: Tree = { method: guide.method, ...(guide.method === 'correction' && kind ? { kind } : {}) };
  for (const { field, goesTo } of all) {
    const found = readField(field, cells);
    if (found === null) {
      if (!field.optional) missing.push(field.label);
    } else if ('problem' in found)
      problems.push({ pointer: field.pointer, severity: 'cannot-read', message: found.problem });
    else put(input, goesTo, found.value);
  }
  const first = problems[0];
  if (first) return { state: 'not-yet', reason: first.message, problems };
  if (list.rows && written.length < list.rows.least)
    missing.push(list.rows.least === 1 ? 'a row of the table' : `${list.rows.least} rows of the table`);
  if (missing.length > 0) return { state: 'not-yet', reason: `Still needed: ${missing.join('; ')}.`, problems };
  try {
    return { state: 'complete', input: input as unknown as EvaluationInput, result: evaluateUnknown(input), problems };
  } catch (error) {
    if (!(error instanceof EvaluationError)) throw error;
    const said = error.issues.map(({ pointer, detail }) => ({
      field: all.find(({ goesTo }) => pointer === goesTo || pointer.startsWith(`${goesTo}/`))?.field,
      detail: `${detail.charAt(0).toUpperCase()}${detail.slice(1)}.`,
    }));
    return {
      state: 'not-yet',
      reason: said.map(({ field, detail }) => (field ? `${field.label}: ${detail}` : detail)).join(' '),
      problems: said.flatMap(({ field, detail }) =>
        field ? [{ pointer: field.pointer, severity: 'cannot-read' as const, message: detail }] : [],
      ),
    };
  }
}
