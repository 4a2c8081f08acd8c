import { z } from 'zod';
import { line, optionalText } from './common';
import { newPassword } from './password';
import { email } from './people';
import { testCodes } from './test-codes';

const isTimeZone = (zone: string): boolean => {
  try {
    new Intl.DateTimeFormat('en', { timeZone: zone });
    return true;
  } catch {
    return false;
  }
};

const code = z
  .string()
  .trim()
  .toUpperCase()
  .regex(/^[A-Z0-9]{2,8}$/, 'Two to eight letters or digits, such as QMF.');
const timeZone = z.string().refine(isTimeZone, 'Choose a time zone.');

/** An address is typed a line each, or sent as a list of lines. */
export const addressLines = z
  .union([z.string().transform((text) => text.split('\n')), z.array(z.string())])
  .transform((lines) => lines.map((each) => each.trim()).filter(Boolean))
  .pipe(z.array(z.string().max(120, 'A line has at most 120 characters.')).max(6, 'At most six lines.'));

/** Letterhead and defaults. */
export const organisationFields = z.strictObject({
  name: line('The name', 120),
  code,
  addressLines,
  contact: optionalText('The contact line', 200),
  timeZone,
  paper: z.enum(['A4', 'Letter']),
});

export const organisationChange = organisationFields.partial().extend({
  setUpDone: z.boolean().optional(),
  codes: testCodes.optional(),
  /** A confirmed tolerance holds only when a second person has agreed. */
  fourEyes: z.boolean().optional(),
  /** A new job takes confirmed tolerances only, unless it says otherwise. */
  refuseUnconfirmed: z.boolean().optional(),
});
export type OrganisationChange = z.output<typeof organisationChange>;

/** The first start: organisation and first administrator in one. */
export const founding = z.strictObject({
  organisationName: line('The name', 120),
  code,
  timeZone,
  name: line('Your name', 120),
  email,
  password: newPassword,
});
export type Founding = z.output<typeof founding>;
