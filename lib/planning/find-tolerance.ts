import type { MakeUp } from '@/lib/schemas/make-up';
import { findSizeClass, liesWithin, limitsInWords } from '@/standards/size-classes';
import type { BoundComponent, PlannedTolerance, ToleranceRule } from '@/standards/types';

/**
 * Tolerance of a bound definition by the machine's sizes, µm.
 * @returns null where the definition has none or its table does not reach the machine's size: the sheet is for information then
 */
export function findTolerance(
  rule: ToleranceRule | null,
  component: BoundComponent,
  makeUp: MakeUp,
): PlannedTolerance | null {
  const found = rule && findFigure(rule, component, makeUp);
  if (!rule || !found) return null;
  return {
    baseUm: found.baseUm,
    ...(rule.perLength ? { perLength: rule.perLength } : {}),
    ...(rule.local ? { local: rule.local } : {}),
    ...(rule.basis ? { basis: rule.basis } : {}),
    foundBy: found.foundBy,
    provenance: rule.provenance,
  };
}

function findFigure(rule: ToleranceRule, component: BoundComponent, makeUp: MakeUp) {
  if (rule.by === 'all') {
    if (rule.allUm === undefined) return null;
    const foundBy = rule.perLength
      ? `one figure for all sizes, over ${rule.perLength.baseLengthMm} mm`
      : 'one figure for all sizes';
    return { baseUm: rule.allUm, foundBy };
  }
  if (rule.by === 'size-class') {
    const size = findSizeClass(makeUp.sizeClass);
    const baseUm = size && rule.byClassUm?.[size.class - 1];
    return baseUm ? { baseUm, foundBy: size.words } : null;
  }
  const axis = makeUp.linearAxes.find(({ id }) => id === component.axis);
  const step = axis && rule.steps?.find((candidate) => liesWithin(axis.travelMm, candidate));
  if (!axis || !step) return null;
  return { baseUm: step.toleranceUm, foundBy: `travel of ${axis.id} ${axis.travelMm} mm: ${limitsInWords(step)}` };
}
