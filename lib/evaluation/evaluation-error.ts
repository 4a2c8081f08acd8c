export type EvaluationIssue = {
  /** JSON pointer (RFC 6901) to the field, '' for the whole input. */
  pointer: string;
  /** What is wrong and what the rule is, in plain words. */
  detail: string;
};

/** An input the methods do not take: unknown or missing fields, wrong texts, or a limit of the method passed. */
export class EvaluationError extends Error {
  override readonly name = 'EvaluationError';

  constructor(readonly issues: readonly EvaluationIssue[]) {
    super(issues.map(({ pointer, detail }) => `${pointer || '(input)'}: ${detail}`).join('; '));
  }
}

/** JSON pointer of a path. */
export function pointerOf(path: readonly PropertyKey[]): string {
  return path.map((key) => `/${String(key).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
}

/** Ends the evaluation with one issue. */
export function refuse(path: readonly PropertyKey[], detail: string): never {
  throw new EvaluationError([{ pointer: pointerOf(path), detail }]);
}
