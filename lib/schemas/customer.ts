import { z } from 'zod';
import { line, optionalText } from './common';
import { addressLines } from './organisation';
import { email } from './people';

export const customerFields = z.strictObject({
  name: line('The name', 160),
  addressLines: addressLines.default([]),
  contact: optionalText('The contact', 160),
  email: z
    .union([z.literal(''), email])
    .nullish()
    .transform((text) => text || null),
});
export type CustomerFields = z.output<typeof customerFields>;

/** Without a default: what is not named stays as it is. */
export const customerChange = customerFields.extend({ addressLines }).partial();
