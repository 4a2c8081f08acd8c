import type { MakeUp } from '@/lib/schemas/make-up';
import type { BoundComponent, Plane } from '@/standards/types';
import { axesCarrying, isLongitudinal, mainLongitudinalAxis } from './axes';

const mainSpindle = (makeUp: MakeUp) => makeUp.spindles.find(({ type }) => type === 'main');
const inPlane = (plane: Plane | undefined) => (plane ? { plane } : {});

export const tailstock = ({ tailstock: one }: MakeUp): BoundComponent[] =>
  one ? [{ tailstock: one.id, channel: one.channel }] : [];

export function tailstockAndAxis(plane: Plane | undefined, makeUp: MakeUp): BoundComponent[] {
  const axis = mainLongitudinalAxis(makeUp);
  return axis ? tailstock(makeUp).map((one) => ({ ...one, axis: axis.id, ...inPlane(plane) })) : [];
}

export function tailstockAndSpindle(plane: Plane | undefined, makeUp: MakeUp): BoundComponent[] {
  const spindle = mainSpindle(makeUp);
  return spindle ? tailstockAndAxis(plane, makeUp).map((one) => ({ ...one, spindle: spindle.id })) : [];
}

export const guideBush = ({ guideBush: one }: MakeUp): BoundComponent[] =>
  one ? [{ guideBush: one.id, channel: one.channel }] : [];

export function guideBushAndSpindle(makeUp: MakeUp): BoundComponent[] {
  const spindle = mainSpindle(makeUp);
  return spindle ? guideBush(makeUp).map((one) => ({ ...one, spindle: spindle.id })) : [];
}

/** The axis that pushes the bar through the bush: that of the moving headstock. */
export function guideBushAndAxis(plane: Plane, makeUp: MakeUp): BoundComponent[] {
  const spindle = mainSpindle(makeUp);
  const axis = spindle && axesCarrying(spindle.id, makeUp).find(isLongitudinal);
  return axis ? guideBush(makeUp).map((one) => ({ ...one, axis: axis.id, plane })) : [];
}

export const toolChanger = ({ toolChanger: one }: MakeUp): BoundComponent[] =>
  one ? [{ toolChanger: one.id, channel: one.channel }] : [];

/** A rotary axis with the spindle or the turret that it turns. */
export const rotaryAxes = (letters: readonly string[], makeUp: MakeUp): BoundComponent[] =>
  makeUp.rotaryAxes
    .filter(({ id }) => letters.includes(id.charAt(0)))
    .map(({ id, carries, channel }) => ({ rotary: id, ...turned(carries, makeUp), channel }));

function turned(id: string, makeUp: MakeUp): BoundComponent {
  if (makeUp.spindles.some((spindle) => spindle.id === id)) return { spindle: id };
  return makeUp.turrets.some((turret) => turret.id === id) ? { turret: id } : {};
}
