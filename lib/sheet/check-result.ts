import type { MeasuredResult } from '@/lib/evaluation';
import type { DecimalText } from '@/standards/types';

/** What a function check came to. `deviation` counts the items that are not in order. */
export interface CheckResult {
  method: 'function-check';
  deviation: DecimalText;
  judgedBy: string;
  signed: false;
  items: {
    id: string;
    answer: 'yes' | 'no' | 'not-fitted';
    /** The figure beside the answer, where the item has one and it was written. */
    value: DecimalText | null;
    /** null: no figure, or one without limits. */
    withinLimits: boolean | null;
    /** null: not fitted. */
    inOrder: boolean | null;
  }[];
  notFitted: number;
}

export type SheetResult = MeasuredResult | CheckResult;
