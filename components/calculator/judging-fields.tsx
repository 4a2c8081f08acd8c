'use client';

import { Field } from '@/components/ui/field';
import { NumberText, Select } from '@/components/ui/inputs';
import { PERMISSIBLE_DIRECTIONS } from '@/lib/evaluation';
import { DIRECTION_WORDS } from '@/lib/reporting/words';
import type { ShownIn } from '@/standards/types';
import { type JudgingTexts, judgingUnits, type ReadJudging } from './judging';

/** Tolerance, permitted side and decision rule, where somebody wants a verdict. */
export function JudgingFields(props: {
  texts: JudgingTexts;
  problems: ReadJudging['problems'];
  shownIn: Exclude<ShownIn, 'items'>;
  signed: boolean;
  hasBasis: boolean;
  onChange: (texts: JudgingTexts) => void;
}) {
  const { texts, problems, shownIn, signed, hasBasis, onChange } = props;
  const unit = judgingUnits[shownIn].words;
  const change = (name: keyof JudgingTexts) => (event: { target: { value: string } }) =>
    onChange({ ...texts, [name]: event.target.value });
  return (
    <fieldset className="mt-4 border-t border-line pt-3">
      <legend className="pr-2 font-semibold">Verdict, where there is a tolerance</legend>
      <div className="grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-4">
        <Field label={`Tolerance, ${unit}`} error={problems.tolerance || undefined}>
          <NumberText value={texts.tolerance} onChange={change('tolerance')} />
        </Field>
        {signed && (
          <Field label="Permitted">
            <Select value={texts.direction} onChange={change('direction')}>
              {PERMISSIBLE_DIRECTIONS.map((direction) => (
                <option key={direction} value={direction}>
                  {DIRECTION_WORDS[direction]}
                </option>
              ))}
            </Select>
          </Field>
        )}
        {hasBasis && (
          <Field label="The tolerance counts">
            <Select value={texts.basis} onChange={change('basis')}>
              <option value="offset">the offset</option>
              <option value="total-indicator-reading">the total indicator reading</option>
            </Select>
          </Field>
        )}
        <Field label="Decision rule">
          <Select value={texts.rule} onChange={change('rule')}>
            <option value="simple">simple acceptance</option>
            <option value="guarded">guarded acceptance</option>
          </Select>
        </Field>
        {texts.rule === 'guarded' && (
          <Field label={`Standard uncertainty, ${unit}`} error={problems.uncertainty || undefined}>
            <NumberText value={texts.uncertainty} onChange={change('uncertainty')} />
          </Field>
        )}
      </div>
    </fieldset>
  );
}
