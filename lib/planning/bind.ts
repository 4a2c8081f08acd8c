import type { MakeUp } from '@/lib/schemas/make-up';
import type { AppliesTo, BoundComponent } from '@/standards/types';
import { isLongitudinal } from './axes';
import { axesAndSpindles, axisPairs, inPlanes, linearAxes, turningPairs, yAndX } from './bind-axes';
import * as single from './bind-single-parts';
import { mainAndSub, spindles, subSpindlesWithAxis, toolSpindles, toolSpindlesAtWork } from './bind-spindles';
import {
  alone,
  atEachSpindle,
  stationsAtEachSpindle,
  turretsOf,
  withAxisAndSpindle,
  withDrivenTools,
  withOwnAxis,
} from './bind-turrets';

/** Every component of a machine that a definition fits, in the order of the make-up. */
export function bind(appliesTo: AppliesTo, makeUp: MakeUp): BoundComponent[] {
  switch (appliesTo.kind) {
    case 'machine':
      return [{}];
    case 'channel':
      return makeUp.channels.map((channel) => ({ channel }));
    case 'spindle':
      return spindles(appliesTo.types, makeUp);
    case 'main-and-sub-spindle':
      return mainAndSub(makeUp);
    case 'sub-spindle-and-its-axis':
      return subSpindlesWithAxis(appliesTo.plane, makeUp);
    case 'tool-spindle':
      return toolSpindles(makeUp);
    case 'tool-spindle-and-spindle':
      return toolSpindlesAtWork(makeUp);
    case 'longitudinal-axis-and-spindle':
      return axesAndSpindles('longitudinal', appliesTo.plane, 'main', makeUp);
    case 'cross-axis-and-spindle':
      return axesAndSpindles('cross', 'ZX', 'any', makeUp);
    case 'vertical-axis-and-spindle':
      return axesAndSpindles('vertical', 'YZ', 'any', makeUp);
    case 'y-and-x':
      return yAndX(makeUp);
    case 'axis-pair':
      return axisPairs(appliesTo.plane, makeUp);
    case 'longitudinal-axis':
      return inPlanes(makeUp.linearAxes.filter(isLongitudinal), appliesTo.planes);
    case 'linear-axis':
      return linearAxes(appliesTo.letters, makeUp).map(({ id, channel }) => ({ axis: id, channel }));
    case 'linear-axis-in-planes':
      return inPlanes(linearAxes(appliesTo.letters, makeUp), appliesTo.planes);
    case 'turning-turret-and-spindle':
      return turningPairs(makeUp);
    case 'turret':
      return alone(turretsOf(appliesTo.types, makeUp));
    case 'turret-and-spindle':
      return atEachSpindle(makeUp.turrets);
    case 'turret-and-axis':
      return withOwnAxis(turretsOf(appliesTo.types, makeUp), appliesTo.role, appliesTo.plane, makeUp);
    case 'turret-axis-and-spindle':
      return withAxisAndSpindle(makeUp.turrets, appliesTo.role, makeUp);
    case 'station-and-spindle':
      return stationsAtEachSpindle(turretsOf(appliesTo.types, makeUp));
    case 'driven-tools':
      return alone(withDrivenTools(makeUp, appliesTo.points));
    case 'driven-tools-and-spindle':
      return atEachSpindle(withDrivenTools(makeUp));
    case 'rotary-axis':
      return single.rotaryAxes(appliesTo.letters, makeUp);
    case 'tailstock':
      return single.tailstock(makeUp);
    case 'tailstock-and-axis':
      return single.tailstockAndAxis(appliesTo.plane, makeUp);
    case 'tailstock-and-spindle':
      return single.tailstockAndSpindle(appliesTo.plane, makeUp);
    case 'guide-bush':
      return single.guideBush(makeUp);
    case 'guide-bush-and-spindle':
      return single.guideBushAndSpindle(makeUp);
    case 'guide-bush-and-axis':
      return single.guideBushAndAxis(appliesTo.plane, makeUp);
    case 'tool-changer':
      return single.toolChanger(makeUp);
  }
}
