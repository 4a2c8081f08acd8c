import type { MakeUp } from '@/lib/schemas/make-up';
import type { TestDefinition } from '@/standards/types';

/** Whether a test is meant for this kind of machine: an engine lathe has a code of its own. */
export function fitsKind({ machineKinds }: Pick<TestDefinition, 'machineKinds'>, { kind }: MakeUp): boolean {
  if (machineKinds?.only && !machineKinds.only.includes(kind)) return false;
  return !machineKinds?.not?.includes(kind);
}
