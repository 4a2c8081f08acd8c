import type { TestDefinition } from '../types';
import { angularDeviations } from './angular-deviations';
import { axialSlipOf, faceRunOutOf } from './spindle-faces';
import { spindleCoaxiality, toolHole } from './spindle-relations';
import { boreRunOutAt300Of, boreRunOutAtNoseOf, noseRunOutOf } from './spindle-run-outs';
import { xSquare, ySquare, ySquareToAxis } from './square-motions';
import { xStraightness, yStraightness, zStraightness } from './straightness';
import { zStraightnessBySteps, zStraightnessTurnedOver } from './straightness-otherwise';
import { subSpindleParallelYz, subSpindleParallelZx } from './sub-spindle-motion';
import { pivotCentre, swivelAtNinety, swivelAtZero, swivelInZx } from './swivel-axis';
import { lineOfCentres, quillTaperAxis } from './tailstock-centres';
import { quillMotion, tailstockMotion } from './tailstock-motion';
import { toolAxes } from './tool-spindle-axes';
import { drivenTool, toolSpindle, toolSpindleEndFace, toolSpindleRunOut } from './tool-spindle-run-outs';
import { toolHoleParallel, turretFaceToX } from './turret-faces-and-holes';
import { turretIndexAccuracy, turretIndexRepeatability } from './turret-indexing';
import { zParallelYz, zParallelZx } from './z-parallel-to-spindle';

/** Geometric tests, in working order. */
export const definitions: TestDefinition[] = [
  noseRunOutOf({ spindle: 'main', id: 'SP-1a' }),
  axialSlipOf({ spindle: 'main', id: 'SP-1b' }),
  faceRunOutOf({ spindle: 'main', id: 'SP-1c' }),
  boreRunOutAtNoseOf({ spindle: 'main', id: 'SP-2a' }),
  boreRunOutAt300Of({ spindle: 'main', id: 'SP-2b' }),
  zStraightness,
  xStraightness,
  yStraightness,
  zStraightnessBySteps,
  zStraightnessTurnedOver,
  ...angularDeviations,
  zParallelZx,
  zParallelYz,
  xSquare,
  ySquareToAxis,
  ySquare,
  tailstockMotion('ZX'),
  tailstockMotion('YZ'),
  quillMotion('ZX'),
  quillMotion('YZ'),
  quillTaperAxis('ZX'),
  quillTaperAxis('YZ'),
  lineOfCentres('ZX'),
  lineOfCentres('YZ'),
  turretFaceToX,
  toolHoleParallel('ZX'),
  toolHoleParallel('YZ'),
  toolHole,
  turretIndexRepeatability,
  turretIndexAccuracy,
  toolSpindleRunOut(toolSpindle, 'nose', 'TU-6a'),
  toolSpindleRunOut(toolSpindle, '100 mm', 'TU-6b'),
  toolSpindleRunOut(drivenTool, 'nose', 'TU-6c'),
  toolSpindleRunOut(drivenTool, '100 mm', 'TU-6d'),
  ...toolAxes,
  toolSpindleEndFace(toolSpindle, 'slip', 'TU-9a'),
  toolSpindleEndFace(toolSpindle, 'face', 'TU-9b'),
  toolSpindleEndFace(drivenTool, 'slip', 'TU-9c'),
  toolSpindleEndFace(drivenTool, 'face', 'TU-9d'),
  swivelInZx,
  pivotCentre,
  swivelAtZero,
  swivelAtNinety,
  noseRunOutOf({ spindle: 'sub', id: 'SS-3a' }),
  boreRunOutAtNoseOf({ spindle: 'sub', id: 'SS-3b' }),
  boreRunOutAt300Of({ spindle: 'sub', id: 'SS-3c' }),
  axialSlipOf({ spindle: 'sub', id: 'SS-3d' }),
  faceRunOutOf({ spindle: 'sub', id: 'SS-3e' }),
  subSpindleParallelZx,
  subSpindleParallelYz,
  spindleCoaxiality,
];
