export interface CsvRecord {
  /** Line of the file on which the record begins, from 1. */
  line: number;
  cells: string[];
}

export class CsvError extends Error {
  constructor(
    readonly line: number,
    readonly detail: string,
  ) {
    super(`line ${line}: ${detail}`);
    this.name = 'CsvError';
  }
}

/**
 * Records of a CSV file after RFC 4180: commas, double quotes around what needs them, a quote inside doubled, line ends CRLF or LF
 * (also inside quotes). A byte order mark in front is taken off, empty lines are passed over. Nothing is trimmed.
 * @throws CsvError where a quote is not closed or stands in the middle of a cell
 * @source RFC 4180, section 2
 * @example readCsv('a,"b ""c"""\r\n') → [{ line: 1, cells: ['a', 'b "c"'] }]
 */
export function readCsv(text: string): CsvRecord[] {
  const source = text.replace(/^\uFEFF/, '');
  const records: CsvRecord[] = [];
  let at = 0;
  let line = 1;
  while (at < source.length) {
    const record: CsvRecord = { line, cells: [] };
    for (;;) {
      const cell = readCell(source, at, line);
      record.cells.push(cell.text);
      at = cell.end;
      line = cell.line;
      if (source[at] !== ',') break;
      at += 1;
    }
    if (at < source.length) {
      at += source.startsWith('\r\n', at) ? 2 : 1;
      line += 1;
    }
    if (record.cells.length > 1 || record.cells[0] !== '') records.push(record);
  }
  return records;
}

function readCell(source: string, from: number, startLine: number): { text: string; end: number; line: number } {
  if (source[from] !== '"') {
    let end = from;
    while (end < source.length && !',\r\n'.includes(source[end]!)) {
      if (source[end] === '"') throw new CsvError(startLine, 'A quote stands in the middle of a cell.');
      end += 1;
    }
    return { text: source.slice(from, end), end, line: startLine };
  }
  let text = '';
  let at = from + 1;
  for (;;) {
    const quote = source.indexOf('"', at);
    if (quote < 0) throw new CsvError(startLine, 'A quote is opened here and never closed.');
    text += source.slice(at, quote);
    if (source[quote + 1] !== '"') {
      const end = quote + 1;
      if (end < source.length && !',\r\n'.includes(source[end]!))
        throw new CsvError(startLine, 'Behind a closing quote comes a comma or the end of the line.');
      return { text, end, line: startLine + (text.match(/\r\n|\r|\n/g)?.length ?? 0) };
    }
    text += '"';
    at = quote + 2;
  }
}
