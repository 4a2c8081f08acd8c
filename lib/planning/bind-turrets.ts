import type { MakeUp, Turret } from '@/lib/schemas/make-up';
import type { BoundComponent, Plane, TurretType } from '@/standards/types';
import { type AxisRole, axesInRole } from './axes';

export const turretsOf = (types: readonly TurretType[] | undefined, makeUp: MakeUp): Turret[] =>
  makeUp.turrets.filter(({ type }) => !types || types.includes(type));

/** Make-ups from before driven tools were asked for have none. */
export const withDrivenTools = (makeUp: MakeUp, points?: 'axial' | 'radial'): Turret[] =>
  makeUp.turrets.filter(({ drivenTools = 'none' }) =>
    points === undefined ? drivenTools !== 'none' : drivenTools === points || drivenTools === 'both',
  );

export const alone = (turrets: Turret[]): BoundComponent[] =>
  turrets.map(({ id, channel }) => ({ turret: id, channel }));

export const atEachSpindle = (turrets: Turret[]): BoundComponent[] =>
  turrets.flatMap(({ id, worksAt, channel }) => worksAt.map((spindle) => ({ turret: id, spindle, channel })));

/** Every station with every work spindle, station by station. */
export const stationsAtEachSpindle = (turrets: Turret[]): BoundComponent[] =>
  turrets.flatMap(({ id, worksAt, stations, channel }) =>
    worksAt.flatMap((spindle) =>
      Array.from({ length: stations }, (_, index) => ({ turret: id, station: index + 1, spindle, channel })),
    ),
  );

/** Turret with its axes in one role; a turret that stands fast, with that of the first work spindle that comes to it. */
export const withOwnAxis = (
  turrets: Turret[],
  role: AxisRole,
  plane: Plane | undefined,
  makeUp: MakeUp,
): BoundComponent[] =>
  turrets.flatMap((turret) => {
    const bySpindle = turret.worksAt.map((spindle) => axesInRole(turret, role, spindle, makeUp));
    const axes = bySpindle.find((found) => found.length > 0) ?? [];
    return axes.map((axis) => ({
      turret: turret.id,
      axis: axis.id,
      ...(plane ? { plane } : {}),
      channel: turret.channel,
    }));
  });

export const withAxisAndSpindle = (turrets: Turret[], role: AxisRole, makeUp: MakeUp): BoundComponent[] =>
  turrets.flatMap((turret) =>
    turret.worksAt.flatMap((spindle) =>
      axesInRole(turret, role, spindle, makeUp).map((axis) => ({
        turret: turret.id,
        axis: axis.id,
        spindle,
        channel: turret.channel,
      })),
    ),
  );
