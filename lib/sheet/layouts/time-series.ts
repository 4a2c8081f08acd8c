import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted } from './parts';
import { placedRows, type RowTable, readRows, rowFields } from './rows';

type TimeSeries = LayoutOf<'time-series'>;

const minutes = (row: number) => `/points/${row}/minutes`;
const reading = (row: number) => `/points/${row}/reading`;
const temperature = (row: number) => `/points/${row}/temperature`;

const table = (layout: TimeSeries): RowTable => ({
  title: null,
  maximum: 600,
  columns: [
    { role: 'place', label: 'time', unit: 'min', pointer: minutes },
    { role: 'reading', label: 'reading', unit: 'µm', pointer: reading },
    ...(layout.temperature
      ? [{ role: 'reading' as const, label: 'temperature', unit: '°C' as const, pointer: temperature, optional: true }]
      : []),
  ],
});

function fields(layout: TimeSeries, cells: Cells): SheetFields {
  const rows = table(layout);
  const taken = rows.columns.slice(1);
  return {
    setUp: [],
    tables: [rowFields(rows, cells)],
    order: placedRows(rows, cells).flatMap((row) => taken.map(({ pointer }) => pointer(row))),
  };
}

/** A reading without its temperature still counts; the range of temperatures is then that of the others. */
function assemble(layout: TimeSeries, values: SheetValues): Assembled {
  const { existing, figures } = readRows(table(layout), values);
  if (figures.length < 2) return { input: null, reason: `Two readings are needed; ${figures.length} so far.` };
  const points = figures.map(([at, read, celsius]) => ({
    minutes: at!,
    reading: read!,
    ...(celsius === undefined ? {} : { temperature: celsius }),
  }));
  const cold = layout.temperature ? points.filter((point) => !('temperature' in point)).length : 0;
  const missing = cold === 0 ? null : `${cold} of them without a temperature`;
  return {
    input: { method: 'drift', points },
    basedOn: counted(points.length, existing.length, 'readings') ?? missing,
    lengthMm: null,
    notes: [],
  };
}

function plot(layout: TimeSeries, values: SheetValues): PlotSeries | null {
  const { figures } = readRows(table(layout), values);
  const points = figures.map(([x, y]) => ({ x: x!, y: y! }));
  return points.length ? { kind: 'line', xLabel: 'time, min', yLabel: 'reading, µm', points } : null;
}

export const timeSeries: LayoutEngine<TimeSeries> = { fields, assemble, plot };
