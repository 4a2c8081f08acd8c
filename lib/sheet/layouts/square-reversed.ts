import type { Cells, FieldTable, FieldTableCell, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import {
  counted,
  existingRows,
  isFilled,
  measuringLengthField,
  placeWords,
  readingField,
  rowsToOffer,
  setUpField,
  span,
} from './parts';

type Square = LayoutOf<'square-reversed'>;
type Arm = 'referenceArm' | 'measuredArm';
type Setting = 'first' | 'second';

const MAX_ROWS = 20;
const arms: Arm[] = ['referenceArm', 'measuredArm'];
const settings: Setting[] = ['first', 'second'];
const armWords: Record<Arm, string> = { referenceArm: 'reference arm', measuredArm: 'measured arm' };
const settingWords: Record<Setting, string> = { first: 'Square as first set up', second: 'Square turned over' };

/** The turned square is read at the places of the first setting, so that positions are written once. */
const position = (arm: Arm, row: number) => `/first/${arm}/points/${row}/position`;
const reading = (setting: Setting, arm: Arm, row: number) => `/${setting}/${arm}/points/${row}/reading`;

function rowsOf(cells: Cells, arm: Arm): number[] {
  const pointers = (row: number) => [position(arm, row), ...settings.map((setting) => reading(setting, arm, row))];
  return Array.from({ length: rowsToOffer(cells, pointers, MAX_ROWS) }, (_, row) => row);
}

function table(cells: Cells, setting: Setting, arm: Arm): FieldTable {
  const placeCell = (row: number): FieldTableCell =>
    setting === 'first'
      ? { field: setUpField(position(arm, row), `${armWords[arm]}, position, row ${row + 1}`, 'mm', true) }
      : { derived: cells[position(arm, row)]?.text.trim() ?? '' };
  const label = (row: number) =>
    `${settingWords[setting].toLowerCase()}, ${armWords[arm]}, ${placeWords(cells, position(arm, row), 'position', row)}`;
  return {
    title: `${settingWords[setting]}: ${armWords[arm]}`,
    columns: [
      { label: 'position', unit: 'mm' },
      { label: 'reading', unit: 'µm' },
    ],
    rows: rowsOf(cells, arm).map((row) => ({
      label: `${row + 1}`,
      cells: [placeCell(row), { field: readingField(reading(setting, arm, row), label(row)) }],
    })),
  };
}

function fields(_: Square, cells: Cells): SheetFields {
  const both = settings.flatMap((setting) => arms.map((arm) => ({ setting, arm })));
  return {
    setUp: [{ ...measuringLengthField, label: 'measuring length (left empty: that of the measured arm)' }],
    tables: both.map(({ setting, arm }) => table(cells, setting, arm)),
    order: both.flatMap(({ setting, arm }) =>
      rowsOf(cells, arm)
        .filter((row) => isFilled(cells, position(arm, row)))
        .map((row) => reading(setting, arm, row)),
    ),
  };
}

function pointsOf(values: SheetValues, setting: Setting, arm: Arm) {
  return existingRows(values, (row) => position(arm, row), MAX_ROWS)
    .filter((row) => values.has(reading(setting, arm, row)))
    .map((row) => ({ position: values.get(position(arm, row))!, reading: values.get(reading(setting, arm, row))! }));
}

function assemble(_: Square, values: SheetValues): Assembled {
  const settingOf = (setting: Setting) => ({
    referenceArm: { points: pointsOf(values, setting, 'referenceArm') },
    measuredArm: { points: pointsOf(values, setting, 'measuredArm') },
  });
  const [first, second] = [settingOf('first'), settingOf('second')];
  for (const [setting, part] of [['first', first] as const, ['second', second] as const])
    for (const arm of arms)
      if (part[arm].points.length < 2) {
        const where = `${settingWords[setting].toLowerCase()}, ${armWords[arm]}`;
        return {
          input: null,
          reason: `Two positions with a reading are needed on each arm; still to be taken: ${where}.`,
        };
      }
  const measuringLength =
    values.get('/measuringLength') ?? span(first.measuredArm.points.map((point) => point.position));
  const used = [first, second].flatMap((part) => arms.map((arm) => part[arm].points.length)).reduce((a, b) => a + b);
  const total =
    2 * arms.map((arm) => existingRows(values, (row) => position(arm, row), MAX_ROWS).length).reduce((a, b) => a + b);
  return {
    input: { method: 'squareness', first, second, measuringLength },
    basedOn: counted(used, total, 'readings'),
    lengthMm: measuringLength,
    notes: [],
  };
}

/** The measured arm in both settings: half their difference in slope is the square, the rest the machine. */
function plot(_: Square, values: SheetValues): PlotSeries | null {
  const points = settings.flatMap((setting) =>
    pointsOf(values, setting, 'measuredArm').map((point) => ({
      x: point.position,
      y: point.reading,
      series: settingWords[setting].toLowerCase(),
    })),
  );
  return points.length ? { kind: 'line', xLabel: 'measured arm, mm', yLabel: 'reading, µm', points } : null;
}

export const squareReversed: LayoutEngine<Square> = { fields, assemble, plot };
