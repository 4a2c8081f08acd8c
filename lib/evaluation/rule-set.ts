/**
 * Name of the rules by which results are made. Raised when a change alters a figure; results stored under an older name keep it, and
 * tests/records re-reads them for ever.
 */
export const ruleSet = 'witnessmark-1';
