import type { TestDefinition } from '../types';
import { code, edition, source } from './source';

export const base = { code, edition, version: 1, source, machineKinds: { only: ['engine-lathe'] } };

type Change = Pick<TestDefinition, 'tolerance'> & Partial<TestDefinition>;

/** A test that is made on an engine lathe as on other lathes, with what this code has of its own. `adds`: a last step. */
export function asEngineLathe(definition: TestDefinition, change: Change, adds?: string): TestDefinition {
  return {
    ...definition,
    ...base,
    ...(adds ? { procedure: [...definition.procedure, adds] } : {}),
    ...change,
  };
}
