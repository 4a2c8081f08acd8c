import { z } from 'zod';
import { line } from './common';
import { decimalFigure } from './tolerance-value';

const length = z
  .string()
  .trim()
  .regex(/^\d{1,6}(\.\d{1,4})?$/, 'Give the length in mm with a decimal point.');
const positiveLength = length.refine((text) => /[1-9]/.test(text), 'The length is more than 0.');
const emptyAsNull = (text: string) => (text.trim() === '' ? null : text);

export const ownProvenance = z.strictObject({
  kind: z.enum(
    ['published', 'common-practice', 'from-memory', 'derived', 'builder', 'contract'],
    'Say where the tolerance comes from.',
  ),
  text: line('Where the tolerance comes from', 400).min(6, 'Say where it comes from in a few more words.'),
});

const common = {
  unit: z.enum(['µm', 'µm/m', '″']),
  /** Given over a length: in proportion over another one, never below the minimum. */
  perLength: z
    .strictObject({
      baseLengthMm: positiveLength,
      minimumUm: decimalFigure,
      maximumUm: z.union([z.literal('').transform(() => undefined), decimalFigure]).optional(),
    })
    .nullable(),
  /** Besides, over any such length. */
  local: z.strictObject({ toleranceUm: decimalFigure, lengthMm: positiveLength }).nullable(),
  basis: z.enum(['offset', 'total-indicator-reading']).nullable(),
  provenance: ownProvenance,
};

/** A line of a table: over … up to and including; the last one may be open above. */
const step = z.strictObject({
  overMm: length,
  upToMm: z.union([z.null(), z.string().transform(emptyAsNull).pipe(positiveLength.nullable())]),
  toleranceUm: decimalFigure,
});

export const ownTolerance = z.discriminatedUnion(
  'by',
  [
    z.strictObject({ by: z.literal('none') }),
    z.strictObject({ by: z.literal('all'), allUm: decimalFigure, ...common }),
    z.strictObject({
      by: z.literal('size-class'),
      byClassUm: z.tuple([decimalFigure, decimalFigure, decimalFigure]),
      ...common,
    }),
    z.strictObject({
      by: z.literal('travel'),
      steps: z.array(step).min(1, 'Give at least one line.').max(20),
      ...common,
    }),
    z.strictObject({
      by: z.literal('centre-distance'),
      steps: z.array(step).min(1, 'Give at least one line.').max(20),
      ...common,
    }),
  ],
  { error: 'Choose how the tolerance is given.' },
);
