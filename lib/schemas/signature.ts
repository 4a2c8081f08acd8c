import { z } from 'zod';
import { line, optionalDay, optionalText } from './common';

export const outcomes = {
  accept: 'Accept',
  'accept-with-remarks': 'Accept with remarks',
  refuse: 'Refuse',
} as const;
export type Outcome = keyof typeof outcomes;

/** Stored with the signature, word for word, as it stood above the button. */
export const intentTexts: Record<Outcome, string> = {
  accept:
    'I have read this acceptance report and accept the machine in the condition that it records. I sign this electronically; a paper copy can be signed instead.',
  'accept-with-remarks':
    'I have read this acceptance report and accept the machine in the condition that it records, with the remarks given here. I sign this electronically; a paper copy can be signed instead.',
  refuse:
    'I have read this acceptance report and do not accept the machine, for the reason given here. I sign this electronically; a paper copy can be signed instead.',
};

/** What the reviewer signs by issuing a report; shown above the button, stored with the signature. */
export const issueIntent = 'I have checked this report and issue it.';

/** Strokes of a drawn signature: SVG path data in a box of 600 × 200. */
const stroke = z
  .string()
  .regex(/^[ML0-9 .,-]+$/, 'This is no stroke.')
  .max(20_000);

export const signatureForm = z
  .object({
    outcome: z.enum(Object.keys(outcomes) as [Outcome], 'Choose: accept, accept with remarks, or refuse.'),
    name: line('Your name', 120),
    functionTitle: optionalText('Your function', 120),
    company: optionalText('The company', 200),
    place: optionalText('The place', 120),
    typed: optionalText('The typed signature', 120),
    strokes: z.array(stroke).max(200).nullish(),
    reason: optionalText('The reason', 2000),
    remarks: z
      .array(
        z.object({
          text: line('The remark', 2000),
          sheetId: z.uuid().nullish(),
          owner: optionalText('Who', 120),
          due: optionalDay('Due'),
        }),
      )
      .max(50)
      .default([]),
    intentConfirmed: z.literal(true, 'Please confirm the sentence above the button.'),
    intentText: z.string().max(1000),
    deviceTimeZone: z.string().max(60).nullish(),
  })
  .superRefine((form, context) => {
    if (form.outcome === 'refuse' && !form.reason) {
      context.addIssue({ code: 'custom', path: ['reason'], message: 'Say why the report is refused.' });
    }
    if (form.outcome === 'accept-with-remarks' && form.remarks.length === 0) {
      context.addIssue({ code: 'custom', path: ['remarks'], message: 'Write at least one remark, or choose Accept.' });
    }
    if (form.outcome !== 'accept-with-remarks' && form.remarks.length > 0) {
      context.addIssue({ code: 'custom', path: ['remarks'], message: 'Remarks go with “Accept with remarks”.' });
    }
    if (!form.typed && !form.strokes?.length) {
      context.addIssue({ code: 'custom', path: ['typed'], message: 'Draw your signature or type your name.' });
    }
    if (form.intentText !== intentTexts[form.outcome]) {
      context.addIssue({
        code: 'custom',
        path: ['intentText'],
        message: 'The sentence shown is not the one that is signed. Load the page again.',
      });
    }
  });
export type SignatureForm = z.output<typeof signatureForm>;
