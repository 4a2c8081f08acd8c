import type { OwnDefinitionInput } from '@/lib/schemas/own-definition';
import type { Layout, ShownIn, SketchSpec, ToleranceRule } from '@/standards/types';
import type { WorkingStepName } from '@/standards/working-order';

/** Something that can be measured on a sheet, by the name that the trade has for it. */
export interface Measurement {
  id: string;
  label: string;
  /** What the readings come to. */
  gives: string;
  method: string;
  /** Whether the result carries a sign that says something, so that it can be permitted to one side only. */
  signed: boolean;
  /** Figures of the method that can be judged; the first is what it does by itself. Empty: there is one only. */
  judges: { value: string; label: string }[];
  toleranceUnit: NonNullable<ToleranceRule['unit']>;
  shownIn?: ShownIn;
  /** A tolerance given over a length is scaled to the length really measured. */
  perLength: boolean;
  scene: SketchSpec['scene'];
  /** Where such a test stands in the working order, and on what it is done, most often. */
  step: WorkingStepName;
  usualComponent: OwnDefinitionInput['appliesTo'];
  /** Fields to begin with, as the composer shows them. */
  layout: OwnDefinitionInput['layout'];
  /** Layouts of the method that differ in more than figures from what stands in `layout`. */
  fits?: (layout: Layout) => string | null;
}

/** What most of them have in common: a length without a sign, at a fixed place. */
export const plainLength = { toleranceUnit: 'µm' as const, signed: false, judges: [], perLength: false };
