import type { Layout, ShownIn, TestDefinition } from '@/standards/types';
import { defaultLayouts, type MethodLayout } from './default-layouts';
import type { MethodGuide } from './method-guide';

/** How a method is laid out; null: helpers and corrections, which have a list of fields instead. */
export const layoutOfMethod = ({ method }: MethodGuide): MethodLayout | null =>
  method in defaultLayouts ? defaultLayouts[method as keyof typeof defaultLayouts] : null;

/** A test of no code, by which a sheet's own engine reads, evaluates and draws the fields of the calculator. */
export function methodDefinition(
  guide: MethodGuide,
  { signs, shownIn }: MethodLayout,
  layout: Layout,
  judge: string | undefined,
): TestDefinition {
  return {
    ...{ id: guide.slug, code: 'calculator', edition: '', version: 1, title: guide.title, boundTitle: guide.title },
    ...{ procedure: [], appliesTo: { kind: 'machine' }, method: guide.method, layout, tolerance: null },
    ...(judge === undefined ? {} : { judge }),
    direction: 'either',
    ...unitOf(layout, shownIn),
    resolution: { valueUm: '0.1', rule: 'half-even' },
    ...{ instruments: [], cautions: [], sketch: { scene: 'checklist' } },
    dependsOn: { components: [], moved: [], positioned: [] },
    workingStep: 0,
    judgedFigure: guide.title,
    ...(signs && judge !== 'range' ? { positiveMeans: signs[0], negativeMeans: signs[1] } : {}),
    source: guide.source,
  };
}

/** Rotary axes are shown in seconds of arc, tilts of an axis in mm/m, as on sheets. */
function unitOf(layout: Layout, shownIn: ShownIn | undefined): { shownIn?: ShownIn } {
  if (layout.kind === 'target-cycles' && layout.quantity === 'rotary') return { shownIn: '″' };
  if (layout.kind === 'rotation-turns' && layout.direction === 'tilt') return { shownIn: 'mm/m' };
  return shownIn ? { shownIn } : {};
}
