import { read } from '@/lib/sheet/read-cell';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import { guessShape, readFigure, readTextTable, type TextRow, type TextShape } from '@/lib/sheet/text-table';
import type { CellPointer, Cells, SheetFields } from '@/lib/sheet/types';
import { parseNumber } from '@/lib/units/parse-number';
import { UNITS, type Unit } from '@/lib/units/unit';
import type { Layout, TestDefinition } from '@/standards/types';
import { circleTrace } from './circle-trace';
import { profile } from './profile';
import { rotationTurns } from './rotation-turns';
import { targetCycles } from './target-cycles';
import { timeSeries } from './time-series';
import type { ColumnKind, ColumnRole, Fill, ImportChoices, LineNote, ReadLine, TextMapping, Way } from './types';

const mappings: { [K in Layout['kind']]?: TextMapping<Extract<Layout, { kind: K }>> } = {
  'target-cycles': targetCycles,
  'circle-trace': circleTrace,
  'rotation-turns': rotationTurns,
  'time-series': timeSeries,
  profile,
};

/** How a layout takes its readings from a text; null: it does not. */
export function mappingOf(layout: Layout): TextMapping | null {
  return (mappings[layout.kind] as TextMapping | undefined) ?? null;
}

/** Units in which the figures of a column may stand: all that can be given in the fields' own. */
export function unitsFor({ unit }: ColumnKind): Unit[] {
  return unit ? UNITS.filter((candidate) => read({ text: '1', unit: candidate }, unit).state === 'ok') : [];
}

/** What a text looks like, as far as it shows it: for the person to look at and to correct. */
export function guessChoices(layout: Layout, text: string): ImportChoices {
  const shape = guessShape(text);
  const head = readTextTable(text, { ...shape, skipLines: 0 }).findLast(({ line }) => line <= shape.skipLines);
  const kinds = mappingOf(layout)?.columns(layout) ?? [];
  const taken = new Set<ColumnRole>();
  const columns = columnsOf(text, shape).map((column) => {
    const name = head?.cells[column] ?? '';
    const kind = kinds.find(({ role, hint, several }) => hint.test(name) && (several || !taken.has(role)));
    if (kind) taken.add(kind.role);
    return kind?.role ?? null;
  });
  const hasWays = kinds.some(({ role }) => role === 'direction');
  const choices: ImportChoices = {
    ...shape,
    columns,
    units: {},
    directionBy: hasWays && !columns.includes('direction') ? 'first' : 'column',
    ways: {},
    positions: 'match',
  };
  return { ...choices, ways: guessWays(directionWords(text, choices)) };
}

/** Choices after one of them was changed: what follows from it is proposed again, what the person said stays. */
export function changeChoices(text: string, before: ImportChoices, change: Partial<ImportChoices>): ImportChoices {
  const next = { ...before, ...change };
  const [had, has] = [before, next].map(({ columns }) => columns.includes('direction'));
  if (change.columns && had !== has) next.directionBy = has ? 'column' : 'first';
  return { ...next, ways: { ...guessWays(directionWords(text, next)), ...next.ways } };
}

/** Numbers of the columns of a text, from 0. */
export function columnsOf(text: string, shape: TextShape): number[] {
  const most = readTextTable(text, shape).reduce((count, { cells }) => Math.max(count, cells.length), 0);
  return Array.from({ length: Math.min(most, 60) }, (_, column) => column);
}

/** Different words of the direction column, in order of appearance. */
export function directionWords(text: string, choices: ImportChoices): string[] {
  const column = choices.columns.indexOf('direction');
  if (column < 0) return [];
  return [...new Set(readTextTable(text, choices).map(({ cells }) => cells[column] ?? ''))].filter(Boolean).slice(0, 8);
}

/** Signs, arrows and words that mean one direction to nearly everybody; what is not among them is asked. */
export function guessWays(words: readonly string[]): Record<string, Way> {
  const first = /^(\+|↑|→|>|f|fwd|for|forward|up|\+1|1|cw|clockwise)$/i;
  const second = /^(-|−|–|↓|←|<|b|bwd|back|backward|down|[-−]1|2|0|ccw|counterclockwise|anticlockwise)$/i;
  return Object.fromEntries(
    words.flatMap((word): [string, Way][] => {
      if (first.test(word)) return [[word, 'first']];
      return second.test(word) ? [[word, 'second']] : [];
    }),
  );
}

export interface TextImport {
  /** What goes into the fields: text, and the unit that applies to it. */
  fills: { pointer: CellPointer; text: string; unit: Unit | null }[];
  /** Fields in which something else stands that the import writes over or empties. */
  over: CellPointer[];
  problems: LineNote[];
  notes: LineNote[];
  /** The sheet's fields with everything filled in, and what then stands in them. */
  fields: SheetFields;
  cells: Cells;
}

/**
 * What a text would put into a sheet. Nothing is changed by it; lines with problems are left out.
 * @param definition of the sheet; @param cells what stands in its fields; @param text at most `longestText` characters
 * @throws Error where the layout takes no text (see `mappingOf`)
 */
