import type { MakeUp } from '@/lib/schemas/make-up';
import type { BoundComponent, DependsOn, TestDefinition } from '@/standards/types';
import { axesCarrying, axesOf, isCross, isLongitudinal } from './axes';

type Rests = TestDefinition['dependsOn'];
type Part = Rests['components'][number] | Rests['moved'][number] | Rests['positioned'][number];

/** What a later correction would have to touch to make the result of a bound definition doubtful. */
export function resolveDependsOn(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): DependsOn {
  const ids = (parts: Part[]) => [...new Set(parts.flatMap((part) => idsOf(part, definition, component, makeUp)))];
  const { components, moved, positioned } = definition.dependsOn;
  return { components: ids(components), moved: ids(moved), positioned: ids(positioned) };
}

const keys = { 'guide-bush': 'guideBush', 'tool-changer': 'toolChanger' } as const;

function idsOf(part: Part, definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): string[] {
  switch (part) {
    case 'bed':
      return ['bed'];
    case 'spindle-axis':
      return axesCarrying(workSpindle(definition, component, makeUp), makeUp).map(({ id }) => id);
    case 'turret-axes':
      return carrierAxes(definition, component, makeUp).map(({ id }) => id);
    case 'turret-cross-axis':
      return carrierAxes(definition, component, makeUp)
        .filter(isCross)
        .map(({ id }) => id);
    case 'guide-bush':
    case 'tool-changer':
      return named(keys[part], definition, component);
    default:
      return named(part, definition, component);
  }
}

/** The axes that place a turret or a tool spindle against the work: its own, and where the work spindle moves across, that one's. */
function carrierAxes(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp) {
  const turret = makeUp.turrets.find(({ id }) => id === component.turret);
  const tool = makeUp.spindles.find(({ id, type }) => id === component.spindle && type === 'tool');
  if (!turret && !tool) named('turret', definition, component);
  const own = turret ? axesOf(turret, makeUp) : [];
  const ofTool = tool
    ? makeUp.linearAxes.filter(({ id, carries }) => id === tool.carriedBy || carries === tool.id)
    : [];
  const work = tool ? component.reference : component.spindle;
  const across = work ? axesCarrying(work, makeUp).filter((axis) => !isLongitudinal(axis)) : [];
  return [...own, ...ofTool, ...across];
}

/** A tool spindle is bound as `spindle`, the work spindle that it is measured against as `reference`. */
function workSpindle(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): string {
  const isWork = (id: string | undefined) => makeUp.spindles.some((one) => one.id === id && one.type !== 'tool');
  const found = [component.spindle, component.reference].find(isWork);
  if (found === undefined)
    throw new Error(`${definition.id} rests on a work spindle, which the component does not have`);
  return found;
}

/** What carries a tool spindle or is turned by a rotary axis differs from machine to machine; every other part must be there. */
const mayLack: TestDefinition['appliesTo']['kind'][] = ['tool-spindle', 'tool-spindle-and-spindle', 'rotary-axis'];

function named(
  part: 'spindle' | 'reference' | 'turret' | 'axis' | 'tailstock' | 'guideBush' | 'toolChanger' | 'rotary',
  definition: TestDefinition,
  component: BoundComponent,
): string[] {
  const id = component[part];
  if (id !== undefined) return [id];
  if (mayLack.includes(definition.appliesTo.kind)) return [];
  throw new Error(`${definition.id} rests on its ${part}, which the component does not have`);
}
