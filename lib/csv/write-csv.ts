/** A figure goes out as it is; a text is guarded against being read as a formula by a spreadsheet. */
export type CsvCell = { figure: string } | string | null;

const formula = /^[=+\-@\t\r]/;
const guarded = /^'[=+\-@\t\r']/;

/** An apostrophe before what a spreadsheet would calculate, and before an apostrophe that would be taken for one of ours. */
export const guardText = (text: string): string => (formula.test(text) || guarded.test(text) ? `'${text}` : text);

/** What `guardText` put in front, taken off again. */
export const unguardText = (text: string): string => (guarded.test(text) ? text.slice(1) : text);

/**
 * A CSV file after RFC 4180: CRLF behind every record, quotes only where they are needed.
 * @source RFC 4180, section 2
 */
export function writeCsv(records: CsvCell[][]): string {
  return records.map((cells) => `${cells.map(writeCell).join(',')}\r\n`).join('');
}

function writeCell(cell: CsvCell): string {
  const text = cell === null ? '' : typeof cell === 'string' ? guardText(cell) : cell.figure;
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
