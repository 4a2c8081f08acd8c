/** One thing wrong with one field: where (JSON pointer into the request) and what, in words for the person who typed it. */
export interface FieldError {
  pointer: string;
  detail: string;
}

/**
 * An error that its reader can do something about: it is said in plain words and shown where it arose.
 * Everything else is unexpected: it is logged with an id, and only the id is shown.
 */
export class DomainError extends Error {
  constructor(
    readonly status: 400 | 401 | 403 | 404 | 409 | 412 | 422 | 428 | 429 | 503,
    readonly title: string,
    readonly detail: string,
    readonly errors: FieldError[] = [],
    readonly extra: Record<string, unknown> = {},
  ) {
    super(`${title}: ${detail}`);
    this.name = 'DomainError';
  }
}

export const notFound = (what: string) =>
  new DomainError(404, 'Not found', `There is no such ${what}, or it is not yours to see.`);

export const forbidden = (detail: string) => new DomainError(403, 'Not allowed', detail);

export const invalid = (errors: FieldError[]) =>
  new DomainError(422, 'Please look at the marked fields', errors.map((e) => e.detail).join(' '), errors);

export const conflict = (detail: string, extra: Record<string, unknown> = {}) =>
  new DomainError(409, 'Not possible now', detail, [], extra);

/** Thrown where an update found another version than the one that was changed. */
export const changedMeanwhile = () =>
  new DomainError(
    412,
    'Changed meanwhile',
    'Somebody else has changed this since you opened it. Look at it again; what you typed is still here.',
  );
