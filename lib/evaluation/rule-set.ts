/**
 * Name of the rules by which new results are made. Raised when a change alters a figure; what began under an older name keeps it, and
 * tests/records re-reads it for ever.
 */
export const ruleSet = 'witnessmark-1';

/** Rule sets that this program can compute by. A later one keeps the earlier ones beside it. */
const known: readonly string[] = [ruleSet];

/** @throws Error where a sheet was begun under rules that this program does not have: no figure is better than another one */
export function assertKnownRuleSet(name: string): void {
  if (!known.includes(name)) throw new Error(`This program cannot compute by the rule set ${name}.`);
}
