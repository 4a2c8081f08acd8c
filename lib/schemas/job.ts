import { z } from 'zod';
import { day, id, line, optionalDay, optionalText } from './common';
import { testCodes } from './test-codes';

export const purposes = {
  'new-machine': 'acceptance of a new machine',
  overhaul: 'after overhaul',
  collision: 'after a collision',
  move: 'after a move',
  periodic: 'periodic check',
} as const;
export type Purpose = keyof typeof purposes;

export const decisionRules = {
  simple: 'simple acceptance: the result is compared with the tolerance, uncertainty stated',
  guarded: 'guarded acceptance: the tolerance is narrowed by the uncertainty',
} as const;

export const leftOutReasons = {
  'not-applicable': 'not applicable',
  'not-agreed': 'not agreed',
  'not-possible': 'not possible',
  'not-touched': 'not touched by the work',
} as const;
export const leftOutReason = z.enum(Object.keys(leftOutReasons) as [keyof typeof leftOutReasons], 'Choose a reason.');
export type LeftOutReason = z.infer<typeof leftOutReason>;

/** Opening a job: one form, used by the page and by the route. */
export const jobForm = z
  .object({
    machineId: id,
    customerId: z.uuid('Choose the customer.'),
    reference: line('The reference', 60),
    purpose: z.enum(Object.keys(purposes) as [Purpose], 'Choose the purpose.'),
    scope: optionalText('The scope'),
    customerOrder: optionalText('The order', 100),
    customerEngineer: optionalText('The customer’s engineer', 120),
    decisionRule: z.enum(['simple', 'guarded'], 'Choose the decision rule.').default('simple'),
    /** Left out: those that the organisation works by. */
    codes: testCodes.optional(),
    /** Only tolerances that are confirmed or given by the contract; left out: as the organisation wants it. */
    refuseUnconfirmed: z.boolean().optional(),
    startsOn: day('First day'),
    endsOn: optionalDay('Last day'),
    place: optionalText('The place', 200),
    hours: optionalText('Hours run', 20),
    people: z
      .array(
        z.object({
          membershipId: id.nullish(),
          name: line('The name', 120),
          role: z.enum(['inspector', 'reviewer', 'customer']),
        }),
      )
      .max(20)
      .default([]),
  })
  .refine((job) => !job.endsOn || job.endsOn >= job.startsOn, {
    path: ['endsOn'],
    error: 'The last day lies before the first.',
  });
export type JobForm = z.output<typeof jobForm>;

/** What may be changed of a job before its plan is made. */
export const jobChange = z.strictObject({
  /** Only tolerances that are confirmed or given by the contract. */
  refuseUnconfirmed: z.boolean(),
});

/** What stood around the measurement; every line prints. */
export const conditionsForm = z.object({
  warmUp: optionalText('Warm-up', 400),
  compensation: optionalText('Compensation', 400),
  level: optionalText('Level', 400),
  coolant: optionalText('Coolant', 200),
  notes: optionalText('Notes', 1000),
});
export type Conditions = z.output<typeof conditionsForm>;

export const temperatureForm = z
  .object({
    measuredAt: z.iso.datetime({ offset: true, error: 'Give date and time.' }),
    air: z.string().trim(),
    machine: z.string().trim(),
  })
  .refine((row) => row.air !== '' || row.machine !== '', {
    path: ['air'],
    error: 'Give the air or the machine temperature.',
  });

/** A machine with many stations is proposed a test for each of them. */
const MOST_PROPOSALS = 3000;

/** The plan: which proposals are taken, why the others are not, and contract tolerances. */
export const planForm = z.object({
  include: z.array(z.string().min(1).max(120)).min(1, 'Take at least one test into the plan.').max(MOST_PROPOSALS),
  exclusions: z
    .array(z.object({ key: z.string().min(1).max(120), reason: leftOutReason, text: optionalText('The remark', 400) }))
    .max(MOST_PROPOSALS)
    .default([]),
  contractTolerances: z
    .array(
      z.object({
        key: z.string().min(1).max(120),
        toleranceUm: z.string().regex(/^\d+(\.\d+)?$/, 'Give the tolerance in µm, as 8 or 7.5.'),
        source: line('The contract item', 300),
      }),
    )
    .max(MOST_PROPOSALS)
    .default([]),
});
export type PlanForm = z.output<typeof planForm>;

export const sheetChange = z
  .object({
    remark: optionalText('The remark', 2000),
    leftOut: z.object({ reason: leftOutReason, text: optionalText('The remark', 400) }).nullable(),
  })
  .partial();

export const passForm = z.object({
  kind: z.enum(['as-found', 'adjusting', 'as-left']),
  /** As left = as found: nothing was done. */
  linkTo: id.nullish(),
});

export const passChange = z
  .object({
    temperature: z.string().trim().max(20),
    takenAt: z.iso.datetime({ offset: true }),
    instruments: z
      .array(
        z.object({
          instrumentId: id,
          overrideReason: optionalText('The reason', 500),
          overrideBy: optionalText('Allowed by', 120),
        }),
      )
      .max(12),
  })
  .partial();
