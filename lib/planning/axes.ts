import type { LinearAxis, MakeUp, Turret } from '@/lib/schemas/make-up';
import type { Plane } from '@/standards/types';

const letters = ['X', 'Y', 'Z', 'U', 'V', 'W'] as const;

/** Which way an axis goes: along the spindle, across it in the sensitive plane, or up and down through its centre. */
export type AxisRole = 'longitudinal' | 'cross' | 'vertical';

/** U, V and W stand for second axes along X, Y and Z. */
export const isCross = (axis: LinearAxis) => axis.letter === 'X' || axis.letter === 'U';
export const isVertical = (axis: LinearAxis) => axis.letter === 'Y' || axis.letter === 'V';
export const isLongitudinal = (axis: LinearAxis) => axis.letter === 'Z' || axis.letter === 'W';

export const hasRole = (axis: LinearAxis, role: AxisRole): boolean =>
  ({ longitudinal: isLongitudinal, cross: isCross, vertical: isVertical })[role](axis);

/** The two roles that span a plane, in the order in which a pair of axes is named. */
export const rolesOfPlane: Record<Plane, [AxisRole, AxisRole]> = {
  ZX: ['cross', 'longitudinal'],
  XY: ['cross', 'vertical'],
  YZ: ['vertical', 'longitudinal'],
};

/** Whether the axis moves within the plane: Z in ZX and YZ, X in ZX and XY, Y in XY and YZ. */
export const liesInPlane = (axis: LinearAxis, plane: Plane): boolean =>
  rolesOfPlane[plane].some((role) => hasRole(axis, role));

/** Place of an axis among its fellows: X Y Z U V W, then the number. */
export function axisRank(id: string, makeUp: MakeUp): number {
  const axis = makeUp.linearAxes.find((candidate) => candidate.id === id);
  return axis ? letters.indexOf(axis.letter) * 10 + axis.number : 0;
}

export function axesCarrying(id: string, makeUp: MakeUp): LinearAxis[] {
  return inOrder(makeUp.linearAxes.filter((axis) => axis.carries === id));
}

export function axesOf(turret: Turret, makeUp: MakeUp): LinearAxis[] {
  return inOrder(makeUp.linearAxes.filter((axis) => turret.axes.includes(axis.id)));
}

/** Axes of a turret in one role; where it has none, those that carry the given work spindle, which then moves instead. */
export function axesInRole(turret: Turret, role: AxisRole, spindle: string | undefined, makeUp: MakeUp): LinearAxis[] {
  const own = axesOf(turret, makeUp).filter((axis) => hasRole(axis, role));
  if (own.length > 0 || spindle === undefined) return own;
  return axesCarrying(spindle, makeUp).filter((axis) => hasRole(axis, role));
}

/** The Z-like axis of the main tool slide: of the first turret or post at the main spindle, else of the moving headstock. */
export function mainLongitudinalAxis(makeUp: MakeUp): LinearAxis | undefined {
  const main = makeUp.spindles.find(({ type }) => type === 'main');
  if (!main) return undefined;
  const own = makeUp.turrets
    .filter(({ worksAt }) => worksAt.includes(main.id))
    .flatMap((turret) => axesOf(turret, makeUp));
  return [...own, ...axesCarrying(main.id, makeUp)].find(isLongitudinal);
}

function inOrder(axes: LinearAxis[]): LinearAxis[] {
  return [...axes].sort((a, b) => letters.indexOf(a.letter) - letters.indexOf(b.letter) || a.number - b.number);
}
