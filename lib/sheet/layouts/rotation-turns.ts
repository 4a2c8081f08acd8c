import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, isFilled, readingField, setUpField } from './parts';

type RotationTurns = LayoutOf<'rotation-turns'>;

const MAX_TURNS = 60;
const MAX_ANGLES = 360;
const angle = (k: number) => `/angles/${k}`;
const at = (turn: number, k: number) => `/turns/${turn}/${k}`;
const indices = (length: number) => Array.from({ length }, (_, k) => k);
const unitOf = ({ direction }: RotationTurns) => (direction === 'tilt' ? 'µm/m' : 'µm') as 'µm' | 'µm/m';

/** Angles are those that are written; turns as many as the definition names, or as were taken over from a file. */
function sizes(layout: RotationTurns, has: (pointer: string) => boolean) {
  const lastAngle = indices(MAX_ANGLES).findLast((k) => has(angle(k)));
  const angles = lastAngle === undefined ? layout.anglesDeg.length : lastAngle + 1;
  const lastTurn = indices(MAX_TURNS).findLast((turn) => indices(angles).some((k) => has(at(turn, k)))) ?? -1;
  return { angles: indices(angles), turns: indices(Math.max(layout.turns, lastTurn + 1)) };
}

function fields(layout: RotationTurns, cells: Cells): SheetFields {
  const { angles, turns } = sizes(layout, (pointer) => isFilled(cells, pointer));
  const unit = unitOf(layout);
  const name = (k: number) => cells[angle(k)]?.text.trim() || layout.anglesDeg[k] || '';
  return {
    setUp: [],
    tables: [
      {
        title: null,
        columns: [{ label: 'angle', unit: '°' }, ...turns.map((turn) => ({ label: `turn ${turn + 1}`, unit }))],
        rows: angles.map((k) => ({
          label: `${k + 1}`,
          cells: [
            { field: setUpField(angle(k), `angle, row ${k + 1}`, '°', true) },
            ...turns.map((turn) => ({ field: readingField(at(turn, k), `turn ${turn + 1}, at ${name(k)}°`, unit) })),
          ],
        })),
      },
    ],
    order: turns.flatMap((turn) => angles.map((k) => at(turn, k))),
  };
}

/** A turn counts when every angle of it was read. */
function assemble(layout: RotationTurns, values: SheetValues, { definition }: AssembleOptions): Assembled {
  const { angles, turns } = sizes(layout, (pointer) => values.has(pointer));
  const complete = turns.filter((turn) => angles.every((k) => values.has(at(turn, k))));
  if (complete.length < 2)
    return { input: null, reason: `Two whole turns are needed; ${complete.length} of ${turns.length} so far.` };
  const written = angles.filter((k) => values.has(angle(k)));
  return {
    input: {
      method: 'axis-of-rotation',
      direction: layout.direction,
      turns: complete.map((turn) => angles.map((k) => values.get(at(turn, k))!)),
      ...(written.length === angles.length ? { angles: angles.map((k) => values.get(angle(k))!) } : {}),
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
      const x = values.get(angle(k)) ?? layout.anglesDeg[k];
      return y === undefined || x === undefined ? [] : [{ x, y, series: `turn ${turn + 1}` }];
    }),
  );
  if (points.length === 0) return null;
  return { kind: 'polar', xLabel: 'spindle angle, °', yLabel: `reading, ${unitOf(layout)}`, points };
}

export const rotationTurns: LayoutEngine<RotationTurns> = { fields, assemble, plot };
