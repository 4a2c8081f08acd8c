import type { EvaluationResult } from '@/lib/evaluation';
import type { CellPointer, CellProblem, Cells, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { DecimalText, Layout, TestDefinition, ToleranceRule } from '@/standards/types';

export type LayoutOf<K extends Layout['kind']> = Extract<Layout, { kind: K }>;

/** Figures that could be read, in the unit of their field; choices as they stand. */
export type SheetValues = ReadonlyMap<CellPointer, DecimalText>;

export interface AssembleOptions {
  definition: TestDefinition;
  /** From the sheet's tolerance: a local length to evaluate, what a coaxiality tolerance counts. */
  localLengthMm: DecimalText | null;
  basis: NonNullable<ToleranceRule['basis']>;
  toleranceUm: DecimalText | null;
}

export type Assembled =
  /** Not enough for the method, and why, in plain words. */
  | { input: null; reason: string }
  | {
      input: Record<string, unknown> & { method: string };
      /** `by 4 of 5 positions`; null when every reading is there. */
      basedOn: string | null;
      /** Length really measured, for tolerances given per length. */
      lengthMm: DecimalText | null;
      /** Form taken, where a definition has several. */
      form?: string;
      /** Things to look at that concern several fields. */
      notes: CellProblem[];
    };

/** One way to lay out a sheet: its fields, the method's input made from them, and its plot. Pure. */
export interface LayoutEngine<L extends Layout> {
  fields(layout: L, cells: Cells): SheetFields;
  assemble(layout: L, values: SheetValues, options: AssembleOptions): Assembled;
  /** null while there is nothing to draw. */
  plot(layout: L, values: SheetValues, result: EvaluationResult | null): PlotSeries | null;
}
