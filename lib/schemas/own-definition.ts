import { z } from 'zod';
import { line, optionalText } from './common';
import { ownAppliesTo } from './own-applies-to';
import { ownLayout } from './own-layout';
import { ownTolerance } from './own-tolerance';

/** Typed a line each, or sent as a list of lines. */
const lines = (what: string, most: number, least = 0) =>
  z
    .union([z.string().transform((text) => text.split('\n')), z.array(z.string())])
    .transform((given) => given.map((each) => each.trim()).filter(Boolean))
    .pipe(
      z
        .array(z.string().max(600, `${what}: a line has at most 600 characters.`))
        .min(least, least > 1 ? `${what}: give at least ${least} lines.` : `${what}: give at least one line.`)
        .max(most, `${what}: at most ${most} lines.`),
    );

export const ownId = z
  .string()
  .trim()
  .toUpperCase()
  .regex(/^[A-Z][A-Z0-9-]{1,19}$/, 'A letter, then letters, digits and dashes, such as OWN-1; at most 20 characters.');

/** What the composer fills in; lib/planning/compose-definition.ts makes a test definition of it. */
export const ownDefinitionFields = z.strictObject({
  title: line('The title', 140).min(6, 'The title is too short to tell the test from others.'),
  /** `{axis}`, `{spindle}` … stand for the component; empty: the title with the components behind it. */
  boundTitle: optionalText('The title on the sheet', 160),
  appliesTo: ownAppliesTo,
  /** Id of lib/planning/measurements.ts. */
  measurement: z.string().min(1, 'Choose what is measured.').max(60),
  judge: optionalText('The figure that is judged', 40),
  layout: ownLayout,
  tolerance: ownTolerance,
  direction: z.enum(
    ['either', 'concave-only', 'convex-only', 'rising-to-free-end', 'toward-tool', 'tailstock-high'],
    'Choose how the result may lie.',
  ),
  resolutionUm: z
    .string()
    .trim()
    .regex(/^\d{1,3}(\.\d{1,4})?$/, 'Give the step in µm, as 1 or 0.5.')
    .refine((text) => /[1-9]/.test(text), 'The step is more than 0.'),
  scene: z.string().min(1, 'Choose a sketch.').max(60),
  procedure: lines('How it is measured', 30, 2),
  instruments: lines('Instruments', 12, 1),
  usualMistakes: lines('Usual mistakes', 12),
  cautions: z.array(z.string().max(60)).max(20),
  judgedFigure: line('What is judged', 300).min(6, 'Say in words which figure is judged.'),
  positiveMeans: optionalText('What a positive figure means', 120),
  negativeMeans: optionalText('What a negative figure means', 120),
  workingStep: z.coerce.number('Choose its place in the working order.').int(),
  setUpTogether: optionalText('What stands set up', 120),
  minutes: z.coerce.number('Give the minutes as a number.').int('Give whole minutes.').min(1).max(1440),
  /** Parts of the component that a later correction must not touch; absent: what the choice of component says. */
  dependsOn: z
    .strictObject({
      components: z.array(z.string().max(30)).max(20),
      moved: z.array(z.string().max(30)).max(20),
      positioned: z.array(z.string().max(30)).max(20),
    })
    .optional(),
});
export type OwnDefinitionInput = z.input<typeof ownDefinitionFields>;
export type OwnDefinitionForm = z.output<typeof ownDefinitionFields>;

export const newOwnDefinition = z.strictObject({ id: ownId, form: ownDefinitionFields });
export const newOwnVersion = z.strictObject({ form: ownDefinitionFields });
export const ownDefinitionParams = z.object({ id: ownId });
