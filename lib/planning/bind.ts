import type { LinearAxis, MakeUp } from '@/lib/schemas/make-up';
import type { AppliesTo, BoundComponent, Plane } from '@/standards/types';
import { axesCarrying, axesOf, isCross, isLongitudinal, isVertical } from './axes';

/** Every component of a machine that a definition fits, in the order of the make-up. */
export function bind(appliesTo: AppliesTo, makeUp: MakeUp): BoundComponent[] {
  switch (appliesTo.kind) {
    case 'spindle':
      return makeUp.spindles
        .filter(({ type }) => appliesTo.types.some((wanted) => wanted === type))
        .map(({ id, channel }) => ({ spindle: id, channel }));
    case 'longitudinal-axis-and-spindle':
      return makeUp.linearAxes
        .filter(isLongitudinal)
        .flatMap((axis) =>
          spindlesFacing(axis, makeUp, 'main').map((spindle) => bound(axis, spindle, appliesTo.plane)),
        );
    case 'cross-axis-and-spindle':
      return makeUp.linearAxes
        .filter(isCross)
        .flatMap((axis) => spindlesFacing(axis, makeUp, 'any').map((spindle) => bound(axis, spindle, 'ZX')));
    case 'y-and-x':
      return makeUp.turrets.flatMap((turret) => {
        const axes = axesOf(turret, makeUp);
        return axes
          .filter(isVertical)
          .flatMap((y) =>
            axes
              .filter(isCross)
              .map((x) => ({ axis: y.id, reference: x.id, plane: 'XY' as const, channel: y.channel })),
          );
      });
    case 'longitudinal-axis':
      return makeUp.linearAxes
        .filter(isLongitudinal)
        .flatMap((axis) => appliesTo.planes.map((plane) => ({ axis: axis.id, plane, channel: axis.channel })));
    case 'main-and-sub-spindle': {
      const main = makeUp.spindles.find(({ type }) => type === 'main');
      if (!main) return [];
      return makeUp.spindles
        .filter(({ type }) => type === 'sub')
        .map(({ id }) => ({ spindle: id, reference: main.id }));
    }
    case 'turret-and-spindle':
      return makeUp.turrets.flatMap((turret) =>
        turret.worksAt.map((spindle) => ({ turret: turret.id, spindle, channel: turret.channel })),
      );
    case 'linear-axis':
      return makeUp.linearAxes
        .filter(({ letter }) => !appliesTo.letters || appliesTo.letters.includes(letter))
        .map(({ id, channel }) => ({ axis: id, channel }));
    case 'turning-turret-and-spindle':
      return turningPairs(makeUp);
  }
}

function bound(axis: LinearAxis, spindle: string, plane: Plane): BoundComponent {
  return { axis: axis.id, spindle, plane, channel: axis.channel };
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
function turningPairs(makeUp: MakeUp): BoundComponent[] {
  return makeUp.turrets.flatMap((turret) =>
    turret.worksAt.flatMap((spindle) => {
      const axes = [...axesOf(turret, makeUp), ...axesCarrying(spindle, makeUp)];
      const z = axes.find(isLongitudinal);
      return z && axes.some(isCross) ? [{ spindle, turret: turret.id, axis: z.id, channel: turret.channel }] : [];
    }),
  );
}
