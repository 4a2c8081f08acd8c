import { onCircle } from '@/components/plots/drawing-parts';
import type { Scene } from '@/components/sketches/scene';
import {
  AXIS_Y,
  headstock,
  holder,
  indicator,
  mandrel,
  motion,
  spindleAngles,
  subHeadstock,
  sweptIndicator,
  turretWithHole,
} from '@/components/sketches/sketch-parts';
import { SKETCH_WORDS } from '@/lib/reporting/words';

const PART = { fill: 'leaf' as const };
const BLUE = { stroke: 'blue' as const };
/** Indexing: the turret seen along its axis, the indicator at a pin at a radius. */
export const turretIndex: Scene = (pen, _spec, component) => {
  const [cx, cy] = [140, 122];
  const corners = Array.from({ length: 8 }, (_, k) => onCircle(cx, cy, 64, 22.5 + k * 45));
  pen.shape(corners, PART);
  for (let k = 0; k < 8; k += 1) pen.circle(...onCircle(cx, cy, 46, k * 45), 6);
  pen.text(cx, cy + 5, component.turret ?? '', { anchor: 'middle' });
  pen.turnArrow(cx, cy, 28, 40, 330, BLUE);
  pen.box(cx + 59, cy - 8, 14, 16, PART);
  pen.circle(cx + 84, cy, 11, PART);
  const dial = indicator(pen, [cx + 84, cy - 11], [0, 1], [cx + 104, cy - 36]);
  holder(pen, dial, 290);
  pen.dimension(cx, cx + 84, 206, SKETCH_WORDS.radius);
};

/** The turret's face against a motion: the indicator stands on the spindle, the turret goes past it. */
export const turretFace: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  const turret = 236;
  pen.material(turret, AXIS_Y - 62, 56, 124);
  pen.text(turret + 28, AXIS_Y + 80, component.turret ?? '', { anchor: 'middle' });
  const dial = indicator(pen, [turret, 90], [1, 0], [turret - 30, 68], 'middle');
  pen.line([
    [dial[0] - 14, dial[1]],
    [face + 24, dial[1]],
    [face + 24, AXIS_Y - 8],
    [face, AXIS_Y - 8],
  ]);
  if (spec.anglesDeg?.length) spindleAngles(pen, spec.anglesDeg);
  motion(pen, [318, 166], [318, 70], component.axis ?? '', [328, 122], 'start');
};

/** A mandrel in a tool place of the turret, read from a place that stands still. */
export const mandrelInTurret: Scene = (pen, spec, component) => {
  const turret = turretWithHole(pen, component.turret ?? '');
  mandrel(pen, 120, turret + 42);
  pen.axis([104, AXIS_Y], [346, AXIS_Y]);
  const dial = indicator(pen, [160, AXIS_Y + 10], [0, -1], [180, AXIS_Y + 45]);
  pen.line([
    [dial[0] - 14, dial[1]],
    [70, dial[1]],
  ]);
  pen.material(30, dial[1] - 14, 40, 28, 7);
  if (spec.anglesDeg?.length) spindleAngles(pen, spec.anglesDeg);
  if (component.axis) motion(pen, [140, 78], [240, 78], component.axis, [190, 68]);
};

/** Stations of a gang slide beside each other; the spindle carries the indicator round what is in one of them. */
export const gangStations: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  pen.material(252, 50, 26, 140);
  for (const y of [68, 168]) pen.box(226, y - 10, 26, 20, PART);
  pen.box(184, AXIS_Y - 10, 68, 20, PART);
  pen.axis([6, AXIS_Y], [178, AXIS_Y]);
  sweptIndicator(pen, face, 200, [200, 58], 'middle');
  if (component.station !== undefined) pen.text(288, AXIS_Y + 5, String(component.station), { ink: 'blue' });
  pen.text(265, 208, component.turret ?? '', { anchor: 'middle' });
  spindleAngles(pen, spec.anglesDeg);
  if (component.axis) motion(pen, [322, 166], [322, 76], component.axis, [330, 121], 'start');
};

/** A piece turned in one spindle and handed to the other, where the step is read. */
export const transferPiece: Scene = (pen, spec, component) => {
  headstock(pen, component.spindle ?? '');
  const other = subHeadstock(pen, component.reference ?? '');
  pen.box(160, AXIS_Y - 20, 50, 40, PART);
  pen.box(210, AXIS_Y - 14, other - 210, 28, PART);
  pen.axis([6, AXIS_Y], [354, AXIS_Y]);
  const dial = indicator(pen, [186, AXIS_Y - 20], [0, 1], [206, AXIS_Y - 45]);
  holder(pen, dial, 250);
  spindleAngles(pen, spec.anglesDeg);
  pen.arrow([160, 168], [250, 168], BLUE);
};

/** Two turned diameters, and the tool that turns them: the cylinder that is measured afterwards. */
export const testPieceCylinder: Scene = (pen, _spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  pen.box(face, AXIS_Y - 30, 200, 60, PART);
  pen.axis([6, AXIS_Y], [336, AXIS_Y]);
  [150, 216, 282].forEach((x, index) => {
    pen.arrow([x, AXIS_Y], [x, AXIS_Y - 30], { widthPx: 1 }, 6);
    pen.arrow([x, AXIS_Y], [x, AXIS_Y + 30], { widthPx: 1 }, 6);
    pen.text(x, AXIS_Y - 38, SKETCH_WORDS.diameters[index] ?? '', { anchor: 'middle' });
  });
  const tool = AXIS_Y + 30;
  pen.shape(
    [
      [304, tool],
      [314, tool + 14],
      [314, tool + 34],
      [294, tool + 34],
      [294, tool + 14],
    ],
    PART,
  );
  pen.text(322, tool + 30, component.turret ?? '');
  motion(pen, [270, 178], [150, 178], component.axis ?? '', [210, 198]);
};

/** A face turned in one cut from the rim to the middle. */
export const testPieceFace: Scene = (pen, _spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  pen.box(face, AXIS_Y - 64, 40, 128, PART);
  pen.axis([6, AXIS_Y], [190, AXIS_Y]);
  const cut = face + 40;
  pen.shape(
    [
      [cut, 84],
      [cut + 14, 74],
      [cut + 44, 74],
      [cut + 44, 94],
      [cut + 14, 94],
    ],
    PART,
  );
  pen.material(cut + 44, 66, 36, 36, 7);
  pen.text(cut + 62, 122, component.turret ?? '', { anchor: 'middle' });
  motion(pen, [290, 170], [290, 76], component.axis ?? '', [300, 128], 'start');
};

/** A piece milled and drilled with driven tools, seen from the front. */
export const testPiecePattern: Scene = (pen, _spec, component) => {
  const [cx, cy] = [140, 112];
  pen.circle(cx, cy, 82, PART);
  pen.material(cx - 36, cy - 36, 72, 72);
  for (const deg of [0, 90, 180, 270]) pen.circle(...onCircle(cx, cy, 60, deg), 9);
  pen.circle(cx, cy, 10, PART);
  pen.text(cx, 214, component.spindle ?? '', { anchor: 'middle' });
  motion(pen, [262, 160], [322, 160], component.axis ?? '', [330, 165], 'start');
  motion(pen, [262, 160], [262, 100], component.reference ?? '', [262, 90]);
};
