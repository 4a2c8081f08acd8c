import type { MakeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import type { PlannedSheet, TestDefinition } from '@/standards/types';
import { planSheets } from './plan-sheets';

/** A sheet on which a definition can be shown: on one of the given machines, else on one of those to start from; null: on none. */
export function exampleSheet(definition: TestDefinition, machines: readonly MakeUp[] = []): PlannedSheet | null {
  for (const makeUp of [...machines, ...startingMakeUps.map((start) => start.makeUp)]) {
    const [first] = planSheets(makeUp, [definition]);
    if (first) return first;
  }
  return null;
}
