import type { MakeUp } from '@/lib/schemas/make-up';
import type { BoundComponent, DependsOn, TestDefinition } from '@/standards/types';
import { axesCarrying, axesOf, isCross, isLongitudinal } from './axes';

/** What a later correction would have to touch to make the result of a bound definition doubtful. */
export function resolveDependsOn(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): DependsOn {
  const { components, moved, positioned } = definition.dependsOn;
  return {
    components: unique(components.map((part) => (part === 'bed' ? 'bed' : need(definition, component, part)))),
    moved: unique(moved.map((part) => need(definition, component, part))),
    positioned: unique(positioned.flatMap((part) => positionedAxes(part, definition, component, makeUp))),
  };
}

function positionedAxes(
  part: TestDefinition['dependsOn']['positioned'][number],
  definition: TestDefinition,
  component: BoundComponent,
  makeUp: MakeUp,
): string[] {
  const spindle = need(definition, component, 'spindle');
  const carrying = axesCarrying(spindle, makeUp);
  if (part === 'spindle-axis') return carrying.map(({ id }) => id);
  const turret = makeUp.turrets.find(({ id }) => id === need(definition, component, 'turret'));
  const own = turret ? axesOf(turret, makeUp) : [];
  // Where the spindle moves across instead of the turret, its axes place the one against the other.
  const across = carrying.filter((axis) => !isLongitudinal(axis));
  const axes = [...own, ...across];
  return (part === 'turret-cross-axis' ? axes.filter(isCross) : axes).map(({ id }) => id);
}

function need(
  definition: TestDefinition,
  component: BoundComponent,
  part: 'spindle' | 'reference' | 'turret' | 'axis',
) {
  const id = component[part];
  if (id === undefined) throw new Error(`${definition.id} rests on its ${part}, which the component does not have`);
  return id;
}

function unique(ids: string[]): string[] {
  return [...new Set(ids)];
}
