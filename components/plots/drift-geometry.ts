import type { Drawing, DrawingItem } from '@/components/plots/drawing';
import { type Point, polyline, text } from '@/components/plots/drawing-parts';
import { coordinate } from '@/components/plots/number';
import { extentOf, figure, marker } from '@/components/plots/plot-frame';
import { withUnit } from '@/lib/sheet/shown-unit';
import type { ShownIn } from '@/standards/types';

export interface DriftPointInput {
  measuredOn: string;
  /** As it stands in the report, in the unit of the test; a typographic minus is understood. */
  asLeftMm: string;
}

const size = { widthPx: 300, heightPx: 130 };
const room = { left: 12, right: 66, top: 22, bottom: 24 };
const letterPx = 14;

/**
 * As-left deviations of one test over the years: a mark a report, the tolerance as a dashed line on the side or sides where it is, zero
 * as a thin line. Figures stand as they were issued; only the marks' places are computed.
 */
export function driftDrawing(
  points: DriftPointInput[],
  toleranceMm: string | null,
  title: string,
  unit: ShownIn = 'mm',
): Drawing {
  const dates = points.map(({ measuredOn }) => Date.parse(measuredOn));
  const values = points.map(({ asLeftMm }) => place(asLeftMm));
  const tolerance = toleranceMm === null ? null : place(toleranceMm);
  const signed = values.some((value) => value < 0);
  const bounds = tolerance === null ? [] : signed ? [tolerance, -tolerance] : [tolerance];
  const [lowY, highY] = extentOf([0, ...values, ...bounds]);
  const [firstX, lastX] = extentOf(dates);
  const right = size.widthPx - room.right;
  const bottom = size.heightPx - room.bottom;
  const x = (date: number) =>
    lastX === firstX
      ? (room.left + right) / 2
      : room.left + 6 + ((date - firstX) / (lastX - firstX)) * (right - room.left - 12);
  const y = (value: number) =>
    highY === lowY ? bottom : bottom - ((value - lowY) / (highY - lowY)) * (bottom - room.top);
  const path = dates.map((date, index): Point => [x(date), y(values[index] ?? 0)]);
  const last = points.at(-1);
  const across = (value: number, dash?: number[]): DrawingItem =>
    polyline(
      [
        [room.left, y(value)],
        [right, y(value)],
      ],
      dash ? { stroke: 'ink', widthPx: 1.5, dash } : { stroke: 'line', widthPx: 1 },
    );
  return {
    ...size,
    description: words(points, toleranceMm, title, unit),
    items: [
      across(0),
      ...bounds.map((bound) => across(bound, [6, 4])),
      ...(tolerance === null || toleranceMm === null
        ? []
        : [text(right + 6, y(tolerance) + 5, `T ${toleranceMm}`, { sizePx: letterPx, mono: true, ink: 'ink2' })]),
      polyline(path, { stroke: 'blue' }),
      ...path.flatMap((point) => marker('plus', point)),
      ...yearLabels(points, dates.map(x)),
      ...(last
        ? [
            text(
              right + 6,
              besideTolerance(path.at(-1)?.[1] ?? 0, tolerance === null ? null : y(tolerance)),
              figure(last.asLeftMm),
              { sizePx: letterPx, mono: true, ink: 'blue' },
            ),
          ]
        : []),
    ],
  };
}

const place = (shown: string) => coordinate(shown.replace('−', '-').replace(',', '.').replace('+', ''));
/** Where the last figure stands: level with its mark, but clear of the tolerance's own figure. */
function besideTolerance(markY: number, toleranceY: number | null): number {
  const own = markY + 5;
  const other = toleranceY === null ? null : toleranceY + 5;
  if (other === null || Math.abs(own - other) >= letterPx + 2) return own;
  return markY >= (toleranceY ?? 0) ? other + letterPx + 2 : other - letterPx - 2;
}

/** The first and the last year; in between the marks speak for themselves. */
function yearLabels(points: DriftPointInput[], places: number[]): DrawingItem[] {
  const first = points[0]?.measuredOn.slice(0, 4);
  const last = points.at(-1)?.measuredOn.slice(0, 4);
  const label = (year: string | undefined, at: number | undefined, anchor: 'start' | 'end') =>
    year === undefined || at === undefined
      ? []
      : [
          text(at + (anchor === 'start' ? -6 : 6), size.heightPx - 6, year, {
            sizePx: letterPx,
            mono: true,
            ink: 'ink2',
            anchor,
          }),
        ];
  return first === last
    ? label(first, places[0], 'start')
    : [...label(first, places[0], 'start'), ...label(last, places.at(-1), 'end')];
}

function words(points: DriftPointInput[], toleranceMm: string | null, title: string, unit: ShownIn): string {
  const figure = (text: string) => withUnit(text, unit);
  const readings = points.map(({ measuredOn, asLeftMm }) => `${measuredOn.slice(0, 4)} ${figure(asLeftMm)}`).join(', ');
  return `${title}, as left: ${readings}${toleranceMm === null ? '' : `; tolerance ${figure(toleranceMm)}`}`;
}
