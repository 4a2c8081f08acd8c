import type { PassBlock } from '@/lib/reporting/report-model';
import {
  asSlab,
  beside as besideEachOther,
  type FlowItem,
  type Slab,
  slabItem,
  space,
  stack,
} from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { type Column, headerRow, naturalWidth, table, tableRows, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

type ReadingTable = PassBlock['tables'][number];

const ROW_LABEL = { ...TYPE.figureQuiet, sizePt: 8 };
const READING = { ...TYPE.figure, sizePt: 8 };
const TITLE = TYPE.small;
const GAP_PT = 14;
/** Depth of such pieces: well below a page. */
const ROWS_DEEP = 40;
/** Tables up to this depth stand beside each other. */
const ROWS_SMALL = 14;
/** A longer table of few columns is set in pieces beside each other. */
const ROWS_BESIDE = 8;

/**
 * The readings of a pass in a width: small tables beside each other; a table too wide is cut between columns, a long narrow one set in
 * pieces beside each other.
 */
export function passTables(kit: Kit, pass: PassBlock, widthPt: number): FlowItem[] {
  const small = pass.tables.every(
    (readings) => readings.rows.length <= ROWS_SMALL && ownWidth(kit, readings) <= widthPt,
  );
  if (small && pass.tables.length > 1) return inRows(kit, pass.tables, widthPt);
  return pass.tables.flatMap((readings, index) => [
    ...(index ? [space(6)] : []),
    ...titleOf(kit, readings, widthPt),
    ...cutToWidth(kit, readings, widthPt).flatMap((part, partNo) => [
      ...(partNo ? [space(6)] : []),
      ...oneTable(kit, part, widthPt),
    ]),
  ]);
}

/** Width that the readings of a pass would like to have. */
export function passWidth(kit: Kit, pass: PassBlock): number {
  return Math.max(0, ...pass.tables.map((readings) => ownWidth(kit, readings)));
}

const ownWidth = (kit: Kit, readings: ReadingTable) => tableWidth(columnsOf(kit, readings));

function titleOf(kit: Kit, { title }: ReadingTable, widthPt: number): FlowItem[] {
  return title ? [slabItem(kit.type.paragraph(title, TITLE, widthPt), { keepWithNext: true })] : [];
}

/** Small tables beside each other, as many in a row as fit. */
function inRows(kit: Kit, tables: readonly ReadingTable[], widthPt: number): FlowItem[] {
  const rows: { slab: Slab; x: number }[][] = [];
  let x = 0;
  for (const readings of tables) {
    const columns = columnsOf(kit, readings);
    const own = Math.max(tableWidth(columns), Math.min(widthPt, kit.type.width(readings.title ?? '', TITLE)));
    if (!rows.length || x + own > widthPt) {
      rows.push([]);
      x = 0;
    }
    const cells = readings.rows.map((row) => [row.label, ...row.cells]);
    rows.at(-1)?.push({ slab: asSlab([...titleOf(kit, readings, own), table(kit.type, columns, cells, 'close')]), x });
    x += own + GAP_PT;
  }
  return rows.flatMap((row, index) => [...(index ? [space(6)] : []), slabItem(besideEachOther(row))]);
}

function oneTable(kit: Kit, readings: ReadingTable, widthPt: number): FlowItem[] {
  const columns = columnsOf(kit, readings);
  const cells = readings.rows.map((row) => [row.label, ...row.cells]);
  const own = tableWidth(columns);
  const beside = Math.floor((widthPt + GAP_PT) / (own + GAP_PT));
  if (cells.length <= ROWS_BESIDE || beside < 2) return [table(kit.type, columns, cells, 'close')];
  const rows = tableRows(kit.type, columns, cells, 'close');
  const header = headerRow(kit.type, columns);
  const items: FlowItem[] = [];
  for (let at = 0; at < rows.length; at += beside * ROWS_DEEP) {
    if (at) items.push(space(6));
    items.push(slabItem(pieces(header, rows.slice(at, at + beside * ROWS_DEEP), beside, own)));
  }
  return items;
}

/** Rows in pieces of the same depth beside each other, each with its header. */
function pieces(header: Slab, rows: readonly Slab[], most: number, widthPt: number): Slab {
  const count = Math.min(most, Math.ceil(rows.length / ROWS_BESIDE));
  const deep = Math.ceil(rows.length / count);
  const placed = Array.from({ length: Math.ceil(rows.length / deep) }, (_, index) => ({
    slab: stack([header, ...rows.slice(index * deep, (index + 1) * deep)]),
    x: index * (widthPt + GAP_PT),
  }));
  return besideEachOther(placed);
}

function columnsOf(kit: Kit, readings: ReadingTable): Column[] {
  const heads = headsOf(readings);
  return heads.map((head, index): Column => {
    const style = index ? READING : ROW_LABEL;
    const cells = readings.rows.map((row) => (index ? (row.cells[index - 1] ?? '') : row.label));
    return {
      head,
      widthPt: naturalWidth(kit.type, { head, style }, cells),
      // Names of stations are words: they stand at the left, as the places do.
      align:
        index && cells.every((cell) => cell === '' || /\d/.test(cell.charAt(0)) || /^[−+]/.test(cell))
          ? 'decimal'
          : 'left',
      gapPt: 2,
      style,
    };
  });
}

/** One head a column; where only the cells are named, the column of places has none. */
function headsOf(readings: ReadingTable): string[] {
  const cells = Math.max(0, ...readings.rows.map((row) => row.cells.length));
  return readings.columns.length > cells ? readings.columns : ['', ...readings.columns];
}

/**
 * A table too wide is cut between columns; each part has the column of places again. Where rows are only counted, the place is the
 * first column (a target, an angle), and that one is repeated too.
 */
function cutToWidth(kit: Kit, readings: ReadingTable, widthPt: number): ReadingTable[] {
  const columns = columnsOf(kit, readings);
  const repeated = readings.rows.every(({ label }, index) => label === String(index + 1)) ? 1 : 0;
  const cellCount = columns.length - 1;
  if (tableWidth(columns) <= widthPt || cellCount <= repeated + 1) return [readings];
  let count = repeated + 1;
  while (count < cellCount && tableWidth(columns.slice(0, count + 2)) <= widthPt) count += 1;
  const heads = headsOf(readings);
  const part = (chosen: (index: number) => boolean): ReadingTable => ({
    title: null,
    columns: [heads[0] ?? '', ...heads.slice(1).filter((_, index) => chosen(index))],
    rows: readings.rows.map((row) => ({ label: row.label, cells: row.cells.filter((_, index) => chosen(index)) })),
  });
  const rest = part((index) => index < repeated || index >= count);
  return [part((index) => index < count), ...cutToWidth(kit, rest, widthPt)];
}
