import type { EvaluationResult } from '@/lib/evaluation';
import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, span } from './parts';
import { placedRows, type RowTable, readRows, rowFields } from './rows';

type TwoRuns = LayoutOf<'two-runs'>;

const table: RowTable = {
  title: null,
  maximum: 120,
  columns: [
    { role: 'place', label: 'position', unit: 'mm', pointer: (row) => `/positions/${row}` },
    { role: 'reading', label: 'first run', unit: 'µm', pointer: (row) => `/first/${row}` },
    { role: 'reading', label: 'straightedge turned', unit: 'µm', pointer: (row) => `/second/${row}` },
  ],
};
const runs = table.columns.slice(1);

/** The whole first run, then the straightedge is turned over and the second is taken. */
function fields(_: TwoRuns, cells: Cells): SheetFields {
  const placed = placedRows(table, cells);
  return { setUp: [], tables: [rowFields(table, cells)], order: runs.flatMap(({ pointer }) => placed.map(pointer)) };
}

function assemble(layout: TwoRuns, values: SheetValues): Assembled {
  const { existing, figures } = readRows(table, values);
  if (figures.length < 3)
    return { input: null, reason: `Three positions read in both runs are needed; ${figures.length} so far.` };
  const positions = figures.map(([position]) => position!);
  return {
    input: {
      method: 'straightness-reversal',
      reference: layout.reference,
      positions,
      first: figures.map((row) => row[1]),
      second: figures.map((row) => row[2]),
    },
    basedOn: counted(figures.length, existing.length, 'positions'),
    lengthMm: span(positions),
    notes: [],
  };
}

function plot(_: TwoRuns, values: SheetValues, result: EvaluationResult | null): PlotSeries | null {
  const { figures } = readRows(table, values);
  const frame = { kind: 'line' as const, xLabel: 'position, mm' };
  if (result?.method === 'straightness-reversal' && result.machine.length === figures.length) {
    const points = (['machine', 'straightedge'] as const).flatMap((series) =>
      figures.map(([x], k) => ({ x: x!, y: result[series][k]!, series: series === 'machine' ? 'slide' : series })),
    );
    return { ...frame, yLabel: 'profile, µm', points };
  }
  const points = runs.flatMap(({ label, pointer }) =>
    readRows({ ...table, columns: [table.columns[0]!, { ...runs[0]!, pointer }] }, values).figures.map(([x, y]) => ({
      x: x!,
      y: y!,
      series: label,
    })),
  );
  return points.length ? { ...frame, yLabel: 'reading, µm', points } : null;
}

export const twoRuns: LayoutEngine<TwoRuns> = { fields, assemble, plot };
