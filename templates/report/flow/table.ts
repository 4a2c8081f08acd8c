import { type FlowItem, moved, type Op, type Slab } from '@/templates/report/flow/ops';
import { baseLine, type Typesetter } from '@/templates/report/flow/typesetter';
import { type TextStyle, TYPE } from '@/templates/report/theme';

export interface Column {
  head: string;
  widthPt: number;
  /** decimal: figures of the column stand with their decimal marks below each other, at the right. */
  align?: 'left' | 'right' | 'decimal';
  style?: TextStyle;
  /** Room between the column before and this one. */
  gapPt?: number;
}

/** A cell: words, a figure, or something drawn. */
export type TableCell = string | Slab;

const PAD_X_PT = 3;
/** Room above and below a row: tables to read down a column of figures are set closer. */
const PAD_Y_PT = { open: 3.5, close: 1.25 };

export type Density = keyof typeof PAD_Y_PT;
const HEAD_PAD_PT = 3.5;
/** Heads up to this width stay on one line. */
const HEAD_ONE_LINE_PT = 23;
const GAP_PT = 8;
/** A row of more lines than this is set as several, so that none is ever higher than a page. */
const LINES_PER_ROW = 40;

/** A table whose rows may go over several pages; every page has the header. */
export function table(
  type: Typesetter,
  columns: readonly Column[],
  rows: readonly TableCell[][],
  density: Density = 'open',
): Extract<FlowItem, { kind: 'rows' }> {
  return { kind: 'rows', header: headerRow(type, columns), rows: tableRows(type, columns, rows, density) };
}

export function headerRow(type: Typesetter, columns: readonly Column[]): Slab {
  const places = lefts(columns);
  const lines = columns.map((column) => type.lines(column.head, TYPE.columnHead, inner(column)));
  const count = Math.max(1, ...lines.map((cell) => cell.length));
  const height = count * TYPE.columnHead.leadPt + 2 * HEAD_PAD_PT - 2;
  const ops = columns.flatMap((column, index) => {
    const cell = lines[index] ?? [];
    const top = (count - cell.length) * TYPE.columnHead.leadPt + HEAD_PAD_PT - 1;
    return cell.map((line, row) => {
      const slab = aligned(type, line, TYPE.columnHead, column, places[index] ?? 0);
      return moved(slab, 0, top + row * TYPE.columnHead.leadPt);
    });
  });
  return { heightPt: height, ops: [...ops, underline(columns, height - 0.5, 'ink', 1)] };
}

export function tableRows(
  type: Typesetter,
  columns: readonly Column[],
  rows: readonly TableCell[][],
  density: Density = 'open',
): Slab[] {
  const decimals = columns.map((column, index) =>
    column.align === 'decimal' ? mostDecimals(rows.map((row) => row[index] ?? '')) : 0,
  );
  const set = { decimals, padPt: PAD_Y_PT[density] };
  return rows.flatMap((row) => rowSlabs(type, columns, row, set));
}

/** What the rows of one table share. */
interface RowSet {
  decimals: readonly number[];
  padPt: number;
}

function rowSlabs(type: Typesetter, columns: readonly Column[], row: readonly TableCell[], set: RowSet): Slab[] {
  const cells = columns.map((column, index) => {
    const cell = row[index] ?? '';
    return typeof cell === 'string' ? type.lines(cell, column.style ?? TYPE.body, inner(column)) : cell;
  });
  const most = Math.max(1, ...cells.map((cell) => (Array.isArray(cell) ? cell.length : 1)));
  const slabs: Slab[] = [];
  for (let from = 0; from < most; from += LINES_PER_ROW) {
    const part = cells.map((cell) => (Array.isArray(cell) ? cell.slice(from, from + LINES_PER_ROW) : from ? [] : cell));
    slabs.push(rowSlab(type, columns, part, set, from + LINES_PER_ROW >= most));
  }
  return slabs;
}

