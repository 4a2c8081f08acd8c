import type { EvaluationResult } from '@/lib/evaluation';
import type { Cells, Field, PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import {
  all,
  counted,
  derivedMean,
  existingRows,
  isFilled,
  measuringLengthField,
  placeWords,
  readingField,
  rowsToOffer,
  setUpField,
  span,
} from './parts';

type Angles = LayoutOf<'angles-by-position'>;

const MAX_ROWS = 40;
const position = (row: number) => `/positions/${row}`;
const sag = (row: number) => `/sag/${row}`;
const at = (angle: string, row: number) => `/readings/${angle}/${row}`;
const readings = (layout: Angles, row: number) => layout.anglesDeg.map((angle) => at(angle, row));

function readingAt(layout: Angles, cells: Cells, angle: string, row: number): Field {
  const place = placeWords(cells, position(row), layout.positionName, row);
  return readingField(at(angle, row), isTurned(layout) ? `${place}, ${turned(layout)} at ${angle}°` : place);
}

const turned = (layout: Angles): string => layout.turned ?? 'spindle';
/** With one angle nothing is turned, and the angle says nothing. */
const isTurned = ({ anglesDeg }: Angles) => anglesDeg.length > 1;

function fields(layout: Angles, cells: Cells): SheetFields {
  const offered = rowsToOffer(cells, (row) => [position(row), sag(row), ...readings(layout, row)], MAX_ROWS);
  const rows = Array.from({ length: offered }, (_, row) => row);
  const place = (row: number) => placeWords(cells, position(row), layout.positionName, row);
  return {
    setUp: [measuringLengthField],
    tables: [
      {
        title: null,
        columns: [
          { label: layout.positionName, unit: 'mm' },
          ...layout.anglesDeg.map((angle) => ({
            label: isTurned(layout) ? `${angle}°` : 'reading',
            unit: 'µm' as const,
          })),
          ...(layout.sag ? [{ label: 'sag of the mandrel', unit: 'µm' as const }] : []),
          ...(isTurned(layout) ? [{ label: 'mean', unit: 'µm' as const }] : []),
        ],
        rows: rows.map((row) => ({
          label: `${row + 1}`,
          cells: [
            { field: setUpField(position(row), `${layout.positionName}, row ${row + 1}`, 'mm', true) },
            ...layout.anglesDeg.map((angle) => ({ field: readingAt(layout, cells, angle, row) })),
            ...(layout.sag ? [{ field: setUpField(sag(row), `${place(row)}, sag of the mandrel`, 'µm', true) }] : []),
            ...(isTurned(layout) ? [{ derived: derivedMean(cells, readings(layout, row)) }] : []),
          ],
        })),
      },
    ],
    order: layout.anglesDeg.flatMap((angle) =>
      rows.filter((row) => isFilled(cells, position(row))).map((row) => at(angle, row)),
    ),
  };
}

function assemble(layout: Angles, values: SheetValues, { definition, localLengthMm }: AssembleOptions): Assembled {
  const existing = existingRows(values, position, MAX_ROWS);
  const withSag = layout.sag && existing.some((row) => values.has(sag(row)));
  const used = existing.filter((row) =>
    all(values, withSag ? [...readings(layout, row), sag(row)] : readings(layout, row)),
  );
  if (used.length < 2) {
    const missing = layout.anglesDeg.filter((angle) => !existing.some((row) => values.has(at(angle, row))));
    const some = missing.length > 0 && missing.length < layout.anglesDeg.length;
    return {
      input: null,
      reason: some
        ? `The readings with the ${turned(layout)} at ${missing.join('° and ')}° are still to be taken.`
        : `Two complete positions are needed; ${used.length === 1 ? 'one is' : 'none is'} complete so far.`,
    };
  }
  const positions = used.map((row) => values.get(position(row))!);
  const measuringLength = values.get('/measuringLength');
  return {
    input: {
      method: definition.method,
      positions,
      readings: Object.fromEntries(
        layout.anglesDeg.map((angle) => [angle, used.map((row) => values.get(at(angle, row))!)]),
      ),
      ...(measuringLength === undefined ? {} : { measuringLength }),
      ...(withSag ? { sag: used.map((row) => values.get(sag(row))!) } : {}),
      ...(definition.judge === undefined ? {} : { judge: definition.judge }),
      ...(definition.method === 'parallelism' && localLengthMm !== null ? { localLength: localLengthMm } : {}),
    },
    basedOn: counted(used.length, existing.length, 'positions'),
    // A range belongs to the positions that were read, whatever length it is wanted over.
    lengthMm: definition.judge === 'range' ? span(positions) : (measuringLength ?? span(positions)),
    notes:
      layout.sag && !withSag
        ? [
            {
              pointer: sag(used[0]!),
              severity: 'unusual',
              message: 'No sag of the mandrel is stated: the result contains it.',
            },
          ]
        : [],
  };
}

function plot(layout: Angles, values: SheetValues, result: EvaluationResult | null): PlotSeries | null {
  const existing = existingRows(values, position, MAX_ROWS);
  const points: PlotSeries['points'] = layout.anglesDeg.flatMap((angle) =>
    existing.flatMap((row) => {
      const y = values.get(at(angle, row));
      return y === undefined ? [] : [{ x: values.get(position(row))!, y, series: `${angle}°` }];
    }),
  );
  if (points.length === 0) return null;
  const frame = { kind: 'line' as const, xLabel: `${layout.positionName}, mm`, yLabel: 'reading, µm' };
  if (!result || (result.method !== 'parallelism' && result.method !== 'squareness-to-axis'))
    return { ...frame, points };
  const used = existing.filter((row) => all(values, readings(layout, row)));
  if (used.length !== result.means.length) return { ...frame, points };
  const x = used.map((row) => Fraction.from(values.get(position(row))!));
  const means = result.means.map((mean, k) => ({ x: x[k]!.toText(), y: mean, series: 'mean' }));
  return { ...frame, points: [...points, ...means], fit: fitLine(x, result.means, result.fitSlope) };
}

/** Ends of the least-squares line: it goes through the centre of the means with the slope given in µm/m. */
function fitLine(x: Fraction[], means: readonly string[], fitSlope: string): NonNullable<PlotSeries['fit']> {
  const centre = Fraction.mean(x);
  const height = Fraction.mean(means.map((mean) => Fraction.from(mean)));
  const slope = Fraction.from(fitSlope).dividedBy(Fraction.of(1000));
  const y = (at: Fraction) => height.plus(slope.times(at.minus(centre))).toText();
  const [first, last] = [Fraction.min(x), Fraction.max(x)];
  return { x1: first.toText(), y1: y(first), x2: last.toText(), y2: y(last) };
}

export const anglesByPosition: LayoutEngine<Angles> = { fields, assemble, plot };
