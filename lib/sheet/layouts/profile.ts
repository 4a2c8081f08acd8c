import type { EvaluationResult } from '@/lib/evaluation';
import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, existingRows, isFilled, placeWords, readingField, rowsToOffer, setUpField, span } from './parts';

type Profile = LayoutOf<'profile'>;

const MAX_ROWS = 120;
const position = (row: number) => `/points/${row}/position`;
const reading = (row: number) => `/points/${row}/reading`;

function fields(_: Profile, cells: Cells): SheetFields {
  const offered = rowsToOffer(cells, (row) => [position(row), reading(row)], MAX_ROWS);
  const rows = Array.from({ length: offered }, (_, row) => row);
  return {
    setUp: [],
    tables: [
      {
        title: null,
        columns: [
          { label: 'position', unit: 'mm' },
          { label: 'reading', unit: 'µm' },
        ],
        rows: rows.map((row) => ({
          label: `${row + 1}`,
          cells: [
            { field: setUpField(position(row), `position, row ${row + 1}`, 'mm', true) },
            { field: readingField(reading(row), `reading at ${placeWords(cells, position(row), 'position', row)}`) },
          ],
        })),
      },
    ],
    order: rows.filter((row) => isFilled(cells, position(row))).map(reading),
  };
}

function pointsOf(values: SheetValues) {
  const existing = existingRows(values, position, MAX_ROWS);
  const used = existing.filter((row) => values.has(reading(row)));
  const points = used.map((row) => ({ position: values.get(position(row))!, reading: values.get(reading(row))! }));
  return { existing, points };
}

function assemble(layout: Profile, values: SheetValues, { localLengthMm }: AssembleOptions): Assembled {
  const { existing, points } = pointsOf(values);
  if (points.length < 3) {
    return { input: null, reason: `Three positions with a reading are needed; ${points.length} of them so far.` };
  }
  const localLength = localLengthMm ?? layout.localLengthMm;
  return {
    input: { method: 'straightness', reference: layout.reference, points, ...(localLength ? { localLength } : {}) },
    basedOn: counted(points.length, existing.length, 'positions'),
    lengthMm: span(points.map((point) => point.position)),
    notes: [],
  };
}

function plot(_: Profile, values: SheetValues, result: EvaluationResult | null): PlotSeries | null {
  const { points } = pointsOf(values);
  if (points.length === 0) return null;
  const series: PlotSeries = {
    kind: 'line',
    xLabel: 'position, mm',
    yLabel: 'reading, µm',
    points: points.map((point) => ({ x: point.position, y: point.reading })),
  };
  if (result?.method !== 'straightness') return series;
  const x = points.map((point) => Fraction.from(point.position));
  const slope = Fraction.from(result.slope).dividedBy(Fraction.of(1000));
  const y = (at: Fraction) => Fraction.from(result.intercept).plus(slope.times(at)).toText();
  const [first, last] = [Fraction.min(x), Fraction.max(x)];
  return { ...series, fit: { x1: first.toText(), y1: y(first), x2: last.toText(), y2: y(last) } };
}

export const profile: LayoutEngine<Profile> = { fields, assemble, plot };
