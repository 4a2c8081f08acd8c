import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, isFilled, readingField, rowsToOffer, setUpField } from './parts';

type RotationTurns = LayoutOf<'rotation-turns'>;

const MAX_TURNS = 60;
const MAX_ANGLES = 360;
const angle = (k: number) => `/angles/${k}`;
const at = (turn: number, k: number) => `/turns/${turn}/${k}`;
const indices = (length: number) => Array.from({ length }, (_, k) => k);
const unitOf = ({ direction }: RotationTurns) => (direction === 'tilt' ? 'µm/m' : 'µm') as 'µm' | 'µm/m';

/** Angles are those that are written; turns as many as the definition names, or as were taken over from a file. */
function sizes(layout: RotationTurns, has: (pointer: string) => boolean) {
  const angles = indices(MAX_ANGLES).filter((k) => has(angle(k)));
  const lastTurn = indices(MAX_TURNS).findLast((turn) => angles.some((k) => has(at(turn, k)))) ?? -1;
  return { angles, turns: indices(Math.max(layout.turns, lastTurn + 1)) };
}

function fields(layout: RotationTurns, cells: Cells): SheetFields {
  const { angles, turns } = sizes(layout, (pointer) => isFilled(cells, pointer));
  const taken = indices(layout.turns);
  const rows = indices(rowsToOffer(cells, (k) => [angle(k), ...taken.map((turn) => at(turn, k))], MAX_ANGLES));
  const unit = unitOf(layout);
  const place = (k: number) => (isFilled(cells, angle(k)) ? `at ${cells[angle(k)]!.text.trim()}°` : `row ${k + 1}`);
  return {
    setUp: [],
    tables: [
      {
        title: null,
        columns: [{ label: 'angle', unit: '°' }, ...turns.map((turn) => ({ label: `turn ${turn + 1}`, unit }))],
        rows: rows.map((k) => ({
          label: `${k + 1}`,
          cells: [
            { field: setUpField(angle(k), `angle, row ${k + 1}`, '°', true) },
            ...turns.map((turn) => ({ field: readingField(at(turn, k), `turn ${turn + 1}, ${place(k)}`, unit) })),
          ],
        })),
      },
    ],
    order: turns.flatMap((turn) => angles.map((k) => at(turn, k))),
  };
}

/** A turn counts when it was read at every angle that is written; a row without its angle is left out. */
function assemble(layout: RotationTurns, values: SheetValues, { definition }: AssembleOptions): Assembled {
  const { angles, turns } = sizes(layout, (pointer) => values.has(pointer));
  if (angles.length < 4) return { input: null, reason: `Four angles are needed; ${angles.length} are written.` };
  const complete = turns.filter((turn) => angles.every((k) => values.has(at(turn, k))));
  if (complete.length < 2)
    return { input: null, reason: `Two whole turns are needed; ${complete.length} of ${turns.length} so far.` };
  return {
    input: {
      method: 'axis-of-rotation',
      direction: layout.direction,
      turns: complete.map((turn) => angles.map((k) => values.get(at(turn, k))!)),
      angles: angles.map((k) => values.get(angle(k))!),
      ...(definition.judge === undefined ? {} : { judge: definition.judge }),
    },
    basedOn: counted(complete.length, turns.length, 'turns'),
    lengthMm: null,
    notes: [],
  };
}

function plot(layout: RotationTurns, values: SheetValues): PlotSeries | null {
  const { angles, turns } = sizes(layout, (pointer) => values.has(pointer));
  const points = turns.flatMap((turn) =>
    angles.flatMap((k) => {
      const y = values.get(at(turn, k));
      return y === undefined ? [] : [{ x: values.get(angle(k))!, y, series: `turn ${turn + 1}` }];
    }),
  );
  if (points.length === 0) return null;
  return { kind: 'polar', xLabel: 'spindle angle, °', yLabel: `reading, ${unitOf(layout)}`, points };
}

export const rotationTurns: LayoutEngine<RotationTurns> = { fields, assemble, plot };
