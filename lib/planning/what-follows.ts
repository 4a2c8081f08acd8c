import { type ComponentConditions, partConditions } from '@/lib/schemas/component-conditions';
import type { MakeUp } from '@/lib/schemas/make-up';
import type { DependsOn } from '@/standards/types';
import { machineParts } from './machine-parts';

/**
 * Why a test follows from what was opened, in words: `turret T2 was removed and refitted`, `Z2 carries turret T2, which was …`.
 * It follows where its result rests on a touched component, or on an axis that moves one; every axis moves on the bed.
 * @returns null where it follows from nothing; an empty list where it rests on no component, so that nothing speaks against it
 */
export function whyItFollows(dependsOn: DependsOn, makeUp: MakeUp, conditions: ComponentConditions): string[] | null {
  const { components, moved, positioned } = dependsOn;
  const rests = [...new Set([...components, ...moved, ...positioned])];
  if (rests.length === 0) return [];
  const reasons = touchedParts(makeUp, conditions).flatMap(({ id, words, done }) => {
    if (rests.includes(id)) return [`${words} was ${done}`];
    if (id === 'bed') {
      const axis = rests.find((one) => isAxis(one, makeUp));
      return axis ? [`${axis} moves on the bed, which was ${done}`] : [];
    }
    const carrier = [...makeUp.linearAxes, ...makeUp.rotaryAxes].find(
      (axis) => axis.carries === id && rests.includes(axis.id),
    );
    return carrier ? [`${carrier.id} carries ${words}, which was ${done}`] : [];
  });
  return reasons.length > 0 ? reasons : null;
}

/** Whether anything is said to have been opened. */
export const anyTouched = (conditions: ComponentConditions): boolean =>
  Object.values(conditions).some(({ condition }) => condition !== 'untouched');

/** Components that were more than left alone, in the order of the make-up; what the machine no longer has is passed over. */
function touchedParts(makeUp: MakeUp, conditions: ComponentConditions) {
  return machineParts(makeUp).flatMap(({ id, words }) => {
    const said = conditions[id];
    if (!said || said.condition === 'untouched') return [];
    return [{ id, words: id === 'bed' ? 'the bed' : words, done: partConditions[said.condition] }];
  });
}

const isAxis = (id: string, makeUp: MakeUp) => makeUp.linearAxes.some((axis) => axis.id === id);
