import type { EvaluationInput } from '@/lib/evaluation';
import type { Unit } from '@/lib/units/unit';
import type { DecimalText, Direction, PlannedTolerance, ShownIn } from '@/standards/types';
import type { SheetResult } from './check-result';

/**
 * A sheet's fields are addressed by the JSON pointer of the place that they fill in the evaluation's input
 * (`/readings/180/3`). The same pointer names the field on the screen, in the operation log, in the database and in the report.
 * Two exceptions go into no input: `/form` of a tool hole's sheet says which of its forms was taken, `/steps` how many steps a travel holds. A row that is left out
 * (gap, incomplete) closes up in the input, so rows after it stand one place earlier there.
 */
export type CellPointer = string;

/** What stands in one field: the text as typed; the unit that applies to it (typed with it, or the column's). */
export interface Cell {
  text: string;
  unit: Unit | null;
}

export type Cells = Record<CellPointer, Cell>;

export interface Field {
  pointer: CellPointer;
  /** reading: taken at the machine. set-up: where and how it was taken. choice: one of `options`. */
  role: 'reading' | 'set-up' | 'choice';
  /** Unit of the column; what is typed without a unit is in this one. */
  unit: Unit | null;
  /** Name for a screen reader and for messages: `z 90 mm, spindle at 180°`. */
  label: string;
  options?: { value: string; label: string }[];
  optional?: boolean;
}

/** A table of fields: rows and columns as they are drawn; `order` is the order in which the readings are taken. */
export interface FieldTable {
  title: string | null;
  columns: { label: string; unit: Unit | null }[];
  rows: { label: string; cells: (FieldTableCell | null)[] }[];
}

/** `derived`: a figure worked out from the row for the reader (a mean, a difference), '' while it cannot be. */
export type FieldTableCell = { field: Field } | { derived: string };

export interface SheetFields {
  /** Fields above the tables: lengths, choices, sag. */
  setUp: Field[];
  tables: FieldTable[];
  /** Pointers of the readings in the order in which they are taken: Enter goes along it. */
  order: CellPointer[];
}

export interface CellProblem {
  pointer: CellPointer;
  /** cannot-read blocks the evaluation; unusual asks to be looked at. */
  severity: 'cannot-read' | 'unusual';
  message: string;
}

export type Verdict = 'within-tolerance' | 'out-of-tolerance' | 'undecided' | 'for-information';

export interface Judgement {
  verdict: Verdict;
  /** The deviation has a sign that says something; false: an amount that cannot be negative. */
  signed: boolean;
  /** Tolerance that applied, µm, after scaling to the length really measured. */
  toleranceUm: DecimalText | null;
  /** How it came about: `15·240/300 = 12, above the floor of 5`. */
  toleranceArithmetic: string | null;
  limitUm: DecimalText | null;
  marginUm: DecimalText | null;
  direction: Direction;
  /** A local tolerance, where the definition has one. */
  local: { deviationUm: DecimalText; toleranceUm: DecimalText; lengthMm: DecimalText; verdict: Verdict } | null;
  /** Further figures of the same readings that have a limit of their own; absent where the definition has none. */
  also?: FurtherJudgement[];
}

/** One further figure judged: key in the method's result, its name, unrounded figure and limit in the judgement's unit, verdict. */
export interface FurtherJudgement {
  figure: string;
  label: string;
  deviationUm: DecimalText;
  toleranceUm: DecimalText;
  verdict: Verdict;
}

export interface DisplayedResult {
  /** The deviation rounded once, µm: `-24.5`. */
  textUm: string;
  /** The same in mm, no figure lost: `-0.0245`. */
  textMm: string;
  /** Unit in which `textMm` stands; absent: mm. */
  unit?: ShownIn;
  extraDigits: number;
}

/** Series for the plot of a pass; x in mm or °, y in µm, as decimal strings. */
export interface PlotSeries {
  kind: 'line' | 'polar' | 'pairs';
  xLabel: string;
  yLabel: string;
  points: { x: DecimalText; y: DecimalText; series?: string }[];
  /** Fitted or reference line, end points. */
  fit?: { x1: DecimalText; y1: DecimalText; x2: DecimalText; y2: DecimalText };
}

export type SheetOutcome =
  | { state: 'empty'; filled: 0; total: number; problems: CellProblem[] }
  /** Some readings, not enough for the method, or a field that cannot be read. `reason` in plain words. */
  | {
      state: 'not-yet';
      filled: number;
      total: number;
      reason: string;
      problems: CellProblem[];
      plot: PlotSeries | null;
    }
  | {
      /** partial: evaluated from the stations that are complete. */
      state: 'partial' | 'complete';
      filled: number;
      total: number;
      problems: CellProblem[];
      /** partial: what the result rests on, `by 4 of 5 positions`; null when complete. */
      basedOn: string | null;
      /** null: a function check, which goes to no method. */
      input: EvaluationInput | null;
      result: SheetResult;
      judgement: Judgement;
      displayed: DisplayedResult;
      /** In words: `concave`, `free end leans toward the tool`; null where the sign says nothing. */
      directionWords: string | null;
      plot: PlotSeries | null;
    };

/** What judging a pass needs to know of its sheet; stored with the sheet, so that old sheets are judged by their own rules. */
export interface SheetRules {
  definition: { id: string; code: string; edition: string; version: number };
  tolerance: PlannedTolerance | null;
  direction: Direction;
  /** Rules by which the sheet was begun; absent: the newest. */
  ruleSet?: string;
  decisionRule: 'simple' | 'guarded';
  /** Standard uncertainty of the result, µm. Guarded without it: nothing can be accepted or refused, the verdict is `undecided`. */
  standardUncertaintyUm?: DecimalText | null;
}
