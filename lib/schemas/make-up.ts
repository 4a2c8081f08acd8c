import { z } from 'zod';
import { checkMakeUp } from './make-up-checks';

/** Words for the kinds of machine; the kind decides from which make-up a person starts, and whether it is tested as an engine lathe. */
export const machineKinds = {
  'turning-centre': 'turning centre with one spindle',
  'turning-centre-sub-spindle': 'turning centre with sub-spindle',
  'multi-channel-turning-centre': 'turning centre with several slides and channels',
  'sliding-head-lathe': 'sliding-head lathe',
  'engine-lathe': 'engine lathe',
  'turret-lathe': 'turret lathe',
  other: 'other turning machine',
} as const;
export type MachineKind = keyof typeof machineKinds;

/** Which way the driven tools of a turret point. */
export const drivenToolWords = {
  none: 'none',
  axial: 'axial',
  radial: 'radial',
  both: 'axial and radial',
} as const;
export type DrivenTools = keyof typeof drivenToolWords;

/** Sizes are typed with a point or a comma; kept as a decimal string with a point, in mm. */
const sizeMm = z
  .string()
  .trim()
  .regex(/^\d{1,5}([.,]\d{1,3})?$/, 'Write a size in millimetres, such as 500 or 62.5.')
  .transform((text) => text.replace(',', '.'))
  .refine((text) => /[1-9]/.test(text), 'The size must be above zero.');
const optionalSizeMm = z.union([z.literal('').transform(() => null), sizeMm]).nullable();

const id = (pattern: RegExp, example: string) =>
  z.string().trim().toUpperCase().regex(pattern, `Write a letter and a number, such as ${example}.`);
const componentId = id(/^[A-Z]{1,3}\d{0,2}$/, 'T1');
const channel = z.coerce.number().int().min(1, 'Channels count from 1.').max(9, 'Channels count up to 9.');
const note = z.string().trim().max(200, 'At most 200 characters.').optional();

const linearAxis = z.object({
  id: id(/^[XYZUVW]\d$/, 'X1'),
  letter: z.enum(['X', 'Y', 'Z', 'U', 'V', 'W']),
  number: z.coerce.number().int().min(0).max(9),
  channel,
  /** Id of the component that it moves: a turret, a post, a spindle (moving headstock, sub-spindle), the tailstock. */
  carries: componentId,
  directionNote: note,
  travelMm: sizeMm,
  programmedOn: z.enum(['radius', 'diameter']),
});
const rotaryAxis = z.object({ id: id(/^[ABC]\d$/, 'C1'), channel, carries: componentId, directionNote: note });
const spindle = z.object({
  id: componentId,
  type: z.enum(['main', 'sub', 'tool']),
  channel,
  /** Linear axis that moves it; null where it stands fast. */
  carriedBy: z.string().nullable(),
  /** Turret or post that a tool spindle rides on; absent in make-ups from before it was asked. */
  onTurret: z
    .union([z.literal('').transform(() => null), componentId])
    .nullable()
    .optional(),
  maximumSpeedPerMin: z.string().trim().max(8).optional(),
});
const turret = z.object({
  id: componentId,
  type: z.enum(['turret', 'tool-post', 'gang-slide']),
  channel,
  stations: z.coerce.number().int().min(1, 'At least one station.').max(200),
  axes: z.array(z.string()),
  /** Work spindles that it can reach, the one it mainly works at first. */
  worksAt: z.array(z.string()).min(1, 'Name the work spindle that it works at.'),
  /** Absent in make-ups from before it was asked: none. */
  drivenTools: z.enum(Object.keys(drivenToolWords) as [DrivenTools, ...DrivenTools[]]).optional(),
});
const single = z.object({ id: componentId, channel });

/**
 * What a turning machine consists of. One schema for form, route and test. Sizes in mm as decimal strings.
 * Axes X Y Z (or U V W beside them) have a number, as ISO 841 and the test codes name parallel axes.
 */
export const makeUp = z
  .object({
    kind: z.enum(Object.keys(machineKinds) as [MachineKind, ...MachineKind[]]),
    /** The one criterion that the machine's builder uses for the size class. */
    sizeClass: z.object({
      criterion: z.enum(['swing-over-bed', 'bar-diameter', 'chuck-diameter']),
      valueMm: sizeMm,
    }),
    channels: z.array(channel).min(1, 'At least one channel.'),
    linearAxes: z.array(linearAxis).min(1, 'At least one linear axis.'),
    rotaryAxes: z.array(rotaryAxis),
    spindles: z.array(spindle).min(1, 'At least one spindle.'),
    turrets: z.array(turret).min(1, 'At least one turret or tool post.'),
    tailstock: single.nullable(),
    guideBush: single.nullable(),
    /** Absent in make-ups from before it was asked: none. */
    toolChanger: single.nullable().optional(),
    distanceBetweenCentresMm: optionalSizeMm,
    swingOverBedMm: optionalSizeMm,
    swingOverCrossSlideMm: optionalSizeMm,
    chuckDiameterMm: optionalSizeMm,
    barDiameterMm: optionalSizeMm,
  })
  .superRefine((value, context) => {
    for (const { path, message } of checkMakeUp(value)) context.addIssue({ code: 'custom', path, message });
  });

export type MakeUp = z.output<typeof makeUp>;
/** What a form holds before it is read: numbers may still be text. */
export type MakeUpInput = z.input<typeof makeUp>;
export type LinearAxis = MakeUp['linearAxes'][number];
export type Spindle = MakeUp['spindles'][number];
export type Turret = MakeUp['turrets'][number];
