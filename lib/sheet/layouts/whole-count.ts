/** A count as it was written (`4`), or null where it is none or lies outside what is allowed. */
export function wholeCount(text: string | undefined, { least, most }: { least: number; most: number }): number | null {
  const written = text?.trim() ?? '';
  if (!/^\d{1,4}$/.test(written)) return null;
  const count = Number(written);
  return count >= least && count <= most ? count : null;
}
