import { z } from 'zod';

const plane = z.enum(['ZX', 'YZ', 'XY'], 'Choose a plane.');
/** Empty: none. */
const optionalPlane = z.union([z.literal('').transform(() => undefined), plane]).optional();
const planes = z.array(plane).min(1, 'Choose at least one plane.').max(3);
const turretTypes = z.array(z.enum(['turret', 'tool-post', 'gang-slide'])).max(3);
const spindleTypes = z
  .array(z.enum(['main', 'sub']))
  .min(1, 'Choose main spindle, sub-spindle or both.')
  .max(2);
const role = z.enum(['longitudinal', 'cross', 'vertical'], 'Choose the axis.');
/** Nothing chosen: all. */
const some = <T extends z.ZodType<unknown[]>>(list: T) =>
  list.optional().transform((chosen) => (chosen && chosen.length > 0 ? chosen : undefined));
const letters = some(z.array(z.enum(['X', 'Y', 'Z'])).max(3));

/** On what an own test is done: the selectors by which the catalogue itself finds its components. */
export const ownAppliesTo = z.discriminatedUnion(
  'kind',
  [
    z.strictObject({ kind: z.literal('machine') }),
    z.strictObject({ kind: z.literal('channel') }),
    z.strictObject({ kind: z.literal('spindle'), types: spindleTypes }),
    z.strictObject({ kind: z.literal('main-and-sub-spindle') }),
    z.strictObject({ kind: z.literal('sub-spindle-and-its-axis'), plane }),
    z.strictObject({ kind: z.literal('linear-axis'), letters }),
    z.strictObject({ kind: z.literal('linear-axis-in-planes'), letters, planes }),
    z.strictObject({ kind: z.literal('longitudinal-axis'), planes }),
    z.strictObject({ kind: z.literal('longitudinal-axis-and-spindle'), plane }),
    z.strictObject({ kind: z.literal('cross-axis-and-spindle') }),
    z.strictObject({ kind: z.literal('vertical-axis-and-spindle') }),
    z.strictObject({ kind: z.literal('y-and-x') }),
    z.strictObject({ kind: z.literal('axis-pair'), plane }),
    z.strictObject({
      kind: z.literal('rotary-axis'),
      letters: z.array(z.enum(['A', 'B', 'C'])).min(1, 'Choose a letter.'),
    }),
    z.strictObject({ kind: z.literal('turret'), types: some(turretTypes) }),
    z.strictObject({ kind: z.literal('turret-and-spindle') }),
    z.strictObject({ kind: z.literal('turret-and-axis'), role, plane: optionalPlane, types: some(turretTypes) }),
    z.strictObject({ kind: z.literal('turret-axis-and-spindle'), role }),
    z.strictObject({ kind: z.literal('turning-turret-and-spindle') }),
    z.strictObject({
      kind: z.literal('station-and-spindle'),
      types: turretTypes.min(1, 'Choose at least one kind of tool carrier.'),
    }),
    z.strictObject({ kind: z.literal('driven-tools') }),
    z.strictObject({ kind: z.literal('driven-tools-and-spindle') }),
    z.strictObject({ kind: z.literal('tool-spindle') }),
    z.strictObject({ kind: z.literal('tool-spindle-and-spindle') }),
    z.strictObject({ kind: z.literal('tailstock') }),
    z.strictObject({ kind: z.literal('tailstock-and-axis'), plane: optionalPlane }),
    z.strictObject({ kind: z.literal('tailstock-and-spindle'), plane: optionalPlane }),
    z.strictObject({ kind: z.literal('guide-bush') }),
    z.strictObject({ kind: z.literal('guide-bush-and-spindle') }),
    z.strictObject({ kind: z.literal('guide-bush-and-axis'), plane }),
    z.strictObject({ kind: z.literal('tool-changer') }),
  ],
  { error: 'Choose what it is done on.' },
);
