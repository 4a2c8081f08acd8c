import type { TestDefinition } from '../types';
import { axialSlipOf, faceRunOutOf } from './spindle-faces';
import { spindleCoaxiality, toolHole } from './spindle-relations';
import { boreRunOutAt300Of, boreRunOutAtNoseOf, noseRunOutOf } from './spindle-run-outs';
import { xSquare, ySquare, ySquareToAxis } from './square-motions';
import { zStraightness } from './straightness';
import { zParallelYz, zParallelZx } from './z-parallel-to-spindle';

/** Geometric tests, in working order. */
export const definitions: TestDefinition[] = [
  noseRunOutOf({ spindle: 'main', id: 'SP-1a' }),
  axialSlipOf({ spindle: 'main', id: 'SP-1b' }),
  faceRunOutOf({ spindle: 'main', id: 'SP-1c' }),
  boreRunOutAtNoseOf({ spindle: 'main', id: 'SP-2a' }),
  boreRunOutAt300Of({ spindle: 'main', id: 'SP-2b' }),
  zStraightness,
  zParallelZx,
  zParallelYz,
  xSquare,
  ySquareToAxis,
  ySquare,
  toolHole,
  noseRunOutOf({ spindle: 'sub', id: 'SS-3a' }),
  boreRunOutAtNoseOf({ spindle: 'sub', id: 'SS-3b' }),
  boreRunOutAt300Of({ spindle: 'sub', id: 'SS-3c' }),
  axialSlipOf({ spindle: 'sub', id: 'SS-3d' }),
  faceRunOutOf({ spindle: 'sub', id: 'SS-3e' }),
  spindleCoaxiality,
];
