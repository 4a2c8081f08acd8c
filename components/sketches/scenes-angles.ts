import type { Scene } from '@/components/sketches/scene';
import { bedway, level, motion } from '@/components/sketches/sketch-parts';
import { SKETCH_WORDS } from '@/lib/reporting/words';

const PART = { fill: 'leaf' as const };
const BLUE = { stroke: 'blue' as const };

/** A level rides on the carriage over its travel. */
export const levelOnCarriage: Scene = (pen, _spec, component) => {
  bedway(pen, 152);
  pen.box(106, 116, 148, 36, PART);
  pen.text(180, 140, component.axis ?? '', { anchor: 'middle' });
  level(pen, 130, 98, 100);
  pen.turnArrow(180, 112, 58, 235, 305, BLUE);
  motion(pen, [120, 192], [240, 192], component.axis ?? '', [250, 197], 'start');
};

/** A level on two feet, set along the guideway so that the rear foot stands where the front one stood. */
export const levelSteps: Scene = (pen, _spec, component) => {
  bedway(pen, 146);
  const next = { dash: [5, 3] };
  pen.box(172, 104, 62, 18, next);
  pen.box(222, 122, 12, 24, next);
  level(pen, 98, 104, 74);
  for (const x of [98, 160]) pen.box(x, 122, 12, 24, PART);
  pen.dimension(104, 166, 88, SKETCH_WORDS.oneStep);
  motion(pen, [150, 192], [250, 192], component.axis ?? component.reference ?? '', [260, 197], 'start');
};

/** A mirror on the slide, seen by an instrument that stands still and measures its angle. */
export const angleInstrument: Scene = (pen, _spec, component) => {
  bedway(pen, 160);
  pen.box(216, 118, 100, 42, PART);
  pen.text(266, 145, component.axis ?? '', { anchor: 'middle' });
  pen.material(240, 82, 9, 36, 6);
  pen.text(260, 104, SKETCH_WORDS.mirror, { mono: false });
  pen.box(26, 80, 72, 36, PART);
  pen.line([
    [78, 80],
    [78, 116],
  ]);
  pen.box(46, 116, 32, 44, PART);
  pen.line(
    [
      [98, 98],
      [240, 98],
    ],
    { dash: [6, 4] },
  );
  pen.turnArrow(244, 100, 48, 235, 300, BLUE);
  motion(pen, [190, 198], [310, 198], component.axis ?? '', [320, 203], 'start');
};

/** Positioning: a reflector on the slide, an interferometer that stands still, targets approached from both sides. */
export const laserAlongMotion: Scene = (pen, _spec, component) => {
  bedway(pen, 168);
  pen.box(220, 130, 96, 38, PART);
  pen.text(268, 155, component.axis ?? '', { anchor: 'middle' });
  pen.shape(
    [
      [238, 96],
      [258, 113],
      [238, 130],
    ],
    PART,
  );
  pen.box(20, 94, 66, 38, PART);
  pen.box(38, 132, 30, 36, PART);
  pen.box(118, 96, 32, 34, PART);
  pen.line([
    [118, 130],
    [150, 96],
  ]);
  pen.line([
    [134, 130],
    [134, 168],
  ]);
  for (const y of [104, 122]) {
    const end = y === 104 ? 247 : 247;
    pen.line(
      [
        [86, y],
        [118, y],
      ],
      { dash: [6, 4] },
    );
    pen.line(
      [
        [150, y],
        [end, y],
      ],
      { dash: [6, 4] },
    );
  }
  pen.line([
    [150, 58],
    [310, 58],
  ]);
  for (const x of [150, 190, 230, 270, 310])
    pen.line([
      [x, 52],
      [x, 64],
    ]);
  pen.arrow([160, 40], [300, 40], BLUE);
  pen.arrow([300, 78], [160, 78], BLUE);
  pen.text(318, 45, component.axis ?? '', { ink: 'blue' });
  pen.text(142, 63, SKETCH_WORDS.targets, { anchor: 'end', mono: false });
};

/** The same edge of a straightedge, or its other side, read twice: the edge turned over between the runs. */
export const straightedgeTurnedOver: Scene = (pen, _spec, component) => {
  pen.material(52, 108, 280, 24);
  const dial: [number, number] = [130, 78];
  pen.line(
    [
      [130, 92],
      [130, 108],
    ],
    { widthPx: 2.5 },
  );
  pen.circle(...dial, 14, PART);
  pen.line([dial, [137, 70]]);
  pen.text(150, 83, SKETCH_WORDS.plungerIn);
  const second = { dash: [4, 3] };
  pen.line(
    [
      [240, 132],
      [240, 148],
    ],
    second,
  );
  pen.circle(240, 162, 14, second);
  pen.line([
    [116, 78],
    [70, 78],
  ]);
  pen.material(34, 66, 36, 24, 7);
  pen.turnArrow(46, 32, 11, 40, 330, BLUE);
  pen.text(66, 37, SKETCH_WORDS.edgeTurned, { ink: 'blue', sizePx: 13 });
  motion(pen, [120, 198], [240, 198], component.axis ?? '', [250, 203], 'start');
};

/** A target figure, and where the slide was found. */
export const targetAndFound: Scene = (pen, _spec, component) => {
  bedway(pen, 160);
  pen.box(40, 110, 110, 50, PART);
  pen.text(95, 140, component.axis ?? '', { anchor: 'middle' });
  pen.box(150, 110, 100, 50, { dash: [5, 3] });
  for (const [x, dash] of [
    [220, [8, 3, 2, 3]],
    [250, undefined],
  ] as const)
    pen.line(
      [
        [x, 52],
        [x, 160],
      ],
      dash ? { dash: [...dash] } : {},
    );
  pen.text(214, 62, SKETCH_WORDS.target, { anchor: 'end', mono: false });
  pen.text(256, 62, SKETCH_WORDS.found, { mono: false });
  pen.arrow([192, 84], [220, 84], { widthPx: 1 }, 6);
  pen.arrow([278, 84], [250, 84], { widthPx: 1 }, 6);
  motion(pen, [50, 84], [150, 84], component.axis ?? '', [100, 74]);
};
