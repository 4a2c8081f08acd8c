import type { LinearAxis, MakeUp } from '@/lib/schemas/make-up';
import type { BoundComponent, Plane } from '@/standards/types';
import type { AxisRole } from './axes';
import { axesCarrying, axesInRole, axesOf, hasRole, isCross, isVertical, liesInPlane, rolesOfPlane } from './axes';

export const linearAxes = (letters: readonly string[] | undefined, makeUp: MakeUp): LinearAxis[] =>
  makeUp.linearAxes.filter(({ letter }) => !letters || letters.includes(letter));

/** One for each of the planes that contain the axis. */
export const inPlanes = (axes: LinearAxis[], planes: readonly Plane[]): BoundComponent[] =>
  axes.flatMap((axis) =>
    planes
      .filter((plane) => liesInPlane(axis, plane))
      .map((plane) => ({ axis: axis.id, plane, channel: axis.channel })),
  );

/** Axes in one role with every work spindle against which their motion matters. */
export const axesAndSpindles = (
  role: AxisRole,
  plane: Plane,
  carried: 'main' | 'any',
  makeUp: MakeUp,
): BoundComponent[] =>
  makeUp.linearAxes
    .filter((axis) => hasRole(axis, role))
    .flatMap((axis) =>
      spindlesFacing(axis, makeUp, carried).map((spindle) => ({
        axis: axis.id,
        spindle,
        plane,
        channel: axis.channel,
      })),
    );

export const yAndX = (makeUp: MakeUp): BoundComponent[] =>
  makeUp.turrets.flatMap((turret) => {
    const axes = axesOf(turret, makeUp);
    return axes
      .filter(isVertical)
      .flatMap((y) =>
        axes.filter(isCross).map((x) => ({ axis: y.id, reference: x.id, plane: 'XY' as const, channel: y.channel })),
      );
  });

/** Two axes that move a turret against the work and span a plane; the spindle's own where the turret has none. Each pair once. */
export function axisPairs(plane: Plane, makeUp: MakeUp): BoundComponent[] {
  const [first, second] = rolesOfPlane[plane];
  const found = makeUp.turrets.flatMap((turret) =>
    turret.worksAt.flatMap((spindle) =>
      axesInRole(turret, first, spindle, makeUp).flatMap((axis) =>
        axesInRole(turret, second, spindle, makeUp).map((reference) => ({
          axis: axis.id,
          reference: reference.id,
          turret: turret.id,
          plane,
          channel: axis.channel,
        })),
      ),
    ),
  );
  const pair = (one: BoundComponent) => `${one.axis} ${one.reference}`;
  return found.filter((one, index) => found.findIndex((other) => pair(other) === pair(one)) === index);
}

/**
 * Work spindles against which the motion of an axis matters: those that its turret works at; or, where the axis carries a spindle
 * (moving headstock), that spindle. `main`: a sub-spindle against the axis that carries it is a test of its own (SS-2).
 */
function spindlesFacing(axis: LinearAxis, makeUp: MakeUp, carried: 'main' | 'any'): string[] {
  const turret = makeUp.turrets.find(({ id }) => id === axis.carries);
  if (turret) return turret.worksAt;
  const spindle = makeUp.spindles.find(({ id }) => id === axis.carries);
  if (!spindle || spindle.type === 'tool' || (carried === 'main' && spindle.type !== 'main')) return [];
  return [spindle.id];
}

/** A turret can turn a piece where X and Z are there, either its own or those that move the spindle. */
export const turningPairs = (makeUp: MakeUp): BoundComponent[] =>
  makeUp.turrets.flatMap((turret) =>
    turret.worksAt.flatMap((spindle) => {
      const axes = [...axesOf(turret, makeUp), ...axesCarrying(spindle, makeUp)];
      const z = axes.find((axis) => hasRole(axis, 'longitudinal'));
      return z && axes.some(isCross) ? [{ spindle, turret: turret.id, axis: z.id, channel: turret.channel }] : [];
    }),
  );
