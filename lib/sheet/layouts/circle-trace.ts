import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, setUpField } from './parts';
import { placedRows, type RowTable, readRows, rowFields } from './rows';

type CircleTrace = LayoutOf<'circle-trace'>;

const table = (way: 'counterclockwise' | 'clockwise'): RowTable => ({
  title: way,
  maximum: 2500,
  columns: [
    { role: 'place', label: 'angle', unit: '°', pointer: (row) => `/${way}/${row}/angle` },
    { role: 'reading', label: 'radius less nominal', unit: 'µm', pointer: (row) => `/${way}/${row}/radius` },
  ],
});
const ways = [table('counterclockwise'), table('clockwise')];

function fields(_: CircleTrace, cells: Cells): SheetFields {
  return {
    setUp: [
      setUpField('/nominalRadius', 'nominal radius', 'mm'),
      setUpField('/arc', 'arc (left empty: a whole circle)', '°', true),
    ],
    tables: ways.map((way) => rowFields(way, cells)),
    order: ways.flatMap((way) => placedRows(way, cells).map(way.columns[1]!.pointer)),
  };
}

function assemble(layout: CircleTrace, values: SheetValues, { definition }: AssembleOptions): Assembled {
  const [counterclockwise, clockwise] = ways.map((way) => readRows(way, values));
  const enough = [counterclockwise!, clockwise!].map(({ figures }) => figures.length >= 5);
  if (!enough.includes(true)) {
    const most = Math.max(counterclockwise!.figures.length, clockwise!.figures.length);
    return { input: null, reason: `Five angles of one circle are needed; ${most} so far.` };
  }
  const points = (rows: typeof counterclockwise) => rows!.figures.map(([angle, radius]) => ({ angle, radius }));
  const arc = values.get('/arc');
  const read = [counterclockwise!, clockwise!].reduce((sum, { figures }) => sum + figures.length, 0);
  const placed = [counterclockwise!, clockwise!].reduce((sum, { existing }) => sum + existing.length, 0);
  const both = enough.every(Boolean);
  return {
    input: {
      method: 'circular',
      nominalRadius: values.get('/nominalRadius') ?? layout.nominalRadiusMm,
      ...(arc === undefined ? {} : { arc }),
      ...(enough[0] ? { counterclockwise: points(counterclockwise) } : {}),
      ...(enough[1] ? { clockwise: points(clockwise) } : {}),
      // Both directions together are judged only where both were taken.
      ...(definition.judge === undefined || (definition.judge === 'Gb' && !both) ? {} : { judge: definition.judge }),
    },
    basedOn: counted(read, placed, 'angles') ?? (both ? null : 'one direction alone'),
    lengthMm: null,
    notes: [],
  };
}

function plot(_: CircleTrace, values: SheetValues): PlotSeries | null {
  const points = ways.flatMap((way) =>
    readRows(way, values).figures.map(([x, y]) => ({ x: x!, y: y!, series: way.title! })),
  );
  return points.length ? { kind: 'polar', xLabel: 'angle, °', yLabel: 'radius less nominal, µm', points } : null;
}

export const circleTrace: LayoutEngine<CircleTrace> = { fields, assemble, plot };
