import type { TextShape } from '@/lib/sheet/text-table';
import type { CellPointer, Cells } from '@/lib/sheet/types';
import type { Unit } from '@/lib/units/unit';
import type { DecimalText, Layout } from '@/standards/types';

/** What a column of a text can hold. Two directions: `first` is forward or clockwise, `second` backward or counterclockwise. */
export type ColumnRole =
  | 'position'
  | 'run'
  | 'direction'
  | 'deviation'
  | 'first'
  | 'second'
  | 'angle'
  | 'radius'
  | 'turn'
  | 'reading'
  | 'minutes'
  | 'temperature';

export type Way = 'first' | 'second';

export interface ColumnKind {
  role: ColumnRole;
  label: string;
  /** figure: a measured or nominal value; count: only orders the lines; word: a name of a direction. */
  holds: 'figure' | 'count' | 'word';
  /** Of the fields that the figures go into; null: a figure without one. */
  unit: Unit | null;
  /** Several columns may hold it, one run or turn after the other. */
  several?: boolean;
  /** Words of a header line that suggest it. */
  hint: RegExp;
}

/** How the direction of a line is known: by a column, the same for all lines, or by the way from one line to the next. */
export type DirectionBy = 'column' | 'first' | 'second' | 'travel';

/** Everything that the person says about a text; nothing of it is assumed without being shown. */
export interface ImportChoices extends TextShape {
  /** By column of the text; null: not used. */
  columns: (ColumnRole | null)[];
  /** Unit of the figures of a role, where it is not the fields' own. */
  units: Partial<Record<ColumnRole, Unit>>;
  directionBy: DirectionBy;
  /** Words or signs of the direction column. */
  ways: Record<string, Way>;
  /** Positions: those of the text are looked up among the sheet's, or take their place. */
  positions: 'match' | 'replace';
}

/** A line of the text after its figures have been read. */
export interface ReadLine {
  line: number;
  /** As they are to be put into fields, in order of column; '' where nothing is written. */
  texts(role: ColumnRole): readonly string[];
  /** Decimal strings of the same. */
  values(role: ColumnRole): readonly DecimalText[];
}

export interface Fill {
  pointer: CellPointer;
  text: string;
  role: ColumnRole;
  line: number;
}

/** `line` null: concerns the whole text. */
export interface LineNote {
  line: number | null;
  message: string;
}

export interface Mapped {
  fills: Fill[];
  /** Fields that are emptied because what stood in them is replaced. */
  clears: CellPointer[];
  /** Lines that cannot be used as they are. */
  problems: LineNote[];
  /** Worth knowing, and no obstacle: runs that are missing. */
  notes: LineNote[];
}

export interface MappingInput<L extends Layout = Layout> {
  layout: L;
  lines: readonly ReadLine[];
  choices: ImportChoices;
  /** What stands in the sheet's fields. */
  cells: Cells;
  /** Value of a field in a unit; null where nothing readable stands in it. */
  valueAt(pointer: CellPointer, unit: Unit): DecimalText | null;
  /** A figure of the text in the unit of its field. */
  inUnit(role: ColumnRole, text: string): DecimalText | null;
}

/** How the text for one layout is understood. Pure. */
export interface TextMapping<L extends Layout = Layout> {
  columns(layout: L): ColumnKind[];
  /** Names of the two directions, where readings have one. */
  ways: Record<Way, string> | null;
  directionsBy: readonly DirectionBy[];
  /** Whether positions can be looked up among the sheet's. */
  matchesPositions: boolean;
  map(input: MappingInput<L>): Mapped;
}
