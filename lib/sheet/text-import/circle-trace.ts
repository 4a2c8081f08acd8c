import { Fraction } from '@/lib/units/fraction';
import type { Layout } from '@/standards/types';
import { begin, emptied, keyOf, waysOf } from './mapping-parts';
import type { ColumnKind, Mapped, MappingInput, TextMapping, Way } from './types';

type CircleTrace = Extract<Layout, { kind: 'circle-trace' }>;

const words: Record<Way, string> = { first: 'clockwise', second: 'counterclockwise' };
const turn = Fraction.of(360);

function columns(): ColumnKind[] {
  return [
    { role: 'angle', label: 'angle', holds: 'figure', unit: '°', hint: /angle|deg|°/i },
    { role: 'direction', label: 'direction', holds: 'word', unit: null, hint: /dir|way|sense/i },
    { role: 'radius', label: 'radius, departure from nominal', holds: 'figure', unit: 'µm', hint: /rad|dev/i },
    { role: 'first', label: 'radius, clockwise', holds: 'figure', unit: 'µm', hint: /^cw|^clock/i },
    { role: 'second', label: 'radius, counterclockwise', holds: 'figure', unit: 'µm', hint: /ccw|counter/i },
  ];
}

/** An angle and a radius a line, or both directions side by side. A direction that the text has takes the place of what stood there. */
function map(input: MappingInput<CircleTrace>): Mapped {
  const { lines, choices, cells } = input;
  const mapped = begin(choices, [
    { roles: ['angle'], what: 'angles' },
    { roles: ['radius', 'first', 'second'], what: 'radii' },
  ]);
  const isLong = choices.columns.includes('radius');
  if (isLong && (choices.columns.includes('first') || choices.columns.includes('second'))) {
    const message = 'One column of radii with their direction, or columns clockwise and counterclockwise: not both.';
    mapped.problems.push({ line: null, message });
  }
  if (mapped.problems.length > 0) return mapped;
  const known = isLong ? waysOf(lines, choices, 'angle', mapped.problems) : [];
  const counts: Record<Way, number> = { first: 0, second: 0 };
  const standing = new Map<string, number>();
  lines.forEach((line, index) => {
    const angle = keyOf(input, line, 'angle');
    if (angle === null) {
      mapped.problems.push({ line: line.line, message: 'The angle is missing.' });
      return;
    }
    const ways: Way[] = isLong
      ? [known[index]].filter((way) => way !== null && way !== undefined)
      : ['first', 'second'];
    for (const way of ways) {
      const role = isLong ? ('radius' as const) : way;
      const text = line.texts(role)[0] ?? '';
      if (text === '') continue;
      const place = `${way} ${withinTurn(angle)}`;
      const before = standing.get(place);
      if (before !== undefined) {
        const message = `The angle ${line.texts('angle')[0]} ${words[way]} stands in line ${before} already; a closing reading is left out.`;
        mapped.problems.push({ line: line.line, message });
        continue;
      }
      standing.set(place, line.line);
      const list = `/${words[way]}/${counts[way]}`;
      counts[way] += 1;
      mapped.fills.push({ pointer: `${list}/angle`, text: line.texts('angle')[0]!, role: 'angle', line: line.line });
      mapped.fills.push({ pointer: `${list}/radius`, text, role, line: line.line });
    }
  });
  const lists = (['first', 'second'] as const).filter((way) => counts[way] > 0).map((way) => `/${words[way]}`);
  mapped.clears = emptied(cells, lists, mapped.fills);
  return mapped;
}

function withinTurn(angle: string): string {
  const value = Fraction.from(angle);
  const { n, d } = value.dividedBy(turn);
  const whole = n >= 0n ? n / d : -((-n + d - 1n) / d);
  return value.minus(turn.times(Fraction.of(whole))).toText();
}

export const circleTrace: TextMapping<CircleTrace> = {
  columns,
  ways: words,
  directionsBy: ['column', 'first', 'second'],
  matchesPositions: false,
  map,
};
