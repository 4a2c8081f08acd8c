import type { Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, derivedRange, isFilled, readingField, setUpField } from './parts';

type Stations = LayoutOf<'stations'>;

const MAX_STATIONS = 60;
const name = (station: number) => `/stations/${station}/name`;
const at = (station: number, repeat: number) => `/stations/${station}/readings/${repeat}`;
const indices = (length: number) => Array.from({ length }, (_, k) => k);

/** Rows: the stations that are named, and one more. Their names come with the plan, from the turret. */
function fields(layout: Stations, cells: Cells): SheetFields {
  const repeats = indices(layout.repeats);
  const last = indices(MAX_STATIONS).findLast(
    (station) => isFilled(cells, name(station)) || repeats.some((repeat) => isFilled(cells, at(station, repeat))),
  );
  const stations = indices(Math.min((last ?? -1) + 2, MAX_STATIONS));
  const called = (station: number) => cells[name(station)]?.text.trim() || `row ${station + 1}`;
  return {
    setUp: layout.radiusMm === null ? [] : [setUpField('/radius', 'radius at which it is read', 'mm', true)],
    tables: [
      {
        title: null,
        columns: [
          { label: 'station', unit: null },
          ...repeats.map((repeat) => ({ label: `index ${repeat + 1}`, unit: 'µm' as const })),
          { label: 'range', unit: 'µm' },
        ],
        rows: stations.map((station) => ({
          label: `${station + 1}`,
          cells: [
            {
              field: {
                pointer: name(station),
                role: 'set-up' as const,
                unit: null,
                label: `station, row ${station + 1}`,
                optional: true,
              },
            },
            ...repeats.map((repeat) => ({
              field: readingField(at(station, repeat), `station ${called(station)}, index ${repeat + 1}`),
            })),
            {
              derived: derivedRange(
                cells,
                repeats.map((repeat) => at(station, repeat)),
              ),
            },
          ],
        })),
      },
    ],
    order: repeats.flatMap((repeat) =>
      stations.filter((station) => isFilled(cells, name(station))).map((station) => at(station, repeat)),
    ),
  };
}

/** A station counts when every one of its repeats was read. */
function assemble(layout: Stations, values: SheetValues, { definition }: AssembleOptions): Assembled {
  const repeats = indices(layout.repeats);
  const existing = indices(MAX_STATIONS).filter((station) => values.has(name(station)));
  const used = existing.filter((station) => repeats.every((repeat) => values.has(at(station, repeat))));
  const needed = definition.judge === 'accuracy' ? 2 : 1;
  if (used.length < needed) {
    const reason = `${needed === 1 ? 'One station' : 'Two stations'} with all ${layout.repeats} readings must be complete; ${used.length} so far.`;
    return { input: null, reason };
  }
  const radius = values.get('/radius');
  return {
    input: {
      method: 'indexing',
      stations: used.map((station) => ({
        name: values.get(name(station))!,
        readings: repeats.map((repeat) => values.get(at(station, repeat))!),
      })),
      ...(radius === undefined ? {} : { radius }),
      ...(definition.judge === undefined ? {} : { judge: definition.judge }),
    },
    basedOn: counted(used.length, existing.length, 'stations'),
    lengthMm: null,
    notes: [],
  };
}

function plot(layout: Stations, values: SheetValues): PlotSeries | null {
  const points = indices(MAX_STATIONS).flatMap((station) =>
    indices(layout.repeats).flatMap((repeat) => {
      const y = values.get(at(station, repeat));
      return y === undefined ? [] : [{ x: String(station + 1), y, series: `index ${repeat + 1}` }];
    }),
  );
  return points.length ? { kind: 'line', xLabel: 'row of the station', yLabel: 'reading, µm', points } : null;
}

export const stations: LayoutEngine<Stations> = { fields, assemble, plot };
