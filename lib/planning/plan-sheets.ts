import type { MakeUp } from '@/lib/schemas/make-up';
import { defaultSetUp } from '@/lib/sheet/default-set-up';
import { isOwnTest } from '@/standards/own-tests';
import type { BoundComponent, PlannedSheet, TestDefinition } from '@/standards/types';
import { workingSteps } from '@/standards/working-order';
import { axisRank } from './axes';
import { bind } from './bind';
import { boundTitle, putIn } from './component-words';
import { resolveDependsOn } from './depends-on';
import { findTolerance } from './find-tolerance';
import { fitsKind } from './fits-kind';
import { keepTogether } from './keep-together';
import type { OrganisationValues } from './organisation-values';

/** Setting up and measuring once, where a definition does not say (our estimate). */
export const USUAL_MINUTES = 15;

/**
 * The plan of a machine: every definition bound to every component that it fits, with its tolerance, in mechanical working order; within
 * a working step, what is set up together stands together. A plan is a proposal: a job takes a selection of it. Pure; the same make-up,
 * definitions and values give the same plan. Definitions must hold one edition of each code.
 */
export function planSheets(
  makeUp: MakeUp,
  definitions: readonly TestDefinition[],
  values?: OrganisationValues,
): PlannedSheet[] {
  const sorted = definitions
    .flatMap((definition, index) =>
      fitsKind(definition, makeUp)
        ? bind(definition.appliesTo, makeUp).map((component) => ({ definition, index, component }))
        : [],
    )
    .map((entry) => ({ entry, rank: rank(entry, makeUp) }))
    .sort((a, b) => compare(a.rank, b.rank))
    .map(({ entry: { definition, component } }) => ({
      sheet: planSheet(definition, component, makeUp, values),
      leads: definition.leads === true,
    }));
  const together = keepTogether(
    sorted,
    ({ sheet }) => sheet.workingStep,
    ({ sheet }) => sheet.setUpTogether,
    ({ leads }) => leads,
  );
  return distinct(together.map(({ sheet }) => sheet));
}

function planSheet(
  definition: TestDefinition,
  component: BoundComponent,
  makeUp: MakeUp,
  values: OrganisationValues | undefined,
): PlannedSheet {
  const { id, code, edition, version, setUpTogether } = definition;
  return {
    key: sheetKey(definition, component),
    definition: { id, code, edition, version },
    ownDefinition: isOwnTest(definition) ? definition : null,
    title: boundTitle(definition, component, makeUp),
    component,
    dependsOn: resolveDependsOn(definition, component, makeUp),
    tolerance: findTolerance(definition, component, makeUp, values),
    direction: definition.direction,
    setUp: defaultSetUp(definition, component, makeUp),
    workingStep: plannedStep(definition, component, makeUp),
    setUpTogether: setUpTogether === undefined ? null : putIn(setUpTogether, definition, component, makeUp),
    minutes: definition.minutes ?? USUAL_MINUTES,
  };
}

/**
 * Stable within a job: definition id, then turret, axis, spindle, reference and the other parts as far as the component has them, the
 * station and the channel where there is a sheet for each, then the plane where a definition is measured in more than one:
 * `AX-1a:Z1:S1`, `AX-4:Y1:X1`, `TU-3:T2:S1`, `SS-1:S2:S1`, `AX-5:Z1:ZX`, `GB-3:T1:S1:st4`, `FC-1:ch2`.
 */
export function sheetKey(definition: TestDefinition, component: BoundComponent): string {
  const { turret, axis, spindle, reference, tailstock, guideBush, toolChanger, rotary, station, plane } = component;
  const { appliesTo } = definition;
  const parts = [
    ...[turret, axis, spindle, reference, tailstock, guideBush, toolChanger, rotary],
    station === undefined ? undefined : `st${station}`,
    appliesTo.kind === 'channel' ? `ch${component.channel}` : undefined,
    'planes' in appliesTo && appliesTo.planes.length > 1 ? plane : undefined,
  ];
  return [definition.id, ...parts.filter((part) => part !== undefined)].join(':');
}

/** Two codes may use one id for different tests: the later of the two carries its code too. */
function distinct(sheets: PlannedSheet[]): PlannedSheet[] {
  const taken = new Map<string, string>();
  return sheets.map((sheet) => {
    const owner = taken.get(sheet.key);
    if (owner === undefined) taken.set(sheet.key, sheet.definition.code);
    return owner === undefined ? sheet : { ...sheet, key: `${sheet.key}:${sheet.definition.code}` };
  });
}

/** What is measured on a sub-spindle alone stands together; whatever is measured against it waits until it is right itself. */
function plannedStep(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): number {
  const isSub = (id: string | undefined) => makeUp.spindles.some((one) => one.id === id && one.type === 'sub');
  const isTool = makeUp.spindles.some(({ id, type }) => id === component.spindle && type === 'tool');
  // The sub-spindle against the axis that carries it belongs to the sub-spindle itself: first its angle, then its offset.
  const own = definition.appliesTo.kind === 'sub-spindle-and-its-axis';
  const relation = !own && (component.axis !== undefined || component.turret !== undefined);
  const against = (relation && isSub(component.spindle)) || (isTool && isSub(component.reference));
  if (against) return Math.max(definition.workingStep, workingSteps['axes-to-sub-spindle']);
  // What is looked at on the sub-spindle alone, its mandrel too, waits until somebody works there.
  const alone = !relation && isSub(component.spindle) && definition.workingStep === workingSteps['spindle-run-out'];
  return alone ? workingSteps['sub-spindle-run-out'] : definition.workingStep;
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
    component.station ?? 0,
  ];
}

function compare(a: number[], b: number[]): number {
  for (const [k, left] of a.entries()) {
    const difference = left - (b[k] ?? 0);
    if (difference !== 0) return difference;
  }
  return 0;
}
