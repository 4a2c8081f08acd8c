import type { MakeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import type { PlannedSheet, TestDefinition } from '@/standards/types';
import { planSheets } from './plan-sheets';

export interface ExampleMachine {
  title: string;
  makeUp: MakeUp;
}

/** A sheet on which a definition can be shown: on one of the given machines, else on one of those to start from; null: on none. */
export function exampleSheet(
  definition: TestDefinition,
  machines: readonly ExampleMachine[] = [],
): { sheet: PlannedSheet; machine: ExampleMachine } | null {
  for (const machine of [...machines, ...startingMakeUps]) {
    const [sheet] = planSheets(machine.makeUp, [definition]);
    if (sheet) return { sheet, machine };
  }
  return null;
}
