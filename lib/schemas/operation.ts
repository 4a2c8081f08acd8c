import { z } from 'zod';
import { UNITS } from '@/lib/units/unit';
import { id } from './common';
import { longestReading, longestRemark } from './text-lengths';

const isRemark = (cellId: string) => /^\/items\/[^/]+\/remark$/.test(cellId);

/**
 * One committed change of one field. It is written on the device before it is sent, keeps its id through every retry,
 * and names the version that it was typed over: the server applies it once, or says who changed the field meanwhile.
 */
export const readingOperation = z
  .strictObject({
    opId: id,
    passId: id,
    cellId: z
      .string()
      .regex(/^(\/[^/]{1,40}){1,8}$/, 'This is no field of a sheet.')
      .max(200),
    baseVersion: z.int().min(0),
    /** As typed; empty clears the field. */
    text: z.string().max(longestRemark, `Longer than ${longestRemark} characters.`),
    unit: z.enum(UNITS).nullable(),
    source: z.enum(['typed', 'keypad', 'paste', 'device', 'planned']),
    deviceTime: z.iso.datetime({ offset: true }),
    seq: z.int().min(0),
    reason: z.string().max(500).nullish(),
  })
  .refine(({ cellId, text }) => text.length <= longestReading || isRemark(cellId), {
    path: ['text'],
    message: `Longer than ${longestReading} characters.`,
  });
export type ReadingOperation = z.output<typeof readingOperation>;

export const operationBatch = z.strictObject({ operations: z.array(readingOperation).min(1).max(100) });

export interface ServerCell {
  text: string;
  unit: string | null;
  version: number;
  by: string | null;
  at: string;
}

export type OperationAnswer =
  | { opId: string; outcome: 'applied' | 'already'; version: number }
  | { opId: string; outcome: 'conflict'; server: ServerCell }
  | { opId: string; outcome: 'rejected'; problem: string };
