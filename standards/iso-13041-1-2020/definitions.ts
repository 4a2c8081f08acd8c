import type { TestDefinition } from '../types';
import { xSquare, ySquare, zParallelYz, zParallelZx, zStraightness } from './slides';
import { spindleCoaxiality, toolHole } from './spindle-relations';
import { boreRunOutAt300Of, boreRunOutAtNoseOf, noseRunOutOf } from './spindle-run-outs';

/** Geometric tests, in working order. */
export const definitions: TestDefinition[] = [
  noseRunOutOf({ spindle: 'main', id: 'SP-1a' }),
  boreRunOutAtNoseOf({ spindle: 'main', id: 'SP-2a' }),
  boreRunOutAt300Of({ spindle: 'main', id: 'SP-2b' }),
  zStraightness,
  zParallelZx,
  zParallelYz,
  xSquare,
  ySquare,
  toolHole,
  noseRunOutOf({ spindle: 'sub', id: 'SS-3a' }),
  boreRunOutAtNoseOf({ spindle: 'sub', id: 'SS-3b' }),
  boreRunOutAt300Of({ spindle: 'sub', id: 'SS-3c' }),
  spindleCoaxiality,
];