export function importText(definition: TestDefinition, cells: Cells, text: string, choices: ImportChoices): TextImport {
  const { layout } = definition;
  const mapping = mappingOf(layout);
  if (!mapping) throw new Error(`${layout.kind} takes no text`);
  const kinds = new Map(mapping.columns(layout).map((kind) => [kind.role, kind]));
  const problems: LineNote[] = [];
  if (choices.separator === 'comma' && choices.decimalMark === 'comma') {
    problems.push({ line: null, message: 'The comma cannot part the columns and be the decimal mark too.' });
    return { fills: [], over: [], problems, notes: [], fields: sheetFields(definition, cells), cells };
  }
  const lines = readTextTable(text, choices).flatMap((row) => readLine(row, choices, kinds, problems));
  if (lines.length === 0 && problems.length === 0)
    problems.push({ line: null, message: 'There are no lines to read.' });
  const inUnit = (role: ColumnRole, figure: string) => {
    const unit = kinds.get(role)?.unit ?? null;
    return unit ? valueIn(figure, choices.units[role] ?? unit, unit) : decimalOf(figure);
  };
  const valueAt = (pointer: CellPointer, unit: Unit) => {
    const cell = cells[pointer];
    return cell ? valueIn(cell.text, cell.unit ?? unit, unit) : null;
  };
  const mapped = mapping.map({ layout, lines, choices, cells, inUnit, valueAt });
  const placed = placeFills(definition, cells, mapped.fills, mapped.clears, choices);
  return {
    ...placed,
    problems: [...problems, ...mapped.problems, ...placed.problems].sort((a, b) => (a.line ?? 0) - (b.line ?? 0)),
    notes: mapped.notes,
  };
}

function valueIn(text: string, from: Unit, to: Unit): string | null {
  const found = read({ text, unit: from }, to);
  return found.state === 'ok' ? found.value : null;
}

function decimalOf(text: string): string | null {
  const parsed = parseNumber(text);
  return parsed.ok ? parsed.value : null;
}

/** A line with its figures read; none where one of them cannot be. */
function readLine(
  { line, cells }: TextRow,
  choices: ImportChoices,
  kinds: ReadonlyMap<ColumnRole, ColumnKind>,
  problems: LineNote[],
): ReadLine[] {
  const texts = new Map<ColumnRole, string[]>();
  const values = new Map<ColumnRole, string[]>();
  let isReadable = true;
  choices.columns.forEach((role, column) => {
    const kind = role && kinds.get(role);
    if (!role || !kind) return;
    const written = cells[column] ?? '';
    const figure = kind.holds === 'word' ? { text: written, value: written } : readFigure(written, choices.decimalMark);
    if ('problem' in figure) {
      isReadable = false;
      problems.push({ line, message: `${kind.label[0]!.toUpperCase()}${kind.label.slice(1)}: ${figure.problem}` });
      return;
    }
    texts.set(role, [...(texts.get(role) ?? []), figure.text]);
    values.set(role, [...(values.get(role) ?? []), figure.value]);
  });
  if (!isReadable) return [];
  return [{ line, texts: (role) => texts.get(role) ?? [], values: (role) => values.get(role) ?? [] }];
}

/** The fills in the fields that the sheet then has; a figure in another unit than its field's carries it. */
function placeFills(
  definition: TestDefinition,
  cells: Cells,
  fills: readonly Fill[],
  clears: readonly CellPointer[],
  choices: ImportChoices,
): Pick<TextImport, 'fills' | 'over' | 'problems' | 'fields' | 'cells'> {
  const merged: Cells = { ...cells };
  for (const pointer of clears) delete merged[pointer];
  for (const { pointer, text, role } of fills) merged[pointer] = { text, unit: choices.units[role] ?? null };
  const fields = sheetFields(definition, merged);
  const unitOf = new Map(allFields(fields).map(({ pointer, unit }) => [pointer, unit]));
  const placed: TextImport['fills'] = [];
  const problems: LineNote[] = [];
  for (const { pointer, text, role, line } of fills) {
    const own = unitOf.get(pointer);
    if (own === undefined) {
      delete merged[pointer];
      problems.push({ line, message: 'The sheet has no field left for this line.' });
      continue;
    }
    const unit = choices.units[role] ?? own;
    const withUnit = own !== null && unit !== null && unit !== own ? `${text} ${unit}` : text;
    merged[pointer] = { text: withUnit, unit };
    placed.push({ pointer, text: withUnit, unit });
  }
  const stands = (pointer: CellPointer) => (cells[pointer]?.text.trim() ?? '') !== '';
  const differs = ({ pointer, text }: { pointer: CellPointer; text: string }) => cells[pointer]!.text.trim() !== text;
  const over = [
    ...placed.filter((fill) => stands(fill.pointer) && differs(fill)).map(({ pointer }) => pointer),
    ...clears,
  ];
  const emptying = clears.map((pointer) => ({ pointer, text: '', unit: cells[pointer]?.unit ?? null }));
  return { fills: [...emptying, ...placed], over, problems, fields: sheetFields(definition, merged), cells: merged };
}
