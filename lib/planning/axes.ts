import type { LinearAxis, MakeUp, Turret } from '@/lib/schemas/make-up';

const letters = ['X', 'Y', 'Z', 'U', 'V', 'W'] as const;

/** U, V and W stand for second axes along X, Y and Z. */
export const isCross = (axis: LinearAxis) => axis.letter === 'X' || axis.letter === 'U';
export const isVertical = (axis: LinearAxis) => axis.letter === 'Y' || axis.letter === 'V';
export const isLongitudinal = (axis: LinearAxis) => axis.letter === 'Z' || axis.letter === 'W';

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

function inOrder(axes: LinearAxis[]): LinearAxis[] {
  return [...axes].sort((a, b) => letters.indexOf(a.letter) - letters.indexOf(b.letter) || a.number - b.number);
}
