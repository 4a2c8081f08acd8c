import type { CellPointer, Field, SheetOutcome } from '@/lib/sheet/types';
import type { Evaluated } from './sheet-session';

export const notReadYet = 'Not read yet.';
export const notAnsweredYet = 'Not answered yet.';

/**
 * What is said at a field, and in the same words in the summary. The first letter tells the kind: `!` cannot be read, `?` unusual,
 * `-` missing; a plain text, so that a field is drawn again only when it changes. '' for nothing.
 */
export function problemAt(
  { fields, outcome, problems }: Evaluated,
  pointer: CellPointer,
  options: { checked: boolean; confirmed: ReadonlySet<CellPointer>; text: string },
): string {
  const problem = problems.get(pointer);
  if (problem?.severity === 'cannot-read') return `!${problem.message}`;
  if (problem && !options.confirmed.has(pointer)) return `?${problem.message}`;
  const missing = options.checked && options.text.trim() === '' && fields.order.includes(pointer);
  if (!missing || outcome.filled >= outcome.total || isAnsweredWithout(outcome, pointer)) return '';
  return `-${isAnswer(pointer) ? notAnsweredYet : notReadYet}`;
}

/** The figure of an item that needs none: answered “no”, or not fitted. */
function isAnsweredWithout(outcome: SheetOutcome, pointer: CellPointer): boolean {
  const id = pointer.match(/^\/items\/([^/]+)\/value$/)?.[1];
  const result = 'result' in outcome ? outcome.result : null;
  return result?.method === 'function-check' && result.items.some((item) => item.id === id);
}

/** A field that holds the answer to an item of a function check. */
const isAnswer = (pointer: CellPointer) => /^\/items\/[^/]+\/answer$/.test(pointer);

export const problemId = (passId: string, pointer: CellPointer) => `problem-${passId}${pointer.replaceAll('/', '-')}`;
export const fieldId = (passId: string, pointer: CellPointer) => `field-${passId}${pointer.replaceAll('/', '-')}`;

/** Test, place and unit: an input that is read out alone says where it belongs. */
export const fieldLabel = (title: string, field: Field) =>
  [title, field.label, field.unit].filter((part) => part !== null).join(' – ');
