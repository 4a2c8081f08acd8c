import { findDefinition } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';

/**
 * The definition that a stored sheet was made with. Definitions are kept for ever, so a missing one is a fault of the program.
 * @throws Error naming the definition
 */
export function definitionOf(stored: { id: string; code: string; edition: string; version: number }): TestDefinition {
  const definition = findDefinition(stored.id, stored.code, stored.edition, stored.version);
  if (!definition)
    throw new Error(`no definition ${stored.id} version ${stored.version} of ${stored.code} ${stored.edition}`);
  return definition;
}
