import { CsvError, type CsvRecord, readCsv } from '@/lib/csv/read-csv';
import { unguardText } from '@/lib/csv/write-csv';
import { type ValuesColumn, valuesColumns } from './values-table';

export interface ImportProblem {
  line: number;
  /** '' where it concerns the whole line. */
  column: ValuesColumn | '';
  detail: string;
}

const textColumns: readonly ValuesColumn[] = [
  'code',
  'edition',
  'test',
  'title',
  'cell',
  'state',
  'ofEdition',
  'clause',
  'remark',
];
const needed = [
  'code',
  'edition',
  'test',
  'version',
  'cell',
  'figure',
  'unit',
  'state',
  'ofEdition',
  'clause',
] as const;

export interface TableRow {
  line: number;
  text: Record<ValuesColumn, string>;
}

/** Lines of the file by the names of its columns; figures as they stand, the guard of texts taken off. */
export function readTable(csv: string): { rows: TableRow[]; problems: ImportProblem[] } {
  let records: CsvRecord[];
  try {
    records = readCsv(csv);
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    return { rows: [], problems: [{ line: error.line, column: '', detail: error.detail }] };
  }
  const [head, ...body] = records;
  const wrong = (detail: string) => ({ rows: [], problems: [{ line: head?.line ?? 1, column: '' as const, detail }] });
  if (!head) return wrong('The file is empty.');
  if (head.cells.length === 1 && head.cells[0]?.includes(';'))
    return wrong('The columns are separated by semicolons. Save the file as CSV with commas.');
  const names = head.cells.map((name) => name.trim());
  const missing = needed.filter((column) => !names.includes(column));
  if (missing.length > 0) return wrong(`The first line names the columns. Missing: ${missing.join(', ')}.`);
  const unknown = names.filter((name) => !valuesColumns.some((column) => column === name));
  if (unknown.length > 0) return wrong(`No such column: ${unknown.join(', ')}.`);
  const twice = names.find((name, index) => names.indexOf(name) < index);
  if (twice) return wrong(`The column ${twice} stands there twice.`);
  const problems: ImportProblem[] = [];
  const rows = body.flatMap(({ line, cells }) => {
    if (cells.length !== names.length) {
      problems.push({ line, column: '', detail: `There are ${cells.length} cells, and ${names.length} columns.` });
      return [];
    }
    const text = Object.fromEntries(valuesColumns.map((column) => [column, '']));
    for (const [index, name] of names.entries()) text[name] = textOf(name as ValuesColumn, cells[index] ?? '');
    return [{ line, text: text as TableRow['text'] }];
  });
  return { rows, problems };
}

const textOf = (column: ValuesColumn, cell: string): string =>
  (textColumns.includes(column) ? unguardText(cell) : cell).trim();
