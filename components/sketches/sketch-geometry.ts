import type { Drawing } from '@/components/plots/drawing';
import { wordWidth } from '@/components/plots/drawing-parts';
import type { Scene } from '@/components/sketches/scene';
import {
  angleInstrument,
  laserAlongMotion,
  levelOnCarriage,
  levelSteps,
  straightedgeTurnedOver,
  targetAndFound,
} from '@/components/sketches/scenes-angles';
import { slideApproach, squareTwoMotions, straightedgeAlongMotion } from '@/components/sketches/scenes-guideway';
import {
  axialSlip,
  driftAtTool,
  faceRunOut,
  mandrelHalfTurn,
  spindleSensors,
  toolSpindleMandrel,
} from '@/components/sketches/scenes-nose';
import {
  discAcrossMotion,
  mandrelAlongMotion,
  spindleBoreMandrel,
  spindleNose,
} from '@/components/sketches/scenes-spindle';
import {
  betweenCentres,
  checklist,
  circularGauge,
  guideBush,
  rotaryAxis,
  swivelAxis,
  tailstockQuill,
} from '@/components/sketches/scenes-supports';
import {
  gangStations,
  mandrelInTurret,
  testPieceCylinder,
  testPieceFace,
  testPiecePattern,
  transferPiece,
  turretFace,
  turretIndex,
} from '@/components/sketches/scenes-turret';
import { toolHoleHeights, toolHoleSweep, twoCollarPiece, twoSpindlesSweep } from '@/components/sketches/scenes-work';
import { planeSign } from '@/components/sketches/sketch-parts';
import { SCENE_BOX, SketchPen } from '@/components/sketches/sketch-pen';
import { signWords, sketchWords } from '@/lib/reporting/drawing-text';
import type { BoundComponent, SketchSpec } from '@/standards/types';

const SCENES: Record<SketchSpec['scene'], Scene> = {
  'spindle-nose': spindleNose,
  'spindle-bore-mandrel': spindleBoreMandrel,
  'mandrel-along-motion': mandrelAlongMotion,
  'disc-across-motion': discAcrossMotion,
  'square-two-motions': squareTwoMotions,
  'straightedge-along-motion': straightedgeAlongMotion,
  'two-spindles-sweep': twoSpindlesSweep,
  'tool-hole-sweep': toolHoleSweep,
  'tool-hole-heights': toolHoleHeights,
  'slide-approach': slideApproach,
  'two-collar-piece': twoCollarPiece,
  'face-run-out': faceRunOut,
  'axial-slip': axialSlip,
  'level-on-carriage': levelOnCarriage,
  'level-steps': levelSteps,
  'angle-instrument': angleInstrument,
  'straightedge-turned-over': straightedgeTurnedOver,
  'laser-along-motion': laserAlongMotion,
  'circular-gauge': circularGauge,
  'spindle-sensors': spindleSensors,
  'turret-index': turretIndex,
  'turret-face': turretFace,
  'mandrel-in-turret': mandrelInTurret,
  'tool-spindle-mandrel': toolSpindleMandrel,
  'tailstock-quill': tailstockQuill,
  'between-centres': betweenCentres,
  'guide-bush': guideBush,
  'rotary-axis': rotaryAxis,
  'swivel-axis': swivelAxis,
  'test-piece-cylinder': testPieceCylinder,
  'test-piece-face': testPieceFace,
  'test-piece-pattern': testPiecePattern,
  'transfer-piece': transferPiece,
  'drift-at-tool': driftAtTool,
  'target-and-found': targetAndFound,
  'mandrel-half-turn': mandrelHalfTurn,
  'gang-stations': gangStations,
  checklist,
};

const SIGN_PX = 13;

/**
 * The set-up of a test, drawn from its data: spindle, mandrel, indicator with the sense in which it counts, direction of motion with
 * the axis's name, angles, plane. Keeps its proportions in the place that it gets. The meaning of the sign stands below where it fits.
 */
export function setUpSketch(
  spec: SketchSpec,
  component: BoundComponent,
  place: { widthPx: number; heightPx: number },
): Drawing {
  const scale = Math.min(place.widthPx / SCENE_BOX.width, place.heightPx / SCENE_BOX.height);
  const offset = [
    (place.widthPx - SCENE_BOX.width * scale) / 2,
    (place.heightPx - SCENE_BOX.height * scale) / 2,
  ] as const;
  const pen = new SketchPen(scale, offset);
  SCENES[spec.scene](pen, spec, component);
  planeSign(pen, spec.plane ?? component.plane);
  const words = spec.positiveMeans ? signWords(spec.positiveMeans) : '';
  if (words && wordWidth(words, SIGN_PX) < SCENE_BOX.width - 80) {
    pen.text(SCENE_BOX.width - 4, SCENE_BOX.height - 6, words, { anchor: 'end', mono: false, sizePx: SIGN_PX });
  }
  return { ...place, description: sketchWords(spec, component), items: pen.items };
}
