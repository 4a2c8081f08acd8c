import type { CheckResult } from '@/lib/sheet/check-result';
import type { Cells, Field, SheetFields } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import { parseNumber } from '@/lib/units/parse-number';
import type { CheckItem } from '@/standards/types';
import type { LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { choiceField } from './parts';

type CheckList = LayoutOf<'check-list'>;

export const answerAt = (item: CheckItem) => `/items/${item.id}/answer`;
export const valueAt = (item: CheckItem) => `/items/${item.id}/value`;
export const remarkAt = (item: CheckItem) => `/items/${item.id}/remark`;

const answers = [
  { value: 'yes', label: 'yes' },
  { value: 'no', label: 'no' },
  { value: 'not-fitted', label: 'not fitted' },
];

function fields(layout: CheckList, cells: Cells): SheetFields {
  const withValues = layout.items.some(({ value }) => value);
  return {
    setUp: [],
    tables: [
      {
        title: null,
        columns: [
          { label: 'in order', unit: null },
          ...(withValues ? [{ label: 'value', unit: null }] : []),
          { label: 'remark', unit: null },
        ],
        rows: layout.items.map((item) => ({
          label: item.question,
          cells: [
            { field: { ...choiceField(answerAt(item), item.question, answers), role: 'reading' as const } },
            ...(withValues ? [item.value ? { field: valueField(item) } : null] : []),
            { field: plainField(remarkAt(item), `remark: ${item.question}`) },
          ],
        })),
      },
    ],
    order: layout.items.flatMap((item) =>
      asksFigure(item, cells) ? [answerAt(item), valueAt(item)] : [answerAt(item)],
    ),
  };
}

const plainField = (pointer: string, label: string): Field => ({
  pointer,
  role: 'set-up',
  unit: null,
  label,
  optional: true,
});

/** A figure that has limits is asked for like a reading; one without is noted where it is known. */
const valueField = (item: CheckItem): Field => {
  const field = plainField(valueAt(item), `${item.value!.label}, ${item.value!.unit}: ${item.question}`);
  return hasLimits(item) ? { ...field, role: 'reading', optional: false } : field;
};

/**
 * What the answers come to. `value` is the figure as it can be read; one that is outside its limits puts a “yes” out of order. Not
 * fitted is neither.
 */
export function checkResult(layout: CheckList, values: SheetValues): CheckResult {
  const items = layout.items.flatMap((item) => {
    const answer = values.get(answerAt(item)) as 'yes' | 'no' | 'not-fitted' | undefined;
    if (answer === undefined) return [];
    const value = figureOf(item, values);
    // A figure that has limits is part of the answer.
    if (answer === 'yes' && value === null && hasLimits(item)) return [];
    const withinLimits = value === null || !hasLimits(item) ? null : within(value, item.value!);
    const inOrder = answer === 'not-fitted' ? null : answer === 'yes' && withinLimits !== false;
    return [{ id: item.id, answer, value, withinLimits, inOrder }];
  });
  return {
    method: 'function-check',
    deviation: String(items.filter(({ inOrder }) => inOrder === false).length),
    judgedBy: 'items not in order',
    signed: false,
    items,
    notFitted: items.filter(({ answer }) => answer === 'not-fitted').length,
  };
}

/** What is not fitted, or not in order without it, needs no figure. */
const asksFigure = (item: CheckItem, cells: Cells): boolean =>
  hasLimits(item) && !['no', 'not-fitted'].includes(cells[answerAt(item)]?.text.trim() ?? '');

const hasLimits = ({ value }: CheckItem) => value?.lower !== undefined || value?.upper !== undefined;

function figureOf(item: CheckItem, values: SheetValues): string | null {
  const text = item.value && values.get(valueAt(item));
  const parsed = text ? parseNumber(text) : null;
  return parsed?.ok && parsed.unit === null ? parsed.value : null;
}

function within(value: string, { lower, upper }: NonNullable<CheckItem['value']>): boolean {
  const figure = Fraction.from(value);
  if (lower !== undefined && figure.compare(Fraction.from(lower)) < 0) return false;
  return upper === undefined || figure.compare(Fraction.from(upper)) <= 0;
}

/** Values that cannot be read as a figure in the unit that the item names. */
export function unreadableValues(layout: CheckList, cells: Cells): { pointer: string; message: string }[] {
  return layout.items.flatMap((item) => {
    const text = item.value ? (cells[valueAt(item)]?.text.trim() ?? '') : '';
    if (text === '') return [];
    const parsed = parseNumber(text);
    if (parsed.ok && parsed.unit === null) return [];
    const problem = parsed.ok ? 'Write the figure alone.' : parsed.problem;
    return [{ pointer: valueAt(item), message: `${problem} It is understood in ${item.value!.unit}.` }];
  });
}

/** A function check goes to no evaluation method; judge-sheet takes `checkResult` instead. */
export const checkList: LayoutEngine<CheckList> = {
  fields,
  assemble: () => ({ input: null, reason: 'A function check is answered, not evaluated.' }),
  plot: () => null,
};
