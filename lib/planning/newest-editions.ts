/** The newest edition of each code, in the given order; a code without editions stands as it is. */
export function newestEditions<T extends { code: string; edition: string }>(codes: readonly T[]): T[] {
  return codes.filter(
    (one) => !codes.some((other) => other.code === one.code && other.edition.localeCompare(one.edition, 'en') > 0),
  );
}
