import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, span } from './parts';
import { placedRows, type RowTable, readRows, rowFields } from './rows';

type Diameters = LayoutOf<'diameters'>;

const table: RowTable = {
  title: null,
  maximum: 60,
  columns: [
    { role: 'place', label: 'from the headstock', unit: 'mm', pointer: (row) => `/sections/${row}/position` },
    { role: 'reading', label: 'diameter', unit: 'mm', pointer: (row) => `/sections/${row}/diameter` },
  ],
};

function fields(_: Diameters, cells: Cells): SheetFields {
  return {
    setUp: [],
    tables: [rowFields(table, cells)],
    order: placedRows(table, cells).map(table.columns[1]!.pointer),
  };
}

function assemble(_: Diameters, values: SheetValues): Assembled {
  const { existing, figures } = readRows(table, values);
  if (figures.length < 2)
    return { input: null, reason: `Two sections with a diameter are needed; ${figures.length} so far.` };
  const sections = figures.map(([position, diameter]) => ({ position: position!, diameter: diameter! }));
  return {
    input: { method: 'diameter-consistency', sections },
    basedOn: counted(sections.length, existing.length, 'sections'),
    lengthMm: span(sections.map(({ position }) => position)),
    notes: [],
  };
}

/** Each diameter less the one nearest to the headstock. */
function plot(_: Diameters, values: SheetValues): PlotSeries | null {
  const { figures } = readRows(table, values);
  if (figures.length === 0) return null;
  const sorted = [...figures].sort((a, b) => Fraction.from(a[0]!).compare(Fraction.from(b[0]!)));
  const first = Fraction.from(sorted[0]![1]!);
  const points = sorted.map(([x, diameter]) => ({
    x: x!,
    y: Fraction.from(diameter!).minus(first).times(Fraction.of(1000)).toText(),
  }));
  return { kind: 'line', xLabel: 'from the headstock, mm', yLabel: 'diameter less the first, µm', points };
}

export const diameters: LayoutEngine<Diameters> = { fields, assemble, plot };
