import type { Unit } from '@/lib/units/unit';
import type { Layout } from '@/standards/types';
import { begin, emptied, keyOf, placesInOrder, Rows, waysOf } from './mapping-parts';
import type { ColumnKind, Mapped, MappingInput, TextMapping, Way } from './types';

type TargetCycles = Extract<Layout, { kind: 'target-cycles' }>;

/** No travel needs more targets than these. */
const MOST_TARGETS = 2000;
const lists: Record<Way, string> = { first: '/forward', second: '/backward' };
const words: Record<Way, string> = { first: 'in the + direction', second: 'in the − direction' };

const unitsOf = ({ quantity }: TargetCycles): { target: Unit; deviation: Unit } =>
  quantity === 'linear' ? { target: 'mm', deviation: 'µm' } : { target: '°', deviation: 'µm/m' };

function columns(layout: TargetCycles): ColumnKind[] {
  const { target, deviation } = unitsOf(layout);
  return [
    { role: 'position', label: 'target position', holds: 'figure', unit: target, hint: /target|position|nominal/i },
    { role: 'run', label: 'run', holds: 'count', unit: null, hint: /run|cycle|no\.?$/i },
    { role: 'direction', label: 'direction', holds: 'word', unit: null, hint: /dir|way/i },
    { role: 'deviation', label: 'deviation', holds: 'figure', unit: deviation, hint: /dev|error/i },
    {
      role: 'first',
      label: 'deviation, + direction',
      holds: 'figure',
      unit: deviation,
      several: true,
      hint: /forw|fwd|↑|\+/i,
    },
    {
      role: 'second',
      label: 'deviation, − direction',
      holds: 'figure',
      unit: deviation,
      several: true,
      hint: /back|bwd|↓|[-−]$/i,
    },
  ];
}

interface Taken {
  row: number;
  way: Way;
  /** From the run column, or null: the next one at this place. */
  run: string | null;
  text: string;
  line: number;
}

/** Positions with a deviation a line, or a line a position with the runs side by side. */
function map(input: MappingInput<TargetCycles>): Mapped {
  const { choices, cells } = input;
  const mapped = begin(choices, [
    { roles: ['position'], what: 'target positions' },
    { roles: ['deviation', 'first', 'second'], what: 'deviations' },
  ]);
  const isLong = choices.columns.includes('deviation');
  if (isLong && (choices.columns.includes('first') || choices.columns.includes('second'))) {
    const message =
      'One column of deviations with their direction, or columns for the + and the − direction: not both.';
    mapped.problems.push({ line: null, message });
  }
  if (mapped.problems.length > 0) return mapped;
  const rows = new Rows(choices.positions === 'match' ? sheetTargets(input) : null);
  const taken = isLong ? oneALine(input, rows, mapped) : sideBySide(input, rows, mapped);
  const places = runPlaces(taken);
  const standing = new Map<string, number>();
  for (const entry of taken) {
    const run = places(entry);
    const pointer = `${lists[entry.way]}/${entry.row}/${run}`;
    const before = standing.get(pointer);
    if (before !== undefined) {
      const message = `Run ${entry.run} ${words[entry.way]} at this target stands in line ${before} already.`;
      mapped.problems.push({ line: entry.line, message });
    } else if (entry.text !== '') {
      standing.set(pointer, entry.line);
      const role = isLong ? 'deviation' : entry.way;
      mapped.fills.push({ pointer, text: entry.text, role, line: entry.line });
    }
  }
  mapped.notes.push(...missingRuns(mapped, taken, (row) => targetText(input, rows, row)));
  if (choices.positions === 'replace') {
    const targets = rows.texts.map(({ text, line }, row) => {
      return { pointer: `/targets/${row}`, text, role: 'position' as const, line };
    });
    mapped.fills.unshift(...targets);
    mapped.clears = emptied(cells, ['/targets', ...Object.values(lists)], mapped.fills);
  }
  if (rows.texts.length > MOST_TARGETS) {
    mapped.problems.push({ line: null, message: `More than ${MOST_TARGETS} targets.` });
  }
  return mapped;
}

