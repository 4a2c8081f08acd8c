import { convert } from '@/lib/units/convert';
import { formatDecimal } from '@/lib/units/format';
import { limitsInWords, sizeClassTables, sizeCriterionWords } from '@/standards/size-classes';
import type { DecimalText, ToleranceRule } from '@/standards/types';

const shown = { µm: 'mm', 'µm/m': 'mm/m', '″': '″' } as const;

/** Unit in which the tolerances of a rule are shown: mm as the codes print them, mm/m for slopes, ″ for rotary axes. */
export const toleranceUnit = ({ unit = 'µm' }: Pick<ToleranceRule, 'unit'>): (typeof shown)[keyof typeof shown] =>
  shown[unit];

/** A figure of a rule as it is shown. */
function asShown(figure: DecimalText, { unit = 'µm' }: Pick<ToleranceRule, 'unit'>): string {
  if (unit === '″') return formatDecimal(figure);
  return formatDecimal(unit === 'µm' ? convert(figure, 'µm', 'mm') : convert(figure, 'µm/m', 'mm/m'));
}

export interface ToleranceLine {
  when: string;
  /** In the unit of `toleranceUnit`. */
  tolerance: string;
}

/** The tolerance table of a test, each line with the sizes for which it holds. */
export function toleranceLines(rule: ToleranceRule): ToleranceLine[] {
  if (rule.by === 'all' && rule.allUm) return [{ when: 'all sizes', tolerance: asShown(rule.allUm, rule) }];
  if (rule.by === 'size-class' && rule.byClassUm) {
    return rule.byClassUm.map((um, index) => ({
      when: `size class ${index + 1}: ${classWords(index + 1)}`,
      tolerance: asShown(um, rule),
    }));
  }
  const length = rule.by === 'travel' ? 'travel' : 'distance between centres';
  return (rule.steps ?? []).map((step) => ({
    when: `${length} ${limitsInWords(step)} mm`,
    tolerance: asShown(step.toleranceUm, rule),
  }));
}

/** How it changes with the length that could be measured, and what must hold besides. */
export function toleranceNotes(rule: ToleranceRule): string[] {
  const { perLength, local, basis } = rule;
  const figure = (value: DecimalText) => `${asShown(value, rule)} ${toleranceUnit(rule)}`;
  return [
    ...(perLength
      ? [
          `Given over ${perLength.baseLengthMm} mm; over another length in proportion, never below ${figure(perLength.minimumUm)}` +
            (perLength.maximumUm ? ` and never above ${figure(perLength.maximumUm)}.` : '.'),
        ]
      : []),
    ...(local ? [`Besides, ${figure(local.toleranceUm)} over any ${local.lengthMm} mm.`] : []),
    ...(basis === 'offset' ? ['It counts the offset of the axes, half of the total indicator reading.'] : []),
    ...(basis === 'total-indicator-reading' ? ['It counts the total indicator reading.'] : []),
  ];
}

function classWords(wanted: number): string {
  return sizeClassTables
    .flatMap(({ criterion, classes }) => {
      const found = classes.find((each) => each.class === wanted);
      if (!found) return [];
      const upTo = found.upToMm === null ? '' : ` up to ${found.upToMm}`;
      return [`${sizeCriterionWords[criterion]} over ${found.overMm}${upTo}`];
    })
    .join('; ');
}
