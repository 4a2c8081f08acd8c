import type { CellPointer, Cells } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import type { ColumnRole, Fill, ImportChoices, LineNote, Mapped, MappingInput, ReadLine, Way } from './types';

/** Begins a mapping with what every layout asks for: columns without which nothing can be filled in. */
export function begin(choices: ImportChoices, needed: { roles: ColumnRole[]; what: string }[]): Mapped {
  const missing = needed.filter(({ roles }) => !roles.some((role) => choices.columns.includes(role)));
  const problems = missing.map(({ what }) => ({ line: null, message: `Say which column holds the ${what}.` }));
  return { fills: [], clears: [], problems, notes: [] };
}

/** The direction of each line; a line whose direction is not known is a problem. */
export function waysOf(
  lines: readonly ReadLine[],
  choices: ImportChoices,
  along: ColumnRole,
  problems: LineNote[],
): (Way | null)[] {
  const { directionBy, ways } = choices;
  let before: Fraction | null = null;
  let last: Way | null = null;
  const open: number[] = [];
  const found = lines.map((line, index): Way | null => {
    if (directionBy === 'first' || directionBy === 'second') return directionBy;
    if (directionBy === 'column') {
      const word = line.texts('direction')[0] ?? '';
      const way = ways[word];
      if (!way) problems.push({ line: line.line, message: directionProblem(word) });
      return way ?? null;
    }
    const value = line.values(along)[0];
    if (!value) return null;
    const here = Fraction.from(value);
    const step = before ? here.compare(before) : 0;
    before = here;
    // At a turning point the same place is read twice: the second one belongs to the way back.
    if (step !== 0) last = step > 0 ? 'first' : 'second';
    else if (last) last = last === 'first' ? 'second' : 'first';
    if (!last) open.push(index);
    return last;
  });
  if (directionBy === 'travel') {
    const next = found.find((way) => way !== null) ?? null;
    for (const index of open) found[index] = next;
    if (lines.length > 0 && !next)
      problems.push({ line: lines[0]!.line, message: 'The lines do not show a direction.' });
  }
  return found;
}

function directionProblem(word: string): string {
  return word === '' ? 'The direction is missing.' : `Say which direction “${word}” means.`;
}

/** Fields of some lists that hold something and that nothing of the text goes into. */
export function emptied(cells: Cells, lists: readonly string[], fills: readonly Fill[]): CellPointer[] {
  const filled = new Set(fills.map(({ pointer }) => pointer));
  return Object.keys(cells).filter(
    (pointer) =>
      !filled.has(pointer) && cells[pointer]!.text !== '' && lists.some((list) => pointer.startsWith(`${list}/`)),
  );
}

/** Value of a line's figure in the unit of its field, as a key: `0.50` and `0.5` are one place. */
export function keyOf(input: Pick<MappingInput, 'inUnit'>, line: ReadLine, role: ColumnRole): string | null {
  const text = line.texts(role)[0];
  return text ? input.inUnit(role, text) : null;
}

/** Rows of one list of positions: found among the sheet's, or in the order in which the text names them. */
export class Rows {
  readonly texts: { text: string; line: number }[] = [];
  private readonly rowOf = new Map<string, number>();

  constructor(private readonly known: ReadonlyMap<string, number> | null) {}

  /** @returns the row; null where the sheet has no such position */
  at(key: string, text: string, line: number): number | null {
    if (this.known) return this.known.get(key) ?? null;
    const row = this.rowOf.get(key);
    if (row !== undefined) return row;
    this.rowOf.set(key, this.texts.length);
    this.texts.push({ text, line });
    return this.texts.length - 1;
  }
}

/** Numbers as they stand in a column, each with its place in rising order. */
export function placesInOrder(values: readonly string[]): Map<string, number> {
  const rising = [...new Set(values)].sort((a, b) => Fraction.from(a).compare(Fraction.from(b)));
  return new Map(rising.map((value, place) => [value, place]));
}
