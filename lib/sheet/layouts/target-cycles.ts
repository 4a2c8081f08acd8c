import type { EvaluationResult } from '@/lib/evaluation';
import type { Cells, FieldTable, PlotSeries, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { Unit } from '@/lib/units/unit';
import type { Assembled, AssembleOptions, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { counted, existingRows, isFilled, readingField, rowsToOffer, setUpField, span } from './parts';

type TargetCycles = LayoutOf<'target-cycles'>;
type Way = 'forward' | 'backward';

const MAX_TARGETS = 60;
const waysOf = ({ oneWay }: TargetCycles): Way[] => (oneWay ? ['forward'] : ['forward', 'backward']);
const target = (row: number) => `/targets/${row}`;
const at = (way: Way, row: number, cycle: number) => `/${way}/${row}/${cycle}`;
const indices = (length: number) => Array.from({ length }, (_, k) => k);
const temperature = [
  {
    pointer: '/temperature/celsius',
    label: 'temperature of the scale, where the instrument did not bring it to 20 °C',
    unit: '°C',
  },
  { pointer: '/temperature/alpha', label: 'its expansion per kelvin', unit: 'µm/m' },
  { pointer: '/temperature/zero', label: 'position of the measuring zero', unit: 'mm' },
] as const;

const unitsOf = ({ quantity }: TargetCycles): { place: Unit; reading: Unit } =>
  quantity === 'linear' ? { place: 'mm', reading: 'µm' } : { place: '°', reading: 'µm/m' };

/** Cycle by cycle: all targets going up, then all going down, as the machine moves. */
function fields(layout: TargetCycles, cells: Cells): SheetFields {
  const cycles = indices(layout.cycles);
  const pointers = (row: number) => [
    target(row),
    ...waysOf(layout).flatMap((way) => cycles.map((cycle) => at(way, row, cycle))),
  ];
  const rows = indices(rowsToOffer(cells, pointers, MAX_TARGETS));
  const placed = rows.filter((row) => isFilled(cells, target(row))).sort((a, b) => byTarget(cells, a, b));
  return {
    setUp:
      layout.quantity === 'linear'
        ? temperature.map(({ pointer, label, unit }) => setUpField(pointer, label, unit, true))
        : [],
    tables: waysOf(layout).map((way) => table(layout, cells, way, rows)),
    order: cycles.flatMap((cycle) => [
      ...placed.map((row) => at('forward', row, cycle)),
      ...(layout.oneWay ? [] : [...placed].reverse().map((row) => at('backward', row, cycle))),
    ]),
  };
}

function table(layout: TargetCycles, cells: Cells, way: Way, rows: number[]): FieldTable {
  const { place, reading } = unitsOf(layout);
  const cycles = indices(layout.cycles);
  const name = (row: number) => cells[target(row)]?.text.trim() || `row ${row + 1}`;
  const title = way === 'forward' ? 'Going in the + direction' : 'Going in the − direction';
  return {
    title,
    columns: [
      { label: 'target', unit: place },
      ...cycles.map((cycle) => ({ label: layout.cycles === 1 ? 'deviation' : `run ${cycle + 1}`, unit: reading })),
    ],
    rows: rows
      .filter((row) => way === 'forward' || isFilled(cells, target(row)))
      .map((row) => ({
        label: `${row + 1}`,
        cells: [
          way === 'forward'
            ? { field: setUpField(target(row), `target, row ${row + 1}`, place, true) }
            : { derived: cells[target(row)]?.text.trim() ?? '' },
          ...cycles.map((cycle) => ({
            field: readingField(
              at(way, row, cycle),
              `${way === 'forward' ? '+' : '−'} direction, target ${name(row)}${layout.cycles === 1 ? '' : `, run ${cycle + 1}`}`,
              reading,
            ),
          })),
        ],
      })),
  };
}

/** Rising order of the targets as they are written; what cannot be read keeps its place at the end. */
function byTarget(cells: Cells, a: number, b: number): number {
  const number = (row: number) => Number(cells[target(row)]?.text.replace(',', '.').replace('\u2212', '-'));
  const difference = number(a) - number(b);
  return Number.isNaN(difference) ? a - b : difference;
}

/**
 * The cycles that are complete at every target that counts. A target counts when its first run was read; a direction counts when it was
 * read at every one of them.
 */
function readCycles(layout: TargetCycles, values: SheetValues) {
  const existing = existingRows(values, target, MAX_TARGETS);
  const used = existing.filter((row) => values.has(at('forward', row, 0)));
  const complete = (way: Way) =>
    indices(layout.cycles).findIndex((cycle) => !used.every((row) => values.has(at(way, row, cycle))));
  const runs = (way: Way) => (complete(way) < 0 ? layout.cycles : complete(way));
  const forward = runs('forward');
  const backward = runs('backward');
  return { existing, used, forward, backward };
}

function assemble(layout: TargetCycles, values: SheetValues, { definition }: AssembleOptions): Assembled {
  const { existing, used, forward, backward } = readCycles(layout, values);
  if (used.length < 2 || forward === 0) {
    const reason = `A whole run over two targets or more is needed; ${used.length} of ${existing.length} targets are read so far.`;
    return { input: null, reason };
  }
  // Both directions hold the same number of runs; the last one that has only its way out waits.
  const cycles = backward === 0 ? forward : Math.min(forward, backward);
  const list = (way: Way) => used.map((row) => indices(cycles).map((cycle) => values.get(at(way, row, cycle))!));
  const targets = used.map((row) => values.get(target(row))!);
  const celsius = values.get('/temperature/celsius');
  const alpha = values.get('/temperature/alpha');
  const zero = values.get('/temperature/zero');
  if ((celsius === undefined) !== (alpha === undefined) || (zero !== undefined && celsius === undefined)) {
    const reason = 'The temperature of the scale and its expansion belong together: both are needed, or neither.';
    return { input: null, reason };
  }
  const corrected = layout.quantity === 'linear' && celsius !== undefined;
  const judge = judgedOf(definition.judge, cycles, backward > 0);
  if (judge === null) return { input: null, reason: `${definition.judge} needs readings in the − direction too.` };
  return {
    input: {
      method: 'positioning',
      kind: layout.quantity,
      targets,
      forward: list('forward'),
      ...(backward > 0 ? { backward: list('backward') } : {}),
      ...(judge === undefined ? {} : { judge }),
      ...(corrected ? { temperature: { celsius, alpha, ...(zero === undefined ? {} : { zero }) } } : {}),
    },
    basedOn:
      counted(used.length, existing.length, 'targets') ??
      counted(cycles, layout.cycles, 'runs') ??
      (backward === 0 && !layout.oneWay ? 'the + direction alone' : null),
    lengthMm: layout.quantity === 'linear' ? span(targets) : null,
    notes: [],
  };
}

/**
 * The figure that is judged, as far as the runs give it: one run knows no A and no R, one direction only those of that direction.
 * @returns null where the other direction is needed
 */
function judgedOf(judge: string | undefined, cycles: number, both: boolean): string | null | undefined {
  if (judge === undefined) return undefined;
  const wanted = cycles === 1 ? judge.replace(/^[AR]/, 'E') : judge;
  if (both || wanted.endsWith('forward')) return wanted;
  return ['A', 'E', 'R'].includes(wanted) ? `${wanted}forward` : null;
}

function plot(layout: TargetCycles, values: SheetValues, result: EvaluationResult | null): PlotSeries | null {
  const { place, reading } = unitsOf(layout);
  const frame = { kind: 'line' as const, xLabel: `target, ${place}`, yLabel: `deviation, ${reading}` };
  if (result?.method === 'positioning') {
    const sorted = [...result.positions].sort((a, b) => Fraction.from(a.target).compare(Fraction.from(b.target)));
    const points = (['meanForward', 'meanBackward'] as const).flatMap((mean) =>
      sorted.flatMap((position) => {
        const y = position[mean];
        const series = mean === 'meanForward' ? 'mean in the + direction' : 'mean in the − direction';
        return y === undefined ? [] : [{ x: position.target, y, series }];
      }),
    );
    return { ...frame, points };
  }
  const points = existingRows(values, target, MAX_TARGETS).flatMap((row) => {
    const y = values.get(at('forward', row, 0));
    return y === undefined ? [] : [{ x: values.get(target(row))!, y, series: 'run 1 in the + direction' }];
  });
  return points.length ? { ...frame, points } : null;
}

export const targetCycles: LayoutEngine<TargetCycles> = { fields, assemble, plot };
