import type { Unit } from '@/lib/units/unit';
import type { Layout, ShownIn } from '@/standards/types';

/** What a person chooses before the fields are drawn. `name` is that of the input where the input has such a field. */
export type FormOption =
  | { kind: 'choice'; name: string; label: string; choices: { value: string; label: string }[] }
  | { kind: 'figure'; name: string; label: string; unit: Unit };

/** Chosen values by the name of their option; the first choice where nothing is said, a figure as it was typed. */
export type Chosen = Record<string, string>;

/** A method whose readings are taken on a sheet: the sheet's own layout, without a test of any code around it. */
export interface SheetForm {
  options: FormOption[];
  layoutOf(chosen: Chosen): { layout: Layout; judge?: string };
  /** Stands in the fields before anything is typed. */
  setUp: Record<string, string>;
  shownIn?(chosen: Chosen): ShownIn;
  positiveMeans?: string;
  negativeMeans?: string;
  /** A tolerance may count the offset or the total indicator reading. */
  hasBasis?: true;
}

export const choice = (name: string, label: string, choices: Record<string, string> | string[]): FormOption => ({
  kind: 'choice',
  name,
  label,
  choices: Array.isArray(choices)
    ? choices.map((value) => ({ value, label: value }))
    : Object.entries(choices).map(([value, words]) => ({ value, label: words })),
});

/** What holds: what was chosen, else the first choice. */
export function chosenOr(options: readonly FormOption[], chosen: Chosen): Chosen {
  return Object.fromEntries(
    options.map((option) => {
      const value = chosen[option.name];
      if (option.kind === 'figure') return [option.name, value ?? ''];
      const known = option.choices.some((one) => one.value === value);
      return [option.name, known ? value! : (option.choices[0]?.value ?? '')];
    }),
  );
}
