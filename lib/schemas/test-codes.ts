import { z } from 'zod';

/** Codes and editions that a job is measured by. An edition is part of what a test is: it is chosen, never assumed. */
export const testCodes = z
  .array(z.object({ code: z.string().min(1).max(60), edition: z.string().max(20) }))
  .min(1, 'Choose at least one test code.')
  .max(50)
  .superRefine((chosen, context) => {
    chosen.forEach(({ code }, index) => {
      const first = chosen.findIndex((other) => other.code === code);
      if (first === index) return;
      const editions = [chosen[first], chosen[index]].map((one) => one?.edition || 'without an edition').join(' and ');
      context.addIssue({
        code: 'custom',
        path: [],
        message: `${code} is chosen twice, ${editions}. Choose one edition of each code.`,
      });
    });
  });
export type TestCodeChoice = z.output<typeof testCodes>;

export const sameCode = (a: TestCodeChoice[number], b: TestCodeChoice[number]): boolean =>
  a.code === b.code && a.edition === b.edition;
