import { z } from 'zod';
import { day, id, line, optionalText } from './common';
import { makeUp } from './make-up';

const year = z
  .union([z.string(), z.number(), z.null()])
  .optional()
  .transform((value) => (value === undefined || value === null ? '' : String(value).trim()))
  .pipe(
    z
      .string()
      .regex(/^(|19\d\d|2[01]\d\d)$/, 'Write the year with four digits, such as 2011.')
      .transform((text) => (text === '' ? null : Number(text))),
  );

/** What the nameplate says, and where the machine stands. */
export const nameplate = z.object({
  manufacturer: line('The manufacturer', 120),
  model: line('The model', 120),
  /** As printed, with its dashes and spaces; letters keep their case. */
  serialNumber: line('The serial number', 80),
  year,
  control: optionalText('The control', 120),
  site: optionalText('The site', 200),
});

const optionalId = z
  .union([z.literal(''), id])
  .nullish()
  .transform((value) => value || null);

/** One schema for the form and for registering; the customer becomes the first owner. */
export const machineFields = nameplate.extend({ customerId: optionalId, makeUp });
export type MachineFields = z.output<typeof machineFields>;

/** The owner changes by a transfer, never by the way. */
export const machineChange = nameplate.extend({ makeUp }).partial();
export type MachineChange = z.output<typeof machineChange>;

/** A machine goes to another owner on a day; the transfer says whether the reports of the years before go along. */
export const transfer = z.object({
  customerId: z.uuid('Choose the new owner.'),
  fromDate: day('The day'),
  seesHistory: z.boolean().default(false),
});
export type Transfer = z.output<typeof transfer>;
