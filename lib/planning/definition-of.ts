import { findDefinition } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';

/**
 * The definition that a stored sheet was made with. Definitions are kept for ever, so a missing one is a fault of the program.
 * @param own the organisation's own definition, which is kept whole with the sheet
 * @throws Error naming the definition
 */
export function definitionOf(
  stored: { id: string; code: string; edition: string; version: number },
  own?: TestDefinition | null,
): TestDefinition {
  const definition = own ?? findDefinition(stored.id, stored.code, stored.edition, stored.version);
  if (!definition)
    throw new Error(`no definition ${stored.id} version ${stored.version} of ${stored.code} ${stored.edition}`);
  return definition;
}
