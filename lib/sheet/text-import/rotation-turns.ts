import type { Unit } from '@/lib/units/unit';
import type { Layout } from '@/standards/types';
import { begin, emptied, keyOf, placesInOrder, Rows } from './mapping-parts';
import type { ColumnKind, Mapped, MappingInput, ReadLine, TextMapping } from './types';

type RotationTurns = Extract<Layout, { kind: 'rotation-turns' }>;

function columns({ direction }: RotationTurns): ColumnKind[] {
  const unit: Unit = direction === 'tilt' ? 'µm/m' : 'µm';
  return [
    { role: 'angle', label: 'angle', holds: 'figure', unit: '°', hint: /angle|deg|°/i },
    { role: 'turn', label: 'turn', holds: 'count', unit: null, hint: /turn|rev/i },
    { role: 'reading', label: 'reading', holds: 'figure', unit, several: true, hint: /read|dev|probe|sensor/i },
  ];
}

/** An angle and a reading a line with the number of the turn, or a line an angle with the turns side by side. */
function map(input: MappingInput<RotationTurns>): Mapped {
  const { lines, choices, cells } = input;
  const mapped = begin(choices, [
    { roles: ['angle'], what: 'angles' },
    { roles: ['reading'], what: 'readings' },
  ]);
  if (mapped.problems.length > 0) return mapped;
  const rows = new Rows(null);
  const hasTurns = choices.columns.includes('turn');
  const turns = placesInOrder(hasTurns ? lines.flatMap((line) => line.values('turn').slice(0, 1).filter(Boolean)) : []);
  const counts = new Map<number, number>();
  const standing = new Map<string, number>();
  for (const line of lines) {
    const key = keyOf(input, line, 'angle');
    if (key === null) {
      mapped.problems.push({ line: line.line, message: 'The angle is missing.' });
      continue;
    }
    const row = rows.at(key, line.texts('angle')[0]!, line.line)!;
    const first = firstTurn(line, hasTurns, turns, counts.get(row) ?? 0);
    if (first === null) {
      mapped.problems.push({ line: line.line, message: 'The number of the turn is missing.' });
      continue;
    }
    const texts = line.texts('reading');
    counts.set(row, (counts.get(row) ?? 0) + texts.length);
    for (const [offset, text] of texts.entries()) {
      const pointer = `/turns/${first + offset}/${row}`;
      const before = standing.get(pointer);
      if (text === '') continue;
      if (before === undefined) {
        standing.set(pointer, line.line);
        mapped.fills.push({ pointer, text, role: 'reading', line: line.line });
      } else {
        const message = `Turn ${first + offset + 1} at ${line.texts('angle')[0]}° stands in line ${before} already.`;
        mapped.problems.push({ line: line.line, message });
      }
    }
  }
  mapped.notes = missingTurns(mapped, rows);
  const angles = rows.texts.map(({ text, line }, row) => {
    return { pointer: `/angles/${row}`, text, role: 'angle' as const, line };
  });
  mapped.fills.unshift(...angles);
  mapped.clears = emptied(cells, ['/angles', '/turns'], mapped.fills);
  return mapped;
}

function firstTurn(line: ReadLine, hasTurns: boolean, turns: Map<string, number>, next: number): number | null {
  return hasTurns ? (turns.get(line.values('turn')[0] ?? '') ?? null) : next;
}

function missingTurns({ fills }: Mapped, rows: Rows): Mapped['notes'] {
  const counts = rows.texts.map(() => 0);
  let most = 0;
  for (const { pointer } of fills) {
    const [turn, row] = pointer.split('/').slice(2).map(Number) as [number, number];
    counts[row]! += 1;
    most = Math.max(most, turn + 1);
  }
  return counts.flatMap((count, row) =>
    count < most ? [{ line: null, message: `At ${rows.texts[row]!.text}° there are ${count} of ${most} turns.` }] : [],
  );
}

export const rotationTurns: TextMapping<RotationTurns> = {
  columns,
  ways: null,
  directionsBy: [],
  matchesPositions: false,
  map,
};
