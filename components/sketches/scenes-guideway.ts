import type { Scene } from '@/components/sketches/scene';
import { holder, indicator, motion } from '@/components/sketches/sketch-parts';
import { SKETCH_WORDS } from '@/lib/reporting/words';

/** Two motions against a square: the reference arm lies along one axis, the measured arm along the other. */
export const squareTwoMotions: Scene = (pen, _spec, component) => {
  pen.material(86, 40, 24, 116);
  pen.material(86, 156, 174, 22);
  indicator(pen, [110, 84], [-1, 0], [160, 89]);
  indicator(pen, [210, 156], [0, 1], [230, 131]);
  motion(pen, [56, 160], [56, 64], component.axis ?? '', [56, 54]);
  motion(pen, [130, 198], [236, 198], component.reference ?? '', [248, 203], 'start');
  pen.turnArrow(150, 32, 11, 40, 330, { stroke: 'blue' });
  pen.text(170, 37, SKETCH_WORDS.squareTurned, { ink: 'blue', sizePx: 13 });
};

/** Straightness: the indicator is moved along a straightedge. */
export const straightedgeAlongMotion: Scene = (pen, _spec, component) => {
  pen.material(44, 118, 270, 22);
  for (const x of [86, 254]) pen.box(x, 140, 18, 14);
  pen.line([
    [20, 154],
    [340, 154],
  ]);
  const dial = indicator(pen, [164, 118], [0, 1], [184, 93]);
  holder(pen, dial, 270);
  motion(pen, [116, 178], [240, 178], component.axis ?? '', [178, 198]);
};

/** Lost motion: the slide comes to the same target from both sides, the indicator stands still. */
export const slideApproach: Scene = (pen, _spec, component) => {
  pen.material(20, 160, 320, 18);
  pen.box(130, 110, 120, 50, { fill: 'leaf' });
  const axis = component.axis ?? '';
  pen.text(190, 140, axis, { anchor: 'middle' });
  const dial = indicator(pen, [130, 132], [1, 0], [100, 110], 'middle');
  pen.line([
    [dial[0] - 14, dial[1]],
    [56, dial[1]],
    [56, 160],
  ]);
  motion(pen, [130, 56], [226, 56], `${axis} +`, [240, 61], 'start');
  motion(pen, [226, 84], [130, 84], `${axis} −`, [240, 89], 'start');
  pen.text(180, 200, SKETCH_WORDS.sameTarget, { anchor: 'middle', mono: false });
};
