import type { Point } from '@/components/plots/drawing-parts';
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
} from '@/components/sketches/sketch-parts';

const PART = { fill: 'leaf' as const };
const BLUE = { stroke: 'blue' as const };

/** The quill of the tailstock, run out; the indicator goes along it. */
export const tailstockQuill: Scene = (pen, spec, component) => {
  pen.material(250, AXIS_Y - 40, 84, 84);
  pen.box(170, AXIS_Y - 14, 80, 28, PART);
  pen.axis([130, AXIS_Y], [346, AXIS_Y]);
  pen.text(292, AXIS_Y + 62, component.tailstock ?? '', { anchor: 'middle' });
  const dial = indicator(pen, [200, AXIS_Y - 14], [0, 1], [180, AXIS_Y - 39], 'end');
  pen.line([
    [dial[0] - 10, dial[1] - 10],
    [dial[0] - 22, 56],
    [110, 56],
  ]);
  pen.material(70, 44, 40, 24, 7);
  pen.arrow([236, 146], [184, 146], BLUE);
  if (spec.anglesDeg?.length) spindleAngles(pen, spec.anglesDeg);
  if (component.axis) motion(pen, [110, 186], [220, 186], component.axis, [230, 191], 'start');
};

/** A mandrel between the centres of spindle and tailstock; the indicator goes along it. */
export const betweenCentres: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, 136, 262, 13);
  pen.shape(
    [
      [face, AXIS_Y - 10],
      [face + 30, AXIS_Y],
      [face, AXIS_Y + 10],
    ],
    PART,
  );
  pen.shape(
    [
      [282, AXIS_Y - 10],
      [252, AXIS_Y],
      [282, AXIS_Y + 10],
    ],
    PART,
  );
  pen.box(282, AXIS_Y - 12, 20, 24, PART);
  pen.material(302, AXIS_Y - 38, 44, 76);
  pen.text(324, AXIS_Y + 56, component.tailstock ?? '', { anchor: 'middle' });
  pen.axis([6, AXIS_Y], [354, AXIS_Y]);
  const dial = indicator(pen, [200, AXIS_Y - 13], [0, 1], [220, AXIS_Y - 38]);
  holder(pen, dial, 260);
  spindleAngles(pen, spec.anglesDeg);
  motion(pen, [150, 164], [256, 164], component.axis ?? '', [203, 183]);
};

/** The guide bush in section, a bar of gauge quality through it, read in front of it. */
export const guideBush: Scene = (pen, spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  mandrel(pen, face, 330, 8);
  pen.material(188, AXIS_Y - 44, 50, 36);
  pen.material(188, AXIS_Y + 8, 50, 36);
  pen.text(213, AXIS_Y + 62, component.guideBush ?? '', { anchor: 'middle' });
  pen.axis([6, AXIS_Y], [346, AXIS_Y]);
  const dial = indicator(pen, [276, AXIS_Y - 8], [0, 1], [296, AXIS_Y - 33]);
  holder(pen, dial, 312);
  spindleAngles(pen, spec.anglesDeg);
  if (component.axis) motion(pen, [100, 200], [190, 200], component.axis, [200, 205], 'start');
};

/** A rotary axis seen along itself, a polygon on it, and the instrument that reads its angle. */
export const rotaryAxis: Scene = (pen, _spec, component) => {
  const [cx, cy] = [140, 112];
  pen.circle(cx, cy, 56, PART);
  pen.shape(
    Array.from({ length: 12 }, (_, k) => onCircle(cx, cy, 40, 15 + k * 30)),
    PART,
  );
  pen.text(cx, cy + 5, component.rotary ?? component.spindle ?? '', { anchor: 'middle' });
  pen.material(80, 172, 120, 20);
  pen.box(264, cy - 18, 70, 36, PART);
  pen.box(284, cy + 18, 30, 62, PART);
  pen.line(
    [
      [264, cy],
      [cx + 39, cy],
    ],
    { dash: [6, 4] },
  );
  pen.turnArrow(cx, cy, 78, 215, 325, BLUE);
  pen.turnArrow(cx, cy, 66, 325, 215, BLUE);
};

