import type { Point } from '@/components/plots/drawing-parts';
import type { SketchPen } from '@/components/sketches/sketch-pen';
import { angleWords } from '@/lib/reporting/drawing-text';
import { SKETCH_WORDS } from '@/lib/reporting/words';
import type { Plane } from '@/standards/types';

const BLUE = { stroke: 'blue' as const };
const PART = { fill: 'leaf' as const };

/** Height of the spindle axis in scenes that have one. */
export const AXIS_Y = 118;

/** Headstock with its nose to the right of `x`; `id` stands below the housing. Returns x of the nose's face. */
export function headstock(pen: SketchPen, id: string, x = 14): number {
  pen.material(x, AXIS_Y - 50, 66, 100);
  pen.box(x + 66, AXIS_Y - 27, 22, 54, PART);
  pen.box(x + 88, AXIS_Y - 17, 14, 34, PART);
  pen.text(x + 33, AXIS_Y + 68, id, { anchor: 'middle' });
  return x + 102;
}

/** Sub-spindle at the right, its nose to the left. Returns x of its face. */
export function subHeadstock(pen: SketchPen, id: string): number {
  pen.material(290, AXIS_Y - 44, 56, 88);
  pen.box(270, AXIS_Y - 25, 20, 50, PART);
  pen.text(318, AXIS_Y + 62, id, { anchor: 'middle' });
  return 270;
}

/** Turret in section at the right, with a tool hole on the spindle axis. Returns x of its face. */
export function turretWithHole(pen: SketchPen, id: string): number {
  pen.material(272, AXIS_Y - 56, 60, 112);
  pen.box(272, AXIS_Y - 10, 42, 20, PART);
  pen.text(302, AXIS_Y + 74, id, { anchor: 'middle' });
  return 272;
}

/** Test mandrel, pin or piece on the axis. */
export function mandrel(pen: SketchPen, fromX: number, toX: number, half = 10): void {
  pen.box(fromX, AXIS_Y - half, toX - fromX, 2 * half, PART);
}

/**
 * Indicator: plunger, dial and hand. `toward` points from the dial to the touched point. The words say that pushing the plunger in
 * counts positive. Returns the dial's centre.
 */
export function indicator(
  pen: SketchPen,
  tip: Point,
  toward: Point,
  words: Point,
  anchor: 'start' | 'middle' | 'end' = 'start',
): Point {
  const centre: Point = [tip[0] - toward[0] * 30, tip[1] - toward[1] * 30];
  pen.line([[centre[0] + toward[0] * 14, centre[1] + toward[1] * 14], tip], { widthPx: 2.5 });
  pen.circle(centre[0], centre[1], 14, PART);
  pen.line([centre, [centre[0] + 7, centre[1] - 8]]);
  pen.text(words[0], words[1], SKETCH_WORDS.plungerIn, { anchor });
  return centre;
}

/** Holder from a dial that touches from above to a block that carries it: a tool post, a fixed stand. */
export function holder(pen: SketchPen, dial: Point, blockX: number, id?: string): void {
  const y = 52;
  pen.line([
    [dial[0] + 10, dial[1] - 10],
    [dial[0] + 22, y],
    [blockX, y],
  ]);
  pen.material(blockX, y - 12, 40, 24, 7);
  if (id) pen.text(blockX + 20, y - 18, id, { anchor: 'middle' });
}

/** A stand at the right of a dial that looks to the left along the axis. */
export function stand(pen: SketchPen, dial: Point, blockX: number): void {
  pen.line([
    [dial[0] + 14, dial[1]],
    [blockX, dial[1]],
  ]);
  pen.material(blockX, dial[1] - 14, 40, 28, 7);
}

/** Indicator on a bracket of the spindle, swept round something on the axis. */
export function sweptIndicator(
  pen: SketchPen,
  face: number,
  tipX: number,
  words: Point = [tipX + 20, AXIS_Y - 35],
  anchor: 'start' | 'middle' = 'start',
): void {
  const dial = indicator(pen, [tipX, AXIS_Y - 10], [0, 1], words, anchor);
  pen.line([
    [face, AXIS_Y - 12],
    [face + 22, AXIS_Y - 12],
    [face + 22, dial[1]],
    [dial[0] - 14, dial[1]],
  ]);
}

/** Guideway or bed over the whole width; `y` is its upper face. */
export function bedway(pen: SketchPen, y: number): void {
  pen.material(20, y, 320, 18);
}

/** A level: its body with the vial and the bubble in it. */
export function level(pen: SketchPen, x: number, y: number, width: number): void {
  pen.box(x, y, width, 18, PART);
  const middle = x + width / 2;
  pen.box(middle - 18, y + 4, 36, 10);
  pen.circle(middle, y + 9, 3.5);
}

/** Arrow of a motion with the axis's name at `at`. */
export function motion(
  pen: SketchPen,
  from: Point,
  to: Point,
  name: string,
  at: Point,
  anchor: 'start' | 'middle' = 'middle',
): void {
  pen.arrow(from, to, BLUE);
  pen.text(at[0], at[1], name, { ink: 'blue', anchor });
}

/** The spindle is turned by hand to the angles of the readings. */
export function spindleAngles(pen: SketchPen, anglesDeg: readonly string[] | undefined): void {
  pen.turnArrow(30, 30, 14, 40, 330, BLUE);
  pen.text(54, 35, angleWords(anglesDeg), { ink: 'blue' });
}

const PLANE_AXES: Record<Plane, [across: string, up: string]> = { ZX: ['Z', 'X'], YZ: ['Z', 'Y'], XY: ['X', 'Y'] };

/** Two small arrows in the lower left corner: the plane in which the sketch is seen. */
export function planeSign(pen: SketchPen, plane: Plane | undefined): void {
  if (!plane) return;
  const [x, y] = [24, 222];
  const [across, up] = PLANE_AXES[plane];
  pen.arrow([x, y], [x + 24, y], { widthPx: 1 }, 5);
  pen.arrow([x, y], [x, y - 24], { widthPx: 1 }, 5);
  pen.text(x + 29, y + 5, across);
  pen.text(x - 5, y - 14, up, { anchor: 'end' });
}
