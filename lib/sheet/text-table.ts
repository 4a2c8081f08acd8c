import { Fraction } from '@/lib/units/fraction';
import { parseNumber } from '@/lib/units/parse-number';
import type { DecimalText } from '@/standards/types';

/** What parts the columns of a text. `spaces`: any number of spaces and tabs. */
export type Separator = 'tab' | 'semicolon' | 'comma' | 'spaces';
export type DecimalMark = 'point' | 'comma';

/** How a text is to be read; guessed, and then said by the person. */
export interface TextShape {
  separator: Separator;
  decimalMark: DecimalMark;
  /** Lines at the top that hold no figures. */
  skipLines: number;
}

export interface TextRow {
  /** Line of the text, from 1. */
  line: number;
  cells: string[];
}

export type ReadFigure = { text: string; value: DecimalText } | { problem: string };

/** Longest text that is read, characters. */
export const longestText = 2_000_000;

const signs: Record<Exclude<Separator, 'spaces'>, string> = { tab: '\t', semicolon: ';', comma: ',' };
const FIGURE = /^[-+\u2212\u2013]?(\d+([.,]\d*)?|[.,]\d+)([eE][+-]?\d{1,2})?$/;
/** Lines that are looked at to guess the shape. */
const SAMPLE = 200;

/**
 * Lines and columns of a plain text: empty lines are passed over, cells are trimmed, a cell in double quotes may hold the separator.
 * Knows no program's own format; what the columns mean is said elsewhere.
 */
export function readTextTable(text: string, { separator, skipLines }: Omit<TextShape, 'decimalMark'>): TextRow[] {
  return linesOf(text)
    .slice(skipLines)
    .map((line, index) => ({ line: skipLines + index + 1, cells: cellsOf(line, separator) }))
    .filter(({ cells }) => cells.some((cell) => cell !== ''));
}

/** Separator, decimal mark and lines without figures, as far as the first lines show them. */
export function guessShape(text: string): TextShape {
  const lines = linesOf(text);
  const sample = lines.filter((line) => line.trim() !== '').slice(0, SAMPLE);
  const separator = guessSeparator(sample);
  const cells = sample.flatMap((line) => cellsOf(line, separator)).filter((cell) => FIGURE.test(cell));
  const commas = cells.filter((cell) => cell.includes(',')).length;
  const points = cells.filter((cell) => cell.includes('.')).length;
  const decimalMark = separator !== 'comma' && commas > points ? 'comma' : 'point';
  return { separator, decimalMark, skipLines: linesAbove(lines, separator) };
}

/**
 * One figure of a text. Its decimal mark is known, so the other mark is refused: it could only be a thousands mark. A power of ten is
 * written out; nothing else of the figure is changed.
 * @returns the text to put into a field, and its value as a decimal string; '' where nothing is written
 */
export function readFigure(text: string, decimalMark: DecimalMark): ReadFigure {
  const trimmed = text.trim();
  if (trimmed === '') return { text: '', value: '' };
  const other = decimalMark === 'point' ? ',' : '.';
  if (trimmed.includes(other)) {
    const found = decimalMark === 'point' ? 'comma' : 'point';
    return {
      problem: `“${trimmed}” has a ${found}; the decimal mark is the ${decimalMark}, and thousands marks are not read.`,
    };
  }
  const plain = /\d[eE][+-]?\d/.test(trimmed) && FIGURE.test(trimmed) ? withoutPower(trimmed) : trimmed;
  const parsed = parseNumber(plain);
  if (!parsed.ok) return { problem: `“${trimmed}” cannot be read. ${parsed.problem}` };
  return { text: plain, value: Fraction.from(parsed.value).toText() };
}

function withoutPower(text: string): string {
  return Fraction.from(text.replace(',', '.').replace(/[\u2212\u2013]/, '-')).toText();
}

function linesOf(text: string): string[] {
  return text.replace(/^\uFEFF/, '').split(/\r\n|\r|\n/);
}

function cellsOf(line: string, separator: Separator): string[] {
  if (separator === 'spaces') return line.trim().split(/[ \t\u00a0]+/);
  const sign = signs[separator];
  if (!line.includes('"')) return line.split(sign).map((cell) => cell.trim());
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (const character of line) {
    if (character === '"') quoted = !quoted;
    else if (character === sign && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else cell += character;
  }
  return [...cells, cell.trim()];
}

function guessSeparator(sample: readonly string[]): Separator {
  const inMost = (test: (line: string) => boolean) => sample.filter(test).length * 2 > sample.length;
  if (inMost((line) => line.trim().includes('\t'))) return 'tab';
  if (inMost((line) => line.includes(';'))) return 'semicolon';
  const figures = (separator: Separator) =>
    sample.reduce((sum, line) => sum + cellsOf(line, separator).filter((cell) => FIGURE.test(cell)).length, 0);
  // `1,5 2,5` and `1, 5, 2.5` both have spaces and commas: what gives more whole figures is taken.
  return inMost((line) => line.includes(',')) && figures('comma') >= figures('spaces') ? 'comma' : 'spaces';
}

/** Lines before the first one that looks like the others and holds figures at least for its half. */
function linesAbove(lines: readonly string[], separator: Separator): number {
  const counts = new Map<number, number>();
  const rows = lines.slice(0, SAMPLE).map((line) => cellsOf(line, separator).filter((cell) => cell !== ''));
  for (const { length } of rows) if (length > 0) counts.set(length, (counts.get(length) ?? 0) + 1);
  const usual = [...counts].sort((a, b) => b[1] - a[1])[0]?.[0];
  const first = rows.findIndex(
    (cells) => cells.length === usual && cells.filter((cell) => FIGURE.test(cell)).length * 2 >= cells.length,
  );
  return Math.max(first, 0);
}