function sheetTargets({ layout, valueAt }: MappingInput<TargetCycles>): Map<string, number> {
  const { target } = unitsOf(layout);
  const found = new Map<string, number>();
  for (let row = 0; row < MOST_TARGETS; row++) {
    const value = valueAt(`/targets/${row}`, target);
    if (value !== null && !found.has(value)) found.set(value, row);
  }
  return found;
}

function rowOf(input: MappingInput<TargetCycles>, rows: Rows, line: (typeof input.lines)[number], mapped: Mapped) {
  const key = keyOf(input, line, 'position');
  const text = line.texts('position')[0] ?? '';
  const row = key === null ? null : rows.at(key, text, line.line);
  if (key === null) mapped.problems.push({ line: line.line, message: 'The target position is missing.' });
  else if (row === null) {
    mapped.problems.push({ line: line.line, message: `The sheet has no target ${text}.` });
  }
  return row;
}

function oneALine(input: MappingInput<TargetCycles>, rows: Rows, mapped: Mapped): Taken[] {
  const { lines, choices } = input;
  const ways = waysOf(lines, choices, 'position', mapped.problems);
  const hasRuns = choices.columns.includes('run');
  return lines.flatMap((line, index) => {
    const row = rowOf(input, rows, line, mapped);
    const way = ways[index];
    const text = line.texts('deviation')[0] ?? '';
    const run = hasRuns ? (line.values('run')[0] ?? '') : null;
    if (run === '') mapped.problems.push({ line: line.line, message: 'The number of the run is missing.' });
    return row === null || !way || run === '' ? [] : [{ row, way, run, text, line: line.line }];
  });
}

function sideBySide(input: MappingInput<TargetCycles>, rows: Rows, mapped: Mapped): Taken[] {
  return input.lines.flatMap((line) => {
    const row = rowOf(input, rows, line, mapped);
    if (row === null) return [];
    return (['first', 'second'] as const).flatMap((way) =>
      line.texts(way).map((text) => ({ row, way, run: null, text, line: line.line })),
    );
  });
}

/** Runs are numbered for each direction by itself: some count both ways through, so that forward has 1, 3, 5. */
function runPlaces(taken: readonly Taken[]): (entry: Taken) => number {
  const ordered = (way: Way) =>
    placesInOrder(taken.flatMap((entry) => (entry.way === way && entry.run !== null ? [entry.run] : [])));
  const places = { first: ordered('first'), second: ordered('second') };
  const next = new Map<string, number>();
  return ({ row, way, run }) => {
    if (run !== null) return places[way].get(run)!;
    const key = `${way} ${row}`;
    const place = next.get(key) ?? 0;
    next.set(key, place + 1);
    return place;
  };
}

function missingRuns({ fills }: Mapped, taken: readonly Taken[], nameOf: (row: number) => string): Mapped['notes'] {
  const rows = [...new Set(taken.map(({ row }) => row))];
  return (['first', 'second'] as const).flatMap((way) => {
    const counts = new Map(rows.map((row) => [row, 0]));
    let most = 0;
    for (const { pointer } of fills) {
      const [list, row, run] = pointer.slice(1).split('/');
      if (`/${list}` !== lists[way]) continue;
      counts.set(Number(row), (counts.get(Number(row)) ?? 0) + 1);
      most = Math.max(most, Number(run) + 1);
    }
    return [...counts]
      .filter(([, count]) => count < most)
      .map(([row, count]) => ({
        line: null,
        message: `Target ${nameOf(row)} has ${count} of ${most} runs ${words[way]}.`,
      }));
  });
}

function targetText({ choices, cells }: MappingInput<TargetCycles>, rows: Rows, row: number): string {
  return choices.positions === 'match' ? (cells[`/targets/${row}`]?.text ?? '') : rows.texts[row]!.text;
}

export const targetCycles: TextMapping<TargetCycles> = {
  columns,
  ways: words,
  directionsBy: ['column', 'travel', 'first', 'second'],
  matchesPositions: true,
  map,
};
