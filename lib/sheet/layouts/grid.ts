import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, isFilled, readingField, rowsToOffer, setUpField } from './parts';

type Grid = LayoutOf<'grid'>;

const MAX_ROWS = 400;
const x = (row: number) => `/points/${row}/x`;
const y = (row: number) => `/points/${row}/y`;
const reading = (row: number) => `/points/${row}/reading`;
const indices = (length: number) => Array.from({ length }, (_, row) => row);

function fields(_: Grid, cells: Cells): SheetFields {
  const rows = indices(rowsToOffer(cells, (row) => [x(row), y(row), reading(row)], MAX_ROWS));
  const place = (row: number) => `x ${cells[x(row)]?.text ?? ''} y ${cells[y(row)]?.text ?? ''}, point ${row + 1}`;
  return {
    setUp: [],
    tables: [
      {
        title: null,
        columns: [
          { label: 'x', unit: 'mm' },
          { label: 'y', unit: 'mm' },
          { label: 'reading', unit: 'µm' },
        ],
        rows: rows.map((row) => ({
          label: `${row + 1}`,
          cells: [
            { field: setUpField(x(row), `x of point ${row + 1}`, 'mm', true) },
            { field: setUpField(y(row), `y of point ${row + 1}`, 'mm', true) },
            { field: readingField(reading(row), `reading at ${place(row)}`) },
          ],
        })),
      },
    ],
    order: rows.filter((row) => isFilled(cells, x(row)) && isFilled(cells, y(row))).map(reading),
  };
}

function pointsOf(values: SheetValues) {
  const existing = indices(MAX_ROWS).filter((row) => values.has(x(row)) && values.has(y(row)));
  const points = existing
    .filter((row) => values.has(reading(row)))
    .map((row) => ({ x: values.get(x(row))!, y: values.get(y(row))!, reading: values.get(reading(row))! }));
  return { existing, points };
}

function assemble(layout: Grid, values: SheetValues): Assembled {
  const { existing, points } = pointsOf(values);
  if (points.length < 4)
    return { input: null, reason: `Four points with a reading are needed; ${points.length} so far.` };
  return {
    input: { method: 'flatness', reference: layout.reference, points },
    basedOn: counted(points.length, existing.length, 'points'),
    lengthMm: null,
    notes: [],
  };
}

/** One line for each y, so that the face is seen from the side. */
function plot(_: Grid, values: SheetValues): PlotSeries | null {
  const { points } = pointsOf(values);
  if (points.length === 0) return null;
  return {
    kind: 'line',
    xLabel: 'x, mm',
    yLabel: 'reading, µm',
    points: points.map((point) => ({ x: point.x, y: point.reading, series: `y ${point.y} mm` })),
  };
}

export const grid: LayoutEngine<Grid> = { fields, assemble, plot };
