import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted } from './parts';
import { placedRows, type RowColumn, type RowTable, readRows, rowFields } from './rows';

type AngularRuns = LayoutOf<'angular-runs'>;

const place: RowColumn = { role: 'place', label: 'position', unit: 'mm', pointer: (row) => `/positions/${row}` };
const forward: RowColumn = { role: 'reading', label: 'out', unit: 'µm/m', pointer: (row) => `/forward/${row}` };
const backward: RowColumn = { role: 'reading', label: 'back', unit: 'µm/m', pointer: (row) => `/backward/${row}` };

const table = (columns: RowColumn[]): RowTable => ({ title: null, maximum: 60, columns: [place, ...columns] });
const columnsOf = (layout: AngularRuns) => (layout.bothDirections ? [forward, backward] : [forward]);

/** Out along the travel, then back from its far end. */
function fields(layout: AngularRuns, cells: Cells): SheetFields {
  const rows = table(columnsOf(layout));
  const placed = placedRows(rows, cells);
  return {
    setUp: [],
    tables: [rowFields(rows, cells)],
    order: [
      ...placed.map(forward.pointer),
      ...(layout.bothDirections ? [...placed].reverse().map(backward.pointer) : []),
    ],
  };
}

/** While nothing was read on the way back, the way out alone is evaluated and said so. */
function assemble(layout: AngularRuns, values: SheetValues): Assembled {
  const wanted = columnsOf(layout);
  const returned = layout.bothDirections && readRows(table([forward, backward]), values).figures.length >= 2;
  const { existing, figures } = readRows(table(returned ? wanted : [forward]), values);
  if (figures.length < 2) return { input: null, reason: `Two positions are needed; ${figures.length} so far.` };
  return {
    input: {
      method: 'angular-deviation',
      kind: layout.quantity,
      positions: figures.map((row) => row[0]),
      forward: figures.map((row) => row[1]),
      ...(returned ? { backward: figures.map((row) => row[2]) } : {}),
    },
    basedOn:
      counted(figures.length, existing.length, 'positions') ??
      (layout.bothDirections && !returned ? 'the way out alone' : null),
    lengthMm: null,
    notes: [],
  };
}

function plot(layout: AngularRuns, values: SheetValues): PlotSeries | null {
  const points = columnsOf(layout).flatMap((column) =>
    readRows(table([column]), values).figures.map(([x, y]) => ({ x: x!, y: y!, series: column.label })),
  );
  if (points.length === 0) return null;
  return { kind: 'line', xLabel: 'position, mm', yLabel: `${layout.quantity}, µm/m`, points };
}

export const angularRuns: LayoutEngine<AngularRuns> = { fields, assemble, plot };
