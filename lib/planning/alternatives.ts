import type { PlannedSheet } from '@/standards/types';
import { componentIds } from './component-words';
import { definitionOf } from './definition-of';

/** The sheet of the same plan that measures the same thing another way, where this one only stands in for it. */
export function standsInFor(sheet: PlannedSheet, plan: readonly PlannedSheet[]): PlannedSheet | null {
  const { insteadOf } = definitionOf(sheet.definition, sheet.ownDefinition);
  if (insteadOf === undefined) return null;
  const place = placeOf(sheet);
  return (
    plan.find(
      (other) =>
        other.definition.id === insteadOf &&
        other.definition.code === sheet.definition.code &&
        placeOf(other) === place,
    ) ?? null
  );
}

const placeOf = ({ component }: PlannedSheet): string =>
  [...componentIds(component), component.station, component.plane].join(' ');
