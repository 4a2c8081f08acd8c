import type { Scene } from '@/components/sketches/scene';
import {
  AXIS_Y,
  headstock,
  holder,
  indicator,
  mandrel,
  motion,
  spindleAngles,
} from '@/components/sketches/sketch-parts';

const TOP = AXIS_Y - 10;

/** Run-out of the nose: the stylus normal to the centring diameter. */
export const spindleNose: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '', 80);
  pen.axis([60, AXIS_Y], [230, AXIS_Y]);
  const dial = indicator(pen, [face - 7, AXIS_Y - 17], [0, 1], [face + 13, AXIS_Y - 42]);
  holder(pen, dial, 270);
  spindleAngles(pen, spec.anglesDeg);
};

/** Run-out of the bore on a mandrel: at the nose, or at a distance from it. */
export const spindleBoreMandrel: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, face, 320);
  pen.axis([6, AXIS_Y], [346, AXIS_Y]);
  const far = spec.atMm !== undefined && Number(spec.atMm) > 0;
  const x = far ? 280 : face + 16;
  const dial = indicator(pen, [x, TOP], [0, 1], [x + 20, TOP - 25]);
  holder(pen, dial, far ? 314 : 200);
  if (far) pen.dimension(face, x, AXIS_Y + 38, `${spec.atMm} mm`);
  spindleAngles(pen, spec.anglesDeg);
};

/** A motion along the spindle axis: the indicator goes along the mandrel, the spindle stands at each angle in turn. */
export const mandrelAlongMotion: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, face, 310);
  pen.axis([6, AXIS_Y], [340, AXIS_Y]);
  const dial = indicator(pen, [204, TOP], [0, 1], [224, TOP - 25]);
  holder(pen, dial, 300);
  spindleAngles(pen, spec.anglesDeg);
  motion(pen, [150, 158], [270, 158], component.axis ?? '', [210, 177]);
};

/** A motion across the spindle axis: the indicator goes across a disc. */
export const discAcrossMotion: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  pen.box(face, AXIS_Y - 60, 12, 120, { fill: 'leaf' });
  pen.axis([6, AXIS_Y], [230, AXIS_Y]);
  const tip = [face + 12, AXIS_Y - 34] as const;
  const dial = indicator(pen, tip, [-1, 0], [tip[0] + 30, tip[1] - 21], 'middle');
  pen.line([
    [dial[0] + 14, dial[1]],
    [240, dial[1]],
  ]);
  pen.material(240, dial[1] - 14, 42, 28, 7);
  spindleAngles(pen, spec.anglesDeg);
  motion(pen, [316, 166], [316, 66], component.axis ?? '', [326, 121], 'start');
};
