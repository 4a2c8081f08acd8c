import type { Scene } from '@/components/sketches/scene';
import {
  AXIS_Y,
  headstock,
  indicator,
  mandrel,
  motion,
  spindleAngles,
  subHeadstock,
  sweptIndicator,
  turretWithHole,
} from '@/components/sketches/sketch-parts';
import { SKETCH_WORDS } from '@/lib/reporting/words';

const TOP = AXIS_Y - 10;

/** Main and sub-spindle face each other; the main spindle carries the indicator round the other's mandrel. */
export const twoSpindlesSweep: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  const other = subHeadstock(pen, component.reference ?? '');
  mandrel(pen, 180, other);
  pen.axis([6, AXIS_Y], [354, AXIS_Y]);
  sweptIndicator(pen, face, 206);
  spindleAngles(pen, spec.anglesDeg);
};

/** The spindle carries the indicator round a pin in the tool hole. */
export const toolHoleSweep: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  const turret = turretWithHole(pen, component.turret ?? '');
  mandrel(pen, 184, turret + 42);
  pen.axis([6, AXIS_Y], [346, AXIS_Y]);
  sweptIndicator(pen, face, 206);
  spindleAngles(pen, spec.anglesDeg);
};

/** Height of a mandrel in the spindle against that of a pin in the tool hole, one indicator carried across. */
export const toolHoleHeights: Scene = (pen, _spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  const turret = turretWithHole(pen, component.turret ?? '');
  mandrel(pen, face, 176);
  mandrel(pen, 208, turret + 42);
  pen.axis([6, AXIS_Y], [346, AXIS_Y]);
  const first = indicator(pen, [148, TOP], [0, 1], [148, TOP - 52], 'middle');
  const second = indicator(pen, [236, TOP], [0, 1], [236, TOP - 52], 'middle');
  pen.arrow([first[0] + 20, first[1]], [second[0] - 20, second[1]], { stroke: 'blue', dash: [5, 4] });
};

/** Two collars, turned in one pass; their diameters and the distance between them. */
export const twoCollarPiece: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, face, 330, 14);
  const collars = [154, 284] as const;
  collars.forEach((x, index) => {
    pen.box(x - 15, AXIS_Y - 28, 30, 56, { fill: 'leaf' });
    pen.text(x, AXIS_Y - 36, SKETCH_WORDS.collars[index] ?? '', { anchor: 'middle' });
  });
  pen.axis([6, AXIS_Y], [348, AXIS_Y]);
  pen.dimension(collars[0], collars[1], 56, spec.atMm ? `${spec.atMm} mm` : '');
  const tool = AXIS_Y + 28;
  pen.shape(
    [
      [284, tool],
      [294, tool + 14],
      [294, tool + 34],
      [274, tool + 34],
      [274, tool + 14],
    ],
    { fill: 'leaf' },
  );
  pen.text(304, tool + 30, component.turret ?? '');
  motion(pen, [250, 172], [160, 172], component.axis ?? '', [205, 191]);
};
