import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { choiceField, counted, surfaceOptions } from './parts';
import { placedRows, type RowTable, readRows, rowFields } from './rows';

type RoundTrace = LayoutOf<'round-trace'>;

const table: RowTable = {
  title: null,
  maximum: 720,
  columns: [
    { role: 'place', label: 'angle', unit: '°', pointer: (row) => `/points/${row}/angle` },
    { role: 'reading', label: 'reading', unit: 'µm', pointer: (row) => `/points/${row}/reading` },
  ],
};

function fields(_: RoundTrace, cells: Cells): SheetFields {
  return {
    setUp: [choiceField('/surface', 'measured surface', surfaceOptions)],
    tables: [rowFields(table, cells)],
    order: placedRows(table, cells).map(table.columns[1]!.pointer),
  };
}

function assemble(layout: RoundTrace, values: SheetValues): Assembled {
  const { existing, figures } = readRows(table, values);
  if (figures.length < 4)
    return { input: null, reason: `Four angles with a reading are needed; ${figures.length} so far.` };
  return {
    input: {
      method: 'roundness',
      reference: 'minimum-zone',
      surface: values.get('/surface') ?? layout.surface,
      points: figures.map(([angle, reading]) => ({ angle, reading })),
    },
    basedOn: counted(figures.length, existing.length, 'angles'),
    lengthMm: null,
    notes: [],
  };
}

function plot(_: RoundTrace, values: SheetValues): PlotSeries | null {
  const points = readRows(table, values).figures.map(([x, y]) => ({ x: x!, y: y! }));
  return points.length ? { kind: 'polar', xLabel: 'angle, °', yLabel: 'reading, µm', points } : null;
}

export const roundTrace: LayoutEngine<RoundTrace> = { fields, assemble, plot };
