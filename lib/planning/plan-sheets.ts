import type { MakeUp } from '@/lib/schemas/make-up';
import { defaultSetUp } from '@/lib/sheet/default-set-up';
import type { BoundComponent, PlannedSheet, TestDefinition } from '@/standards/types';
import { workingSteps } from '@/standards/working-order';
import { axisRank } from './axes';
import { bind } from './bind';
import { boundTitle } from './component-words';
import { resolveDependsOn } from './depends-on';
import { findTolerance } from './find-tolerance';

/**
 * The plan of a machine: every definition bound to every component that it fits, with its tolerance, in mechanical working order.
 * A plan is a proposal: a job takes a selection of it (see choose.ts). Pure; the same make-up and definitions give the same plan.
 */
export function planSheets(makeUp: MakeUp, definitions: readonly TestDefinition[]): PlannedSheet[] {
  return definitions
    .flatMap((definition, index) =>
      bind(definition.appliesTo, makeUp).map((component) => ({ definition, index, component })),
    )
    .map((entry) => ({ entry, rank: rank(entry, makeUp) }))
    .sort((a, b) => compare(a.rank, b.rank))
    .map(({ entry: { definition, component } }) => planSheet(definition, component, makeUp));
}

function planSheet(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): PlannedSheet {
  const { id, code, edition, version } = definition;
  return {
    key: sheetKey(definition, component),
    definition: { id, code, edition, version },
    title: boundTitle(definition, component, makeUp),
    component,
    dependsOn: resolveDependsOn(definition, component, makeUp),
    tolerance: findTolerance(definition.tolerance, component, makeUp),
    direction: definition.direction,
    setUp: defaultSetUp(definition, component, makeUp),
    workingStep: plannedStep(definition, component, makeUp),
  };
}

/**
 * Stable within a job: definition id, then turret, axis, spindle, reference as far as the component has them, then the plane where a
 * definition is measured in more than one: `AX-1a:Z1:S1`, `AX-4:Y1:X1`, `TU-3:T2:S1`, `SS-1:S2:S1`, `AX-5:Z1:ZX`.
 */
export function sheetKey(definition: TestDefinition, component: BoundComponent): string {
  const { turret, axis, spindle, reference, tailstock, plane } = component;
  const several = 'planes' in definition.appliesTo && definition.appliesTo.planes.length > 1;
  const parts = [turret, axis, spindle, reference, tailstock, several ? plane : undefined];
  return [definition.id, ...parts.filter((part) => part !== undefined)].join(':');
}

/** Whatever is measured against a sub-spindle waits until the sub-spindle itself is right. */
function plannedStep(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): number {
  const against = makeUp.spindles.find(({ id }) => id === component.spindle);
  const relation = component.axis !== undefined || component.turret !== undefined;
  const later = workingSteps['axes-to-sub-spindle'];
  return relation && against?.type === 'sub' ? Math.max(definition.workingStep, later) : definition.workingStep;
}

function rank(
  entry: { definition: TestDefinition; index: number; component: BoundComponent },
  makeUp: MakeUp,
): number[] {
  const { definition, index, component } = entry;
  return [
    plannedStep(definition, component, makeUp),
    definition.workingStep,
    component.channel ?? 0,
    component.axis && !component.turret ? axisRank(component.axis, makeUp) : 0,
    makeUp.turrets.findIndex(({ id }) => id === component.turret),
    makeUp.spindles.findIndex(({ id }) => id === component.spindle),
    index,
  ];
}

function compare(a: number[], b: number[]): number {
  for (const [k, left] of a.entries()) {
    const difference = left - (b[k] ?? 0);
    if (difference !== 0) return difference;
  }
  return 0;
}