function rowSlab(
  type: Typesetter,
  columns: readonly Column[],
  cells: readonly (string[] | Slab)[],
  set: RowSet,
  closed: boolean,
): Slab {
  const places = lefts(columns);
  const ops: Op[] = [];
  let height = 0;
  columns.forEach((column, index) => {
    const cell = cells[index] ?? [];
    const left = places[index] ?? 0;
    if (!Array.isArray(cell)) {
      ops.push(moved(cell, left + PAD_X_PT, set.padPt));
      height = Math.max(height, cell.heightPt);
      return;
    }
    const style = column.style ?? TYPE.body;
    cell.forEach((line, lineNo) => {
      const slab = aligned(type, line, style, column, left, set.decimals[index]);
      ops.push(moved(slab, 0, set.padPt + lineNo * style.leadPt));
    });
    height = Math.max(height, cell.length * style.leadPt);
  });
  const whole = height + 2 * set.padPt;
  return { heightPt: whole, ops: closed ? [...ops, underline(columns, whole - 0.25, 'hair', 0.75)] : ops };
}

/** One line in its column. Figures with a decimal mark leave room for the decimals that others in the column have more. */
function aligned(type: Typesetter, line: string, style: TextStyle, column: Column, left: number, decimals = 0): Slab {
  if (column.align !== 'right' && column.align !== 'decimal') return type.line(line, style, left + PAD_X_PT);
  const short = column.align === 'decimal' && isFigure(line) ? missingWidth(type, line, style, decimals) : 0;
  return type.line(line, style, left + column.widthPt - PAD_X_PT - short, 'end');
}

const isFigure = (text: string) => /^[=+−-]?\s?\d+(?:[.,]\d+)?$/.test(text);
const decimalsIn = (text: string) => text.match(/[.,](\d+)$/)?.[1]?.length ?? 0;

function missingWidth(type: Typesetter, text: string, style: TextStyle, decimals: number): number {
  const own = decimalsIn(text);
  const characters = decimals === own ? 0 : decimals - own + (own === 0 ? 1 : 0);
  return characters * type.width('0', style);
}

function mostDecimals(cells: readonly TableCell[]): number {
  return Math.max(0, ...cells.map((cell) => (typeof cell === 'string' && isFigure(cell) ? decimalsIn(cell) : 0)));
}

export const tableWidth = (columns: readonly Column[]) =>
  columns.reduce((sum, column, index) => sum + column.widthPt + gapBefore(column, index), 0);

const gapBefore = (column: Column, index: number) => (index === 0 ? 0 : (column.gapPt ?? GAP_PT));

/** Width that a column needs so that none of its cells is broken. */
export function naturalWidth(
  type: Typesetter,
  column: { head: string; style: TextStyle },
  cells: readonly string[],
): number {
  const decimals = mostDecimals(cells);
  const widths = cells.map(
    (cell) => type.width(cell, column.style) + (isFigure(cell) ? missingWidth(type, cell, column.style, decimals) : 0),
  );
  // A long head of several words goes on two lines rather than make its column wide.
  const whole = type.width(column.head, TYPE.columnHead);
  const words = column.head.split(' ').map((word) => type.width(word, TYPE.columnHead));
  const head = whole <= HEAD_ONE_LINE_PT ? whole : Math.max(...words, whole * 0.62);
  return Math.max(head, ...widths, 12) + 2 * PAD_X_PT + 0.5;
}

const inner = (column: Column) => column.widthPt - 2 * PAD_X_PT;

function lefts(columns: readonly Column[]): number[] {
  let x = 0;
  return columns.map((column, index) => {
    const left = x + gapBefore(column, index);
    x = left + column.widthPt;
    return left;
  });
}

function underline(columns: readonly Column[], y: number, ink: 'ink' | 'hair', widthPt: number): Op {
  return { op: 'line', x1: 0, y1: y, x2: tableWidth(columns), y2: y, ink, widthPt };
}

/** A row's height for one line of a style: marks are centred on it. */
export const lineMiddle = (style: TextStyle) => baseLine(style) - style.sizePt * 0.34;
