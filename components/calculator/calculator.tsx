'use client';

import type { EvaluationInput, EvaluationMethod } from '@/lib/evaluation';
import { fieldFormOf } from '@/lib/explaining/methods/field-forms';
import type { GuideField } from '@/lib/explaining/methods/method-guide';
import { sheetForms } from '@/lib/explaining/methods/sheet-forms';
import { FieldCalculator } from './field-calculator';
import { SheetCalculator } from './sheet-calculator';

/** The form of one method, by its address. */
export function Calculator(props: {
  slug: string;
  method: EvaluationMethod;
  title: string;
  example: EvaluationInput;
  outputs: GuideField[];
}) {
  const sheet = sheetForms[props.method];
  if (sheet) return <SheetCalculator form={sheet} {...props} />;
  const fields = fieldFormOf(props.example);
  return fields ? <FieldCalculator form={fields} {...props} /> : null;
}
