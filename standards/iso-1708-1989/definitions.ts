import { xSquare } from '../iso-13041-1-2020/square-motions';
import { lineOfCentres, quillTaperAxis } from '../iso-13041-1-2020/tailstock-centres';
import { quillMotion, tailstockMotion } from '../iso-13041-1-2020/tailstock-motion';
import { zParallelYz, zParallelZx } from '../iso-13041-1-2020/z-parallel-to-spindle';
import type { TestDefinition } from '../types';
import { asEngineLathe } from './as-engine-lathe';
import { bedAcross, bedAlong, carriageInZx } from './bed';
import { screwLead, screwSlip } from './leadscrew';
import { spindleTests } from './spindle';
import * as tolerance from './tolerances';

const towardTool = 'The free end may lean toward the tool, not away from it.';
const rising = 'The free end may rise, because tool and weight press it down in work; it may not fall.';

/** Tests of engine lathes, in working order. */
export const definitions: TestDefinition[] = [
  bedAlong,
  bedAcross,
  ...spindleTests,
  carriageInZx,
  asEngineLathe(zParallelZx, { tolerance: tolerance.zParallelInZx, direction: 'toward-tool' }, towardTool),
  asEngineLathe(zParallelYz, { tolerance: tolerance.zParallelInYz, direction: 'rising-to-free-end' }, rising),
  asEngineLathe(xSquare, { tolerance: tolerance.xSquareToSpindle }),
  asEngineLathe(tailstockMotion('ZX'), { tolerance: tolerance.tailstockMotion }),
  asEngineLathe(tailstockMotion('YZ'), { tolerance: tolerance.tailstockMotion }),
  asEngineLathe(quillMotion('ZX'), { tolerance: tolerance.quillMotionZx }),
  asEngineLathe(quillMotion('YZ'), { tolerance: tolerance.quillMotionYz }),
  asEngineLathe(quillTaperAxis('ZX'), { tolerance: tolerance.quillTaper, direction: 'toward-tool' }, towardTool),
  asEngineLathe(quillTaperAxis('YZ'), { tolerance: tolerance.quillTaper, direction: 'rising-to-free-end' }, rising),
  asEngineLathe(lineOfCentres('YZ'), { tolerance: tolerance.centresYz }),
  screwSlip,
  screwLead,
];
