import type { Layout } from '@/standards/types';
import { angleSteps } from './angle-steps';
import { anglesByPosition } from './angles-by-position';
import { angularRuns } from './angular-runs';
import { approachPairs } from './approach-pairs';
import { checkList } from './check-list';
import { circleTrace } from './circle-trace';
import { circles } from './circles';
import { diameters } from './diameters';
import { grid } from './grid';
import type { LayoutEngine } from './layout-engine';
import { profile } from './profile';
import { rotationTurns } from './rotation-turns';
import { roundTrace } from './round-trace';
import { squareReversed } from './square-reversed';
import { stations } from './stations';
import { sweptSections } from './swept-sections';
import { targetAndFound } from './target-and-found';
import { targetCycles } from './target-cycles';
import { timeSeries } from './time-series';
import { toolCentre } from './tool-centre';
import { turns } from './turns';
import { twoCollars } from './two-collars';
import { twoRuns } from './two-runs';

const engines: { [K in Layout['kind']]: LayoutEngine<Extract<Layout, { kind: K }>> } = {
  turns,
  'angles-by-position': anglesByPosition,
  profile,
  'square-reversed': squareReversed,
  'swept-sections': sweptSections,
  'tool-centre': toolCentre,
  'approach-pairs': approachPairs,
  'two-collars': twoCollars,
  'angle-steps': angleSteps,
  'two-runs': twoRuns,
  grid,
  'angular-runs': angularRuns,
  'target-cycles': targetCycles,
  'circle-trace': circleTrace,
  'rotation-turns': rotationTurns,
  stations,
  circles,
  diameters,
  'round-trace': roundTrace,
  'time-series': timeSeries,
  'target-and-found': targetAndFound,
  'check-list': checkList,
};

/** The engine of a layout; the kind that chose it is the kind that it is given. */
export function engineOf<L extends Layout>(layout: L): LayoutEngine<L> {
  return engines[layout.kind] as unknown as LayoutEngine<L>;
}
