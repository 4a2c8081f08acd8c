import { z } from 'zod';
import { parseNumber } from '@/lib/units/parse-number';
import { day, line, optionalText } from './common';

/** Units in which an instrument's resolution and uncertainty are given. */
export const resolutionUnits = ['µm', 'mm', 'µm/m', 'arcsec', '°C'] as const;

/** A figure above zero as text, point or comma; kept as a decimal string, exactly as precise as it was written. */
const positiveFigure = (what: string) =>
  z
    .string()
    .nullish()
    .transform((text, context) => {
      if (!text?.trim()) return null;
      const parsed = parseNumber(text);
      if (parsed.ok && parsed.unit === null && !/^-|^0*\.?0*$/.test(parsed.value)) return parsed.value;
      context.addIssue({
        code: 'custom',
        message: `${what}: write a figure above zero, such as 0.5, without its unit.`,
      });
      return z.NEVER;
    });

const unit = z
  .union([z.literal(''), z.enum(resolutionUnits, 'Choose the unit.')])
  .nullish()
  .transform((text) => text || null);

const plain = {
  number: line('The number', 40),
  name: line('The name', 160),
  kind: line('The kind', 80),
  resolution: positiveFigure('Resolution'),
  resolutionUnit: unit,
};

/** Indicators, mandrels, squares, levels …: whatever a reading is taken with. Artefacts have no resolution. */
export const instrumentFields = z
  .strictObject(plain)
  .refine((form) => form.resolution === null || form.resolutionUnit !== null, {
    path: ['resolutionUnit'],
    error: 'Choose the unit of the resolution.',
  });
export type InstrumentFields = z.output<typeof instrumentFields>;

export const instrumentChange = z.strictObject({ ...plain, retired: z.boolean() }).partial();
export type InstrumentChange = z.output<typeof instrumentChange>;

/** A certificate; the due date is the last valid day. Certificates are only added, never changed. */
export const calibrationFields = z
  .strictObject({
    certificate: line('The certificate', 80),
    laboratory: optionalText('The laboratory', 160),
    calibratedOn: day('Calibrated on'),
    dueOn: day('Due on'),
    expandedUncertainty: positiveFigure('Expanded uncertainty'),
    uncertaintyUnit: unit,
    coverageFactor: positiveFigure('Coverage factor'),
    /** The certificate itself, uploaded before. */
    fileId: z
      .union([z.literal(''), z.uuid()])
      .nullish()
      .transform((fileId) => fileId || null),
  })
  .refine((form) => form.dueOn >= form.calibratedOn, {
    path: ['dueOn'],
    error: 'The due date lies before the calibration.',
  })
  .refine((form) => form.expandedUncertainty === null || form.uncertaintyUnit !== null, {
    path: ['uncertaintyUnit'],
    error: 'Choose the unit of the uncertainty.',
  });
export type CalibrationFields = z.output<typeof calibrationFields>;
