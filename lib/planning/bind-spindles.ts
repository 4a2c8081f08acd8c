import type { MakeUp, Spindle, Turret } from '@/lib/schemas/make-up';
import type { BoundComponent, Plane } from '@/standards/types';
import { axesCarrying, isLongitudinal } from './axes';

export const spindles = (types: readonly Spindle['type'][], makeUp: MakeUp): BoundComponent[] =>
  makeUp.spindles.filter(({ type }) => types.includes(type)).map(({ id, channel }) => ({ spindle: id, channel }));

export function mainAndSub(makeUp: MakeUp): BoundComponent[] {
  const main = makeUp.spindles.find(({ type }) => type === 'main');
  if (!main) return [];
  return makeUp.spindles.filter(({ type }) => type === 'sub').map(({ id }) => ({ spindle: id, reference: main.id }));
}

export const subSpindlesWithAxis = (plane: Plane, makeUp: MakeUp): BoundComponent[] =>
  makeUp.spindles
    .filter(({ type }) => type === 'sub')
    .flatMap(({ id, channel }) =>
      axesCarrying(id, makeUp)
        .filter(isLongitudinal)
        .slice(0, 1)
        .map((axis) => ({ spindle: id, axis: axis.id, plane, channel })),
    );

/** A tool spindle with the turret or the axis that it rides on. */
export const toolSpindles = (makeUp: MakeUp): BoundComponent[] =>
  makeUp.spindles.filter(({ type }) => type === 'tool').map((spindle) => boundToolSpindle(spindle, makeUp));

/** The tool spindle is `spindle`, the work spindle `reference`. */
export const toolSpindlesAtWork = (makeUp: MakeUp): BoundComponent[] =>
  makeUp.spindles
    .filter(({ type }) => type === 'tool')
    .flatMap((spindle) => {
      const carrier = carrierOf(spindle, makeUp);
      const work = makeUp.spindles.filter(({ type }) => type !== 'tool').map(({ id }) => id);
      return (carrier?.worksAt ?? work).map((reference) => ({ ...boundToolSpindle(spindle, makeUp), reference }));
    });

/** The turret or post that a tool spindle rides on, directly or by an axis that carries that turret. */
function carrierOf(spindle: Spindle, makeUp: MakeUp): Turret | undefined {
  const axis = makeUp.linearAxes.find(({ id }) => id === spindle.carriedBy);
  return makeUp.turrets.find(({ id }) => id === (spindle.onTurret ?? axis?.carries));
}

function boundToolSpindle(spindle: Spindle, makeUp: MakeUp): BoundComponent {
  const turret = carrierOf(spindle, makeUp);
  return {
    spindle: spindle.id,
    ...(turret ? { turret: turret.id } : {}),
    ...(!turret && spindle.carriedBy ? { axis: spindle.carriedBy } : {}),
    channel: spindle.channel,
  };
}
