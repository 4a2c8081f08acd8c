import { z } from 'zod';

export const id = z.uuid('This is not an id.');

/** Required line of text: what it is comes first in the message. */
export const line = (what: string, max = 200) =>
  z.string().trim().min(1, `${what} is missing.`).max(max, `${what} is longer than ${max} characters.`);

/** Optional text; an empty field is no text. */
export const optionalText = (what: string, max = 2000) =>
  z
    .string()
    .trim()
    .max(max, `${what} is longer than ${max} characters.`)
    .nullish()
    .transform((text) => text || null);

/** A day, not a moment. */
export const day = (what: string) => z.iso.date(`${what}: give a day, as 2026-03-10.`);

export const optionalDay = (what: string) =>
  z
    .union([z.literal(''), day(what)])
    .nullish()
    .transform((text) => text || null);

export const idParams = z.object({ id });
