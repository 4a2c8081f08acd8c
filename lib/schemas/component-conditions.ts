import { z } from 'zod';
import { optionalText } from './common';

/** What the work did to a component; nothing said is not the same as untouched. */
export const partConditions = {
  untouched: 'untouched',
  refitted: 'removed and refitted',
  repaired: 'repaired',
  replaced: 'replaced',
} as const;
export type PartCondition = keyof typeof partConditions;

/** Component of the make-up, or `bed` → what was done to it. */
export const componentConditionsForm = z.record(
  z.string().min(1).max(8),
  z.object({
    condition: z.enum(Object.keys(partConditions) as [PartCondition], 'Choose what was done.'),
    text: optionalText('The remark', 200),
  }),
);
export type ComponentConditions = z.output<typeof componentConditionsForm>;
