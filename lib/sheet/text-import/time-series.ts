import type { Layout } from '@/standards/types';
import { begin, emptied, keyOf } from './mapping-parts';
import type { ColumnKind, Mapped, MappingInput, TextMapping } from './types';

type TimeSeries = Extract<Layout, { kind: 'time-series' }>;

function columns({ temperature }: TimeSeries): ColumnKind[] {
  const degrees: ColumnKind[] = [
    { role: 'temperature', label: 'temperature', holds: 'figure', unit: '°C', hint: /temp|°C/i },
  ];
  return [
    { role: 'minutes', label: 'minutes', holds: 'figure', unit: 'min', hint: /min|time/i },
    { role: 'reading', label: 'reading', holds: 'figure', unit: 'µm', hint: /read|drift|dev/i },
    ...(temperature ? degrees : []),
  ];
}

/** A time and a reading a line; they take the place of what stood there. */
function map(input: MappingInput<TimeSeries>): Mapped {
  const { lines, choices, cells } = input;
  const mapped = begin(choices, [
    { roles: ['minutes'], what: 'minutes' },
    { roles: ['reading'], what: 'readings' },
  ]);
  if (mapped.problems.length > 0) return mapped;
  const standing = new Map<string, number>();
  for (const line of lines) {
    const minutes = keyOf(input, line, 'minutes');
    const before = minutes === null ? undefined : standing.get(minutes);
    if (minutes === null) mapped.problems.push({ line: line.line, message: 'The minutes are missing.' });
    else if (before !== undefined) {
      const message = `${line.texts('minutes')[0]} minutes stand in line ${before} already.`;
      mapped.problems.push({ line: line.line, message });
    } else {
      const row = standing.size;
      standing.set(minutes, line.line);
      for (const role of ['minutes', 'reading', 'temperature'] as const) {
        const text = line.texts(role)[0] ?? '';
        if (text !== '') mapped.fills.push({ pointer: `/points/${row}/${role}`, text, role, line: line.line });
      }
    }
  }
  mapped.clears = emptied(cells, ['/points'], mapped.fills);
  return mapped;
}

export const timeSeries: TextMapping<TimeSeries> = {
  columns,
  ways: null,
  directionsBy: [],
  matchesPositions: false,
  map,
};