/** A head that swivels, at two angles; a mandrel in it is read at one of them. */
export const swivelAxis: Scene = (pen, _spec, component) => {
  const pivot: Point = [214, 124];
  const turned = (x: number, y: number, deg: number): [number, number] => {
    const radians = (deg * Math.PI) / 180;
    return [
      pivot[0] + x * Math.cos(radians) - y * Math.sin(radians),
      pivot[1] + x * Math.sin(radians) + y * Math.cos(radians),
    ];
  };
  const head = (deg: number, style: { fill?: 'leaf'; dash?: number[] }) => {
    const outline = (left: number, right: number, half: number) =>
      pen.shape(
        [turned(left, -half, deg), turned(right, -half, deg), turned(right, half, deg), turned(left, half, deg)],
        style,
      );
    outline(-78, 26, 24);
    outline(-124, -78, 9);
  };
  pen.material(240, pivot[1] - 34, 76, 68);
  head(48, { dash: [5, 3] });
  head(0, PART);
  pen.circle(...pivot, 6);
  pen.text(278, pivot[1] + 54, component.rotary ?? component.turret ?? '', { anchor: 'middle' });
  const dial = indicator(pen, [112, pivot[1] + 9], [0, -1], [134, pivot[1] + 44]);
  pen.line([
    [dial[0] - 14, dial[1]],
    [66, dial[1]],
  ]);
  pen.material(28, dial[1] - 14, 38, 28, 7);
  pen.turnArrow(...pivot, 140, 186, 222, BLUE);
};

/** Circular test: a bar that changes its length, between a ball on the spindle side and a ball on the tool side. */
export const circularGauge: Scene = (pen, _spec, component) => {
  const face = headstock(pen, component.spindle ?? '');
  const centre: Point = [face + 38, AXIS_Y];
  const deg = -28;
  mandrel(pen, face, centre[0] - 7, 6);
  const end = onCircle(...centre, 96, deg);
  const across = (r: number, half: number): Point[] => {
    const at = onCircle(...centre, r, deg);
    return [onCircle(...at, half, deg - 90), onCircle(...at, half, deg + 90)];
  };
  const tube = (from: number, to: number, half: number) => {
    const [a, b] = across(from, half) as [Point, Point];
    const [c, d] = across(to, half) as [Point, Point];
    pen.shape([a, c, d, b], PART);
  };
  tube(7, 92, 3);
  tube(20, 62, 6);
  pen.circle(...centre, 8, PART);
  pen.circle(...end, 8, PART);
  pen.line([
    [end[0] + 8, end[1]],
    [290, end[1]],
  ]);
  pen.material(290, end[1] - 18, 48, 36, 7);
  pen.turnArrow(...centre, 112, 4, 56, BLUE);
  pen.turnArrow(...centre, 100, 56, 4, BLUE);
  pen.turnArrow(...centre, 112, -38, -66, BLUE);
  const names = [component.axis, component.reference].filter(Boolean).join(' ');
  pen.text(280, AXIS_Y + 50, names, { ink: 'blue' });
  pen.text(314, end[1] + 36, component.turret ?? '', { anchor: 'middle' });
};

/** A list of what is looked at, item by item. */
export const checklist: Scene = (pen, _spec, component) => {
  pen.box(86, 22, 188, 186, PART);
  const { spindle, axis, turret, tailstock, guideBush: bush, toolChanger, rotary } = component;
  pen.text(106, 50, [spindle, axis, turret, tailstock, bush, toolChanger, rotary].filter(Boolean).join(' '));
  [66, 100, 134, 168].forEach((y, index) => {
    pen.box(106, y, 18, 18);
    pen.line([
      [138, y + 9],
      [252 - (index % 2) * 24, y + 9],
    ]);
    if (index < 3)
      pen.line(
        [
          [109, y + 9],
          [114, y + 14],
          [126, y - 3],
        ],
        { stroke: 'blue', widthPx: 2.5 },
      );
  });
};
