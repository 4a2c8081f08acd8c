/** Whether an instrument of the register is of a kind that a test asks for: `dial indicator` is an `indicator`. */
export const fitsKind = (kind: string, wanted: readonly string[]): boolean =>
  wanted.some((word) => kind === word || kind.endsWith(` ${word}`));
