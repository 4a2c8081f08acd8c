import type { Layout } from '@/standards/types';
import { anglesByPosition } from './angles-by-position';
import { approachPairs } from './approach-pairs';
import type { LayoutEngine } from './layout-engine';
import { profile } from './profile';
import { squareReversed } from './square-reversed';
import { sweptSections } from './swept-sections';
import { toolCentre } from './tool-centre';
import { turns } from './turns';
import { twoCollars } from './two-collars';

const engines: { [K in Layout['kind']]: LayoutEngine<Extract<Layout, { kind: K }>> } = {
  turns,
  'angles-by-position': anglesByPosition,
  profile,
  'square-reversed': squareReversed,
  'swept-sections': sweptSections,
  'tool-centre': toolCentre,
  'approach-pairs': approachPairs,
  'two-collars': twoCollars,
};

/** The engine of a layout; the kind that chose it is the kind that it is given. */
export function engineOf<L extends Layout>(layout: L): LayoutEngine<L> {
  return engines[layout.kind] as unknown as LayoutEngine<L>;
}
