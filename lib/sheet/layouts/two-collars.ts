import type { EvaluationResult } from '@/lib/evaluation';
import type { PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { all, readingField, setUpField } from './parts';

type Collars = LayoutOf<'two-collars'>;

const collars = [
  { pointer: '/D1', label: 'D1, near the headstock' },
  { pointer: '/D2', label: 'D2, far collar' },
];

function fields(): SheetFields {
  return {
    setUp: [setUpField('/distance', 'distance from collar to collar', 'mm')],
    tables: [
      {
        title: null,
        columns: [{ label: 'diameter', unit: 'mm' }],
        rows: collars.map(({ pointer, label }) => ({ label, cells: [{ field: readingField(pointer, label, 'mm') }] })),
      },
    ],
    order: collars.map(({ pointer }) => pointer),
  };
}

function assemble(_: Collars, values: SheetValues): Assembled {
  const diameters = all(values, ['/D1', '/D2']);
  if (!diameters) return { input: null, reason: 'Both diameters are needed.' };
  const distance = values.get('/distance');
  if (distance === undefined) return { input: null, reason: 'The distance from collar to collar is needed.' };
  const [D1, D2] = diameters;
  return { input: { method: 'two-collar', D1, D2, distance }, basedOn: null, lengthMm: distance, notes: [] };
}

/** Radius of the piece along the distance, as a difference to the collar near the headstock. */
function plot(_: Collars, values: SheetValues, result: EvaluationResult | null): PlotSeries | null {
  const distance = values.get('/distance');
  if (result?.method !== 'two-collar' || distance === undefined) return null;
  const points = [
    { x: '0', y: '0' },
    { x: distance, y: Fraction.from(result.deviation).negated().toText() },
  ];
  return { kind: 'line', xLabel: 'from the collar near the headstock, mm', yLabel: 'difference of radius, µm', points };
}

export const twoCollars: LayoutEngine<Collars> = { fields, assemble, plot };
