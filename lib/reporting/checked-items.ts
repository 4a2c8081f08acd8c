import { answerAt, checkResult, remarkAt, valueAt } from '@/lib/sheet/layouts/check-list';
import { formatDecimal } from '@/lib/units/format';
import { parseNumber } from '@/lib/units/parse-number';
import type { CheckItem, Layout } from '@/standards/types';
import type { CheckedItem } from './report-model';
import { CHECK_ANSWERS } from './words';

type CheckCells = Readonly<Record<string, { text: string } | undefined>>;

/** The items of a function check as they were answered, in the order of the list; an item without an answer stands there as such. */
export function checkedItems(layout: Extract<Layout, { kind: 'check-list' }>, cells: CheckCells): CheckedItem[] {
  const text = (pointer: string) => cells[pointer]?.text.trim() ?? '';
  const filled = Object.keys(cells).flatMap((pointer): [string, string][] =>
    text(pointer) === '' ? [] : [[pointer, text(pointer)]],
  );
  const judged = new Map(checkResult(layout, new Map(filled)).items.map(({ id, inOrder }) => [id, inOrder]));
  return layout.items.map((item) => ({
    question: item.question,
    answer: CHECK_ANSWERS[text(answerAt(item)) as keyof typeof CHECK_ANSWERS] ?? null,
    value: item.value ? valueText(item.value, text(valueAt(item))) : null,
    remark: text(remarkAt(item)) || null,
    inOrder: judged.get(item.id) ?? null,
  }));
}

function valueText(value: NonNullable<CheckItem['value']>, text: string): string | null {
  if (text === '') return null;
  const parsed = parseNumber(text);
  const limits = limitWords(value);
  return `${parsed.ok ? formatDecimal(parsed.value) : text} ${value.unit}${limits ? ` (${limits})` : ''}`;
}

/** `4 to 6`, `at least 4`, `at most 6`; '' where the figure is only noted. */
export function limitWords({ lower, upper }: Pick<NonNullable<CheckItem['value']>, 'lower' | 'upper'>): string {
  if (lower !== undefined && upper !== undefined) return `${formatDecimal(lower)} to ${formatDecimal(upper)}`;
  if (lower !== undefined) return `at least ${formatDecimal(lower)}`;
  return upper === undefined ? '' : `at most ${formatDecimal(upper)}`;
}
