import { z } from 'zod';
import { line } from './common';

const decimal = /^-?\d{1,6}(\.\d{1,4})?$/;

/** Figures typed one after another with spaces, or sent as a list. */
const decimals = (what: string, least: number, most = 60) =>
  z
    .union([z.string().transform((text) => text.trim().split(/[\s;]+/)), z.array(z.string())])
    .transform((given) => given.filter(Boolean))
    .pipe(
      z
        .array(z.string().regex(decimal, `${what}: figures with a decimal point and spaces between, as 0 75 150.`))
        .min(least, `${what}: give at least ${least} figures.`)
        .max(most, `${what}: at most ${most} figures.`)
        .refine(
          (list) => new Set(list.map(Number)).size === list.length,
          `${what}: the same figure stands there twice.`,
        ),
    );

const names = (what: string, least: number, most: number) =>
  z
    .union([z.string().transform((text) => text.split(/[\n,]/)), z.array(z.string())])
    .transform((given) => given.map((each) => each.trim()).filter(Boolean))
    .pipe(
      z
        .array(z.string().max(60, `${what}: a name has at most 60 characters.`))
        .min(least, `${what}: give at least ${least}.`)
        .max(most, `${what}: at most ${most}.`)
        .refine((list) => new Set(list).size === list.length, `${what}: the same name stands there twice.`),
    );
const noNames = z.union([z.null(), z.literal(''), z.tuple([])]).transform(() => null);

const positiveMm = z
  .string()
  .trim()
  .regex(/^\d{1,6}(\.\d{1,4})?$/, 'Give it in mm with a decimal point.')
  .refine((text) => /[1-9]/.test(text), 'It is more than 0.');
const optionalMm = z.union([z.null(), z.literal('').transform(() => null), positiveMm]);
const count = (what: string, least: number, most: number) =>
  z.coerce
    .number(`${what}: give a number.`)
    .int(`${what}: give a whole number.`)
    .min(least, `${what}: at least ${least}.`)
    .max(most, `${what}: at most ${most}.`);
const angles = (least: number) => decimals('Angles', least);
const positions = (least: number) => decimals('Positions', least);
const lineReference = z.enum(['minimum-zone', 'least-squares', 'end-points']);
const surface = z.enum(['outside', 'bore']);

const item = z.strictObject({
  question: line('The question', 300).min(6, 'The question is too short.'),
  value: z
    .strictObject({
      label: line('What the figure is', 60),
      unit: line('The unit', 12),
      lower: z
        .union([z.literal('').transform(() => undefined), z.string().trim().regex(decimal, 'Give a figure.')])
        .optional(),
      upper: z
        .union([z.literal('').transform(() => undefined), z.string().trim().regex(decimal, 'Give a figure.')])
        .optional(),
    })
    .nullable(),
});

/** The fields of a sheet, in the order in which the readings are taken. */
export const ownLayout = z.discriminatedUnion(
  'kind',
  [
    z.strictObject({
      kind: z.literal('turns'),
      insertions: count('Turns', 1, 8),
      anglesDeg: angles(2),
      insertionLabel: z.enum(['insertion', 'turn']),
      names: z.union([noNames, names('Names of the turns', 1, 8)]).optional(),
    }),
    z.strictObject({
      kind: z.literal('angles-by-position'),
      anglesDeg: angles(1),
      positionsMm: positions(2),
      positionName: z.enum(['z', 'radius', 'along the face', 'along the slide', 'y']),
      sag: z.boolean(),
    }),
    z.strictObject({
      kind: z.literal('profile'),
      positionsMm: positions(3),
      localLengthMm: optionalMm.optional(),
      reference: lineReference,
    }),
    z.strictObject({
      kind: z.literal('square-reversed'),
      referencePositionsMm: positions(2),
      measuredPositionsMm: positions(2),
    }),
    z.strictObject({ kind: z.literal('swept-sections'), positionsMm: positions(1), surface }),
    z.strictObject({
      kind: z.literal('tool-centre'),
      form: z.enum(['sweep', 'heights']),
      surface,
      radiiMm: decimals('Radii', 1, 12),
    }),
    z.strictObject({
      kind: z.literal('approach-pairs'),
      places: names('Places', 1, 6),
      feeds: z
        .array(z.enum(['cutting-feed', 'rapid']))
        .min(1, 'Choose at least one feed.')
        .max(2),
      pairs: count('Pairs', 2, 10),
    }),
    z.strictObject({ kind: z.literal('two-collars'), distanceMm: positiveMm }),
    z.strictObject({
      kind: z.literal('angle-steps'),
      stepLengthMm: positiveMm,
      steps: count('Steps', 2, 60),
      returnRun: z.boolean(),
      reference: lineReference,
    }),
    z.strictObject({ kind: z.literal('two-runs'), positionsMm: positions(3), reference: lineReference }),
    z.strictObject({
      kind: z.literal('grid'),
      xMm: decimals('Places along X', 2, 20),
      yMm: decimals('Places across', 2, 20),
      reference: z.enum(['minimum-zone', 'least-squares']),
    }),
    z.strictObject({
      kind: z.literal('angular-runs'),
      positionsMm: positions(2),
      quantity: z.enum(['pitch', 'yaw', 'roll']),
      bothDirections: z.boolean(),
    }),
    z.strictObject({
      kind: z.literal('target-cycles'),
      quantity: z.enum(['linear', 'rotary']),
      cycles: count('Cycles', 1, 10),
      targets: decimals('Targets', 2, 60),
    }),
    z.strictObject({
      kind: z.literal('circle-trace'),
      anglesDeg: angles(4),
      nominalRadiusMm: positiveMm,
      arcDeg: z
        .string()
        .trim()
        .regex(/^\d{1,3}(\.\d{1,3})?$/, 'Give the arc in degrees.'),
    }),
    z.strictObject({
      kind: z.literal('rotation-turns'),
      turns: count('Turns', 2, 20),
      anglesDeg: angles(4),
      direction: z.enum(['radial', 'axial', 'tilt']),
    }),
    z.strictObject({
      kind: z.literal('stations'),
      stations: z.union([noNames, names('Stations', 1, 40)]),
      repeats: count('Repeats', 2, 20),
      radiusMm: optionalMm,
    }),
    z.strictObject({ kind: z.literal('circles'), names: names('Circles', 1, 8), anglesDeg: angles(2) }),
    z.strictObject({ kind: z.literal('diameters'), positionsMm: positions(2) }),
    z.strictObject({ kind: z.literal('round-trace'), anglesDeg: angles(4), surface }),
    z.strictObject({
      kind: z.literal('time-series'),
      minutes: decimals('Minutes', 2, 120),
      temperature: z.boolean(),
    }),
    z.strictObject({
      kind: z.literal('target-and-found'),
      basis: z.union([z.literal('').transform(() => null), z.enum(['radius', 'diameter'])]).nullable(),
    }),
    z.strictObject({ kind: z.literal('check-list'), items: z.array(item).min(1, 'Give at least one item.').max(40) }),
  ],
  { error: 'Choose what is measured.' },
);
export type OwnLayoutForm = z.output<typeof ownLayout>;
