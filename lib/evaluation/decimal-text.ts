import { z } from 'zod';

const DECIMAL_TEXT = /^[+-]?(\d+(\.\d*)?|\.\d+)([eE][+-]?\d{1,2})?$/;
const isZero = (text: string) => !/^[^eE]*[1-9]/.test(text);

/** A decimal figure as text, at most 60 characters. JSON numbers, commas, spaces and NaN are refused. */
export const decimalText = z
  .string({ error: 'a decimal number as text is needed, for example "0.5"' })
  .max(60, 'longer than 60 characters')
  .regex(DECIMAL_TEXT, 'not a decimal number: digits with a point as decimal mark, no spaces');

export const positiveDecimal = decimalText.refine(
  (text) => !text.startsWith('-') && !isZero(text),
  'must be above zero',
);

export const nonNegativeDecimal = decimalText.refine(
  (text) => !text.startsWith('-') || isZero(text),
  'must not be below zero',
);

/** Figures that are counts or factors may also arrive as JSON numbers. */
export const decimalOrNumber = z.union([decimalText, z.number().transform(String)], {
  error: 'a number or a decimal number as text is needed',
});

/** Free text that only labels a result. */
export const label = z.string().max(200, 'longer than 200 characters');

export const decimals = (least: number, what: string) => z.array(decimalText).min(least, tooFew(least, what));

export const tooFew = (least: number, what: string) => `at least ${least} ${what} ${least === 1 ? 'is' : 'are'} needed`;
