import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import {
  all,
  choiceField,
  counted,
  existingRows,
  isFilled,
  noBracketSag,
  placeWords,
  readingField,
  rowsToOffer,
  sagField,
  sagNote,
  setUpField,
  span,
  surfaceOptions,
  upField,
} from './parts';

type Swept = LayoutOf<'swept-sections'>;

const MAX_ROWS = 10;
export const SWEEP_ANGLES = ['0', '90', '180', '270'];
const position = (row: number) => `/sections/${row}/position`;
const at = (row: number, angle: string) => `/sections/${row}/readings/${angle}`;
const readings = (row: number) => SWEEP_ANGLES.map((angle) => at(row, angle));

function fields(_: Swept, cells: Cells): SheetFields {
  const offered = rowsToOffer(cells, (row) => [position(row), ...readings(row)], MAX_ROWS);
  const rows = Array.from({ length: offered }, (_, row) => row);
  const place = (row: number) => placeWords(cells, position(row), 'section at', row);
  return {
    setUp: [choiceField('/surface', 'swept surface', surfaceOptions), sagField, upField],
    tables: [
      {
        title: null,
        columns: [
          { label: 'section', unit: 'mm' },
          ...SWEEP_ANGLES.map((angle) => ({ label: `${angle}°`, unit: 'µm' as const })),
        ],
        rows: rows.map((row) => ({
          label: `${row + 1}`,
          cells: [
            { field: setUpField(position(row), `section, row ${row + 1}`, 'mm', true) },
            ...SWEEP_ANGLES.map((angle) => ({
              field: readingField(at(row, angle), `${place(row)}, spindle at ${angle}°`),
            })),
          ],
        })),
      },
    ],
    order: rows.filter((row) => isFilled(cells, position(row))).flatMap(readings),
  };
}

function assemble(layout: Swept, values: SheetValues, { basis }: AssembleOptions): Assembled {
  const existing = existingRows(values, position, MAX_ROWS);
  const used = existing.filter((row) => all(values, readings(row)));
  if (used.length === 0)
    return { input: null, reason: 'A section needs its position and the readings at 0°, 90°, 180° and 270°.' };
  const sag = values.get('/sag');
  const up = values.get('/up');
  return {
    input: {
      method: 'coaxiality',
      surface: values.get('/surface') ?? layout.surface,
      ...(sag === undefined ? {} : { sag }),
      ...(up === undefined ? {} : { up }),
      basis,
      plane: 'both',
      sections: used.map((row) => ({
        position: values.get(position(row))!,
        readings: Object.fromEntries(SWEEP_ANGLES.map((angle) => [angle, values.get(at(row, angle))!])),
      })),
    },
    basedOn: counted(used.length, existing.length, 'sections'),
    lengthMm: used.length > 1 ? span(used.map((row) => values.get(position(row))!)) : null,
    notes: sagNote(values, '/sag', noBracketSag),
  };
}

function plot(_: Swept, values: SheetValues): PlotSeries | null {
  const points = existingRows(values, position, MAX_ROWS).flatMap((row) =>
    SWEEP_ANGLES.flatMap((angle) => {
      const y = values.get(at(row, angle));
      return y === undefined ? [] : [{ x: angle, y, series: `section at ${values.get(position(row))} mm` }];
    }),
  );
  return points.length ? { kind: 'polar', xLabel: 'spindle angle, °', yLabel: 'reading, µm', points } : null;
}

export const sweptSections: LayoutEngine<Swept> = { fields, assemble, plot };
