import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, derivedRange, readingField } from './parts';

type Circles = LayoutOf<'circles'>;

const at = (circle: number, k: number) => `/circles/${circle}/readings/${k}`;
const turned = (layout: Circles): string => layout.turned ?? 'spindle';
const indices = (length: number) => Array.from({ length }, (_, k) => k);

function fields(layout: Circles, cells: Cells): SheetFields {
  const circles = indices(layout.names.length);
  const angles = indices(layout.anglesDeg.length);
  return {
    setUp: [],
    tables: [
      {
        title: null,
        columns: layout.names.map((label) => ({ label, unit: 'µm' })),
        rows: [
          ...angles.map((k) => ({
            label: `${layout.anglesDeg[k]}°`,
            cells: circles.map((circle) => ({
              field: readingField(
                at(circle, k),
                `${layout.names[circle]}, ${turned(layout)} at ${layout.anglesDeg[k]}°`,
              ),
            })),
          })),
          {
            label: 'total reading',
            cells: circles.map((circle) => ({
              derived: derivedRange(
                cells,
                angles.map((k) => at(circle, k)),
              ),
            })),
          },
        ],
      },
    ],
    order: circles.flatMap((circle) => angles.map((k) => at(circle, k))),
  };
}

/** A circle counts when every angle of it was read. */
function assemble(layout: Circles, values: SheetValues): Assembled {
  const angles = indices(layout.anglesDeg.length);
  const complete = indices(layout.names.length).filter((circle) => angles.every((k) => values.has(at(circle, k))));
  if (complete.length === 0) {
    return { input: null, reason: `A whole circle is needed: readings at all ${angles.length} angles.` };
  }
  return {
    input: {
      method: 'axial-run-out',
      circles: complete.map((circle) => ({
        name: layout.names[circle]!,
        readings: angles.map((k) => values.get(at(circle, k))!),
      })),
    },
    basedOn: counted(complete.length, layout.names.length, 'circles'),
    lengthMm: null,
    notes: [],
  };
}

function plot(layout: Circles, values: SheetValues): PlotSeries | null {
  const points = layout.names.flatMap((series, circle) =>
    layout.anglesDeg.flatMap((x, k) => {
      const y = values.get(at(circle, k));
      return y === undefined ? [] : [{ x, y, series }];
    }),
  );
  return points.length ? { kind: 'polar', xLabel: `${turned(layout)} angle, °`, yLabel: 'reading, µm', points } : null;
}

export const circles: LayoutEngine<Circles> = { fields, assemble, plot };
