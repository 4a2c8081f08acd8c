import { z } from 'zod';
import { line, optionalText } from './common';

/** What an organisation says of one figure of a tolerance rule. */
export const toleranceValueStates = {
  confirmed: 'confirmed: it stands so in our copy',
  replaced: 'replaced by our own figure',
  withdrawn: 'withdrawn: we say nothing of it any more',
} as const;
export type ToleranceValueState = keyof typeof toleranceValueStates;

export const decimalFigure = z
  .string()
  .trim()
  .regex(/^\d{1,12}(\.\d{1,12})?$/, 'Write the figure with a decimal point, as 8 or 7.5.')
  .refine((text) => /[1-9]/.test(text), 'A tolerance is more than 0.');

const cell = z.string().min(1).max(80);
const copy = {
  ofEdition: line('The edition of your copy', 60),
  clause: line('Page or clause', 120),
  remark: optionalText('The remark', 500),
};

/** Several figures of one test in one go: they stand in the same clause. */
export const toleranceValuesForm = z.discriminatedUnion(
  'state',
  [
    z.strictObject({
      state: z.literal('confirmed'),
      cells: z.array(z.strictObject({ cell })).min(1, 'Choose at least one figure.').max(60),
      ...copy,
    }),
    z.strictObject({
      state: z.literal('replaced'),
      cells: z
        .array(z.strictObject({ cell, figure: decimalFigure }))
        .min(1, 'Choose at least one figure.')
        .max(60),
      ...copy,
    }),
    z.strictObject({
      state: z.literal('withdrawn'),
      cells: z.array(z.strictObject({ cell })).min(1, 'Choose at least one figure.').max(60),
      remark: optionalText('The remark', 500),
    }),
  ],
  { error: 'Choose what you say of it.' },
);
export type ToleranceValuesForm = z.output<typeof toleranceValuesForm>;

export const valuesImportForm = z.strictObject({
  /** The file as it stands. */
  csv: z.string().min(1, 'The file is empty.').max(1_500_000, 'The file is larger than 1.5 MB.'),
  /** true: only say what would happen. */
  preview: z.boolean(),
});
