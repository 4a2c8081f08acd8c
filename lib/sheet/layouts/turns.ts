import type { CellProblem, Cells, Field, PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, derivedRange, readingField } from './parts';

type Turns = LayoutOf<'turns'>;

const at = (insertion: number, angle: number) => `/insertions/${insertion}/readings/${angle}`;
const isClosing = (angleDeg: string) => Fraction.from(angleDeg).equals(Fraction.of(360));
const indices = (length: number) => Array.from({ length }, (_, k) => k);
const columnName = (layout: Turns, k: number) =>
  layout.names?.[k] ?? (layout.insertions === 1 ? 'reading' : `${layout.insertionLabel} ${k + 1}`);

function field(layout: Turns, insertion: number, angle: number): Field {
  const turn = layout.insertions === 1 ? '' : `${columnName(layout, insertion)}, `;
  return readingField(at(insertion, angle), `${turn}spindle at ${layout.anglesDeg[angle]}°`);
}

function fields(layout: Turns, cells: Cells): SheetFields {
  const columns = indices(layout.insertions);
  const angles = indices(layout.anglesDeg.length);
  return {
    setUp: [],
    tables: [
      {
        title: null,
        columns: columns.map((k) => ({ label: columnName(layout, k), unit: 'µm' })),
        rows: [
          ...angles.map((a) => ({
            label: isClosing(layout.anglesDeg[a]!) ? '360° (back at 0°)' : `${layout.anglesDeg[a]}°`,
            cells: columns.map((k) => ({ field: field(layout, k, a) })),
          })),
          {
            label: 'total reading',
            cells: columns.map((k) => ({
              derived: derivedRange(
                cells,
                angles.map((a) => at(k, a)),
              ),
            })),
          },
        ],
      },
    ],
    order: columns.flatMap((k) => angles.map((a) => at(k, a))),
  };
}

/** A turn counts when every angle but the closing one was read; an incomplete turn is left out whole. */
function assemble(layout: Turns, values: SheetValues, options: AssembleOptions): Assembled {
  const { judge } = options.definition;
  const judged = judge === undefined ? {} : { judge };
  const angles = indices(layout.anglesDeg.length);
  const needed = angles.filter((a) => !isClosing(layout.anglesDeg[a]!));
  const complete = indices(layout.insertions).filter((k) => needed.every((a) => values.has(at(k, a))));
  if (complete.length === 0) {
    const best = Math.max(...indices(layout.insertions).map((k) => needed.filter((a) => values.has(at(k, a))).length));
    return { input: null, reason: `A whole turn is needed: ${best} of ${needed.length} angles are read so far.` };
  }
  const insertions = complete.map((k) => {
    const present = angles.filter((a) => values.has(at(k, a)));
    return { k, angles: present.map((a) => layout.anglesDeg[a]!), readings: present.map((a) => values.get(at(k, a))!) };
  });
  // Two places of a turn have no first harmonic: the angles say nothing to the method then.
  if (needed.length < 3) {
    const plain = insertions.map(({ readings }) => ({ readings }));
    return {
      input: { method: 'run-out', ...judged, insertions: plain },
      basedOn: counted(complete.length, layout.insertions, `${layout.insertionLabel}s`),
      lengthMm: null,
      notes: [],
    };
  }
  const whole = insertions.every(({ readings }) => readings.length === angles.length);
  const closingMissing = whole ? null : 'without the closing reading';
  return {
    input: whole
      ? {
          method: 'run-out',
          ...judged,
          angles: layout.anglesDeg,
          insertions: insertions.map(({ readings }) => ({ readings })),
        }
      : {
          method: 'run-out',
          ...judged,
          insertions: insertions.map(({ readings, angles: own }) => ({ readings, angles: own })),
        },
    basedOn: counted(complete.length, layout.insertions, `${layout.insertionLabel}s`) ?? closingMissing,
    lengthMm: null,
    notes: complete.flatMap((k) => closingNote(layout, values, k, options.toleranceUm)),
  };
}

/** Back at the first angle the indicator must show the first value again, within a tenth of the tolerance (common practice). */
function closingNote(layout: Turns, values: SheetValues, k: number, toleranceUm: string | null): CellProblem[] {
  const closing = layout.anglesDeg.findIndex(isClosing);
  const first = values.get(at(k, 0));
  const last = closing < 0 ? undefined : values.get(at(k, closing));
  if (first === undefined || last === undefined || toleranceUm === null) return [];
  const difference = Fraction.from(last).minus(Fraction.from(first)).abs();
  if (difference.times(Fraction.of(10)).compare(Fraction.from(toleranceUm)) <= 0) return [];
  const message = `Back at 0° the reading differs by ${difference.toText()} µm from the first: more than a tenth of the tolerance.`;
  return [{ pointer: at(k, closing), severity: 'unusual', message }];
}

function plot(layout: Turns, values: SheetValues): PlotSeries | null {
  const points = indices(layout.insertions).flatMap((k) =>
    layout.anglesDeg.flatMap((x, a) => {
      const y = values.get(at(k, a));
      return y === undefined ? [] : [{ x, y, ...(layout.insertions > 1 ? { series: columnName(layout, k) } : {}) }];
    }),
  );
  return points.length ? { kind: 'polar', xLabel: 'spindle angle, °', yLabel: 'reading, µm', points } : null;
}

export const turns: LayoutEngine<Turns> = { fields, assemble, plot };
