/** A failure that is told to the person in one sentence, without a stack: it says what is wrong and what helps. */
export class PlainError extends Error {}
