import type { TextImport } from '@/lib/sheet/text-import/import-text';

/** What was taken over, for the line above the sheet. */
export function takenWords({ fills, over, problems }: Pick<TextImport, 'fills' | 'over' | 'problems'>): string {
  const filled = fills.filter(({ text }) => text !== '').length;
  const leftOut = new Set(problems.map(({ line }) => line)).size;
  const parts = [`${filled} figures taken over from the text`];
  if (over.length > 0) parts.push(`${over.length} of the fields held something else before`);
  if (leftOut > 0) parts.push(`${leftOut} ${leftOut === 1 ? 'line' : 'lines'} left out`);
  return `${parts.join(', ')}. Ctrl Z in a field takes all of it back.`;
}
