import { convert } from '@/lib/units/convert';
import { formatDecimal } from '@/lib/units/format';
import { sizeClassTables, sizeCriterionWords } from '@/standards/size-classes';
import type { DecimalText, ToleranceRule } from '@/standards/types';

const mm = (um: DecimalText): string => formatDecimal(convert(um, 'µm', 'mm'));

export interface ToleranceLine {
  when: string;
  toleranceMm: string;
}

/** The tolerance table of a test, in mm, each line with the sizes for which it holds. */
export function toleranceLines(rule: ToleranceRule): ToleranceLine[] {
  if (rule.by === 'all' && rule.allUm) return [{ when: 'all sizes', toleranceMm: mm(rule.allUm) }];
  if (rule.by === 'size-class' && rule.byClassUm) {
    return rule.byClassUm.map((um, index) => ({
      when: `size class ${index + 1}: ${classWords(index + 1)}`,
      toleranceMm: mm(um),
    }));
  }
  return (rule.steps ?? []).map((step) => ({
    when: step.upToMm === null ? `over ${step.overMm} mm` : `over ${step.overMm} up to ${step.upToMm} mm`,
    toleranceMm: mm(step.toleranceUm),
  }));
}

/** How it changes with the length that could be measured, and what must hold besides. */
export function toleranceNotes(rule: ToleranceRule): string[] {
  const { perLength, local, basis } = rule;
  return [
    ...(perLength
      ? [
          `Given over ${perLength.baseLengthMm} mm; over another length in proportion, never below ${mm(perLength.minimumUm)} mm` +
            (perLength.maximumUm ? ` and never above ${mm(perLength.maximumUm)} mm.` : '.'),
        ]
      : []),
    ...(local ? [`Besides, ${mm(local.toleranceUm)} mm over any ${local.lengthMm} mm.`] : []),
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
