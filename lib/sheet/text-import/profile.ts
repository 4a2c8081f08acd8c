import type { Layout } from '@/standards/types';
import { begin, emptied, keyOf, Rows } from './mapping-parts';
import type { ColumnKind, Mapped, MappingInput, TextMapping } from './types';

type Profile = Extract<Layout, { kind: 'profile' }>;

/** More rows than a sheet of this layout ever offers. */
const MOST_ROWS = 2000;

function columns(): ColumnKind[] {
  return [
    { role: 'position', label: 'position', holds: 'figure', unit: 'mm', hint: /pos|place/i },
    { role: 'reading', label: 'reading', holds: 'figure', unit: 'µm', hint: /read|dev/i },
  ];
}

/** A position and a reading a line. */
function map(input: MappingInput<Profile>): Mapped {
  const { lines, choices, cells } = input;
  const mapped = begin(choices, [
    { roles: ['position'], what: 'positions' },
    { roles: ['reading'], what: 'readings' },
  ]);
  if (mapped.problems.length > 0) return mapped;
  const isReplacing = choices.positions === 'replace';
  const rows = new Rows(isReplacing ? null : sheetPositions(input));
  const standing = new Map<number, number>();
  for (const line of lines) {
    const key = keyOf(input, line, 'position');
    const text = line.texts('position')[0] ?? '';
    const row = key === null ? null : rows.at(key, text, line.line);
    const before = row === null ? undefined : standing.get(row);
    if (key === null) mapped.problems.push({ line: line.line, message: 'The position is missing.' });
    else if (row === null) mapped.problems.push({ line: line.line, message: `The sheet has no position ${text}.` });
    else if (before !== undefined) {
      mapped.problems.push({ line: line.line, message: `The position ${text} stands in line ${before} already.` });
    } else {
      standing.set(row, line.line);
      const fill = (field: 'position' | 'reading', written: string) => {
        const pointer = `/points/${row}/${field}`;
        if (written !== '') mapped.fills.push({ pointer, text: written, role: field, line: line.line });
      };
      if (isReplacing) fill('position', text);
      fill('reading', line.texts('reading')[0] ?? '');
    }
  }
  if (isReplacing) mapped.clears = emptied(cells, ['/points'], mapped.fills);
  return mapped;
}

function sheetPositions({ valueAt }: MappingInput<Profile>): Map<string, number> {
  const found = new Map<string, number>();
  for (let row = 0; row < MOST_ROWS; row++) {
    const value = valueAt(`/points/${row}/position`, 'mm');
    if (value !== null && !found.has(value)) found.set(value, row);
  }
  return found;
}

export const profile: TextMapping<Profile> = { columns, ways: null, directionsBy: [], matchesPositions: true, map };
