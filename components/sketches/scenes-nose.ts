import type { Scene } from '@/components/sketches/scene';
import {
  AXIS_Y,
  headstock,
  holder,
  indicator,
  mandrel,
  motion,
  spindleAngles,
  stand,
} from '@/components/sketches/sketch-parts';
import { SKETCH_WORDS } from '@/lib/reporting/words';

const PART = { fill: 'leaf' as const };
const TOP = AXIS_Y - 10;

/** Run-out of the face: the stylus parallel to the axis, on one circle after another. */
export const faceRunOut: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  pen.box(face, AXIS_Y - 52, 14, 104, PART);
  pen.axis([6, AXIS_Y], [200, AXIS_Y]);
  const dial = indicator(pen, [face + 14, 80], [-1, 0], [face + 44, 58], 'middle');
  stand(pen, dial, 240);
  const inner = { dash: [4, 3] };
  pen.line(
    [
      [face + 14, 146],
      [face + 30, 146],
    ],
    inner,
  );
  pen.circle(face + 44, 146, 14, inner);
  spindleAngles(pen, spec.anglesDeg);
};

/** Axial slip: a ball in the centre of the spindle, the indicator on the axis. */
export const axialSlip: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  pen.axis([6, AXIS_Y], [face + 20, AXIS_Y]);
  mandrel(pen, face, face + 20);
  pen.circle(face + 28, AXIS_Y, 8, PART);
  const dial = indicator(pen, [face + 36, AXIS_Y], [-1, 0], [face + 66, AXIS_Y - 22], 'middle');
  stand(pen, dial, 260);
  spindleAngles(pen, spec.anglesDeg);
};

/** Axis of rotation: two sensors that touch nothing, across and along a master ball on a running spindle. */
export const spindleSensors: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, face, face + 30, 7);
  pen.circle(face + 46, AXIS_Y, 18, PART);
  pen.axis([6, AXIS_Y], [face + 62, AXIS_Y]);
  const x = face + 46;
  pen.box(x - 7, 56, 14, 38, PART);
  pen.box(x + 24, AXIS_Y - 7, 38, 14, PART);
  pen.line([
    [x + 7, 68],
    [262, 68],
  ]);
  pen.line([
    [x + 62, AXIS_Y],
    [262, AXIS_Y],
  ]);
  pen.material(262, 54, 28, 120);
  spindleAngles(pen, spec.anglesDeg);
};

/** The mandrel's own error taken out: the same line read again with the mandrel turned half round in its seat. */
export const mandrelHalfTurn: Scene = (pen, _spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, face, 310);
  pen.axis([6, AXIS_Y], [340, AXIS_Y]);
  pen.line(
    [
      [face, AXIS_Y],
      [310, AXIS_Y + 22],
    ],
    { dash: [6, 4] },
  );
  pen.line(
    [
      [face, AXIS_Y],
      [310, AXIS_Y - 22],
    ],
    { dash: [6, 4] },
  );
  const dial = indicator(pen, [236, TOP], [0, 1], [256, TOP - 25]);
  holder(pen, dial, 306);
  pen.turnArrow(30, 30, 14, 40, 330, { stroke: 'blue' });
  pen.text(54, 35, SKETCH_WORDS.halfTurn, { ink: 'blue', sizePx: 13 });
  motion(pen, [150, 166], [270, 166], component.axis ?? '', [210, 185]);
};

/** Mandrel in a tool spindle, read from a fixed place. */
export const toolSpindleMandrel: Scene = (pen, spec, component) => {
  pen.material(262, AXIS_Y - 44, 70, 88);
  pen.box(240, AXIS_Y - 22, 22, 44, PART);
  mandrel(pen, 100, 240);
  pen.axis([84, AXIS_Y], [346, AXIS_Y]);
  pen.text(297, AXIS_Y + 62, component.spindle ?? '', { anchor: 'middle' });
  const dial = indicator(pen, [140, AXIS_Y + 10], [0, -1], [162, AXIS_Y + 45]);
  pen.line([
    [dial[0] - 14, dial[1]],
    [70, dial[1]],
  ]);
  pen.material(30, dial[1] - 14, 40, 28, 7);
  spindleAngles(pen, spec.anglesDeg);
  if (component.axis) motion(pen, [130, 198], [230, 198], component.axis, [240, 203], 'start');
};

/** Drift: sensors at the place of the tool against a mandrel in the spindle, read by the clock. */
export const driftAtTool: Scene = (pen, _spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, face, 242);
  pen.axis([6, AXIS_Y], [236, AXIS_Y]);
  pen.box(206, 66, 14, 36, PART);
  pen.box(248, AXIS_Y - 7, 30, 14, PART);
  pen.material(278, AXIS_Y - 40, 50, 80);
  pen.line([
    [220, 84],
    [278, 84],
  ]);
  pen.text(303, AXIS_Y + 58, component.turret ?? '', { anchor: 'middle' });
  pen.circle(36, 34, 20, { stroke: 'blue', fill: 'leaf' });
  pen.line(
    [
      [36, 21],
      [36, 34],
      [46, 39],
    ],
    { stroke: 'blue' },
  );
};
