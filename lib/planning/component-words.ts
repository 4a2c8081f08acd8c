import type { MakeUp } from '@/lib/schemas/make-up';
import type { BoundComponent, TestDefinition } from '@/standards/types';

const turretWords = { turret: 'turret', 'tool-post': 'tool post', 'gang-slide': 'gang slide' } as const;
const spindleWords = { main: 'main spindle', sub: 'sub-spindle', tool: 'tool spindle' } as const;

/** `main spindle S1`, `tool post T2`, `X1`: a component of the make-up in plain words. */
export function componentName(id: string, makeUp: MakeUp): string {
  const spindle = makeUp.spindles.find((candidate) => candidate.id === id);
  if (spindle) return `${spindleWords[spindle.type]} ${id}`;
  const turret = makeUp.turrets.find((candidate) => candidate.id === id);
  if (turret) return `${turretWords[turret.type]} ${id}`;
  if (makeUp.tailstock?.id === id) return `tailstock ${id}`;
  if (makeUp.guideBush?.id === id) return `guide bush ${id}`;
  return id;
}

/** What a sheet is bound to: `main spindle S1, axis Z1, plane ZX`. */
export function componentWords(component: BoundComponent, makeUp: MakeUp): string {
  const isAxis = (id: string) => makeUp.linearAxes.some((axis) => axis.id === id);
  const named = (id: string) => (isAxis(id) ? `axis ${id}` : componentName(id, makeUp));
  const parts = [component.turret, component.spindle, component.axis, component.reference, component.tailstock];
  const words = parts.filter((id) => id !== undefined).map(named);
  if (component.plane) words.push(`plane ${component.plane}`);
  return words.join(', ');
}

/** A definition's title with the component put in. */
export function boundTitle(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): string {
  const title = definition.boundTitle.replace(/\{(axis|spindle|reference|turret|plane)\}/g, (_, part) => {
    const id = component[part as 'axis' | 'spindle' | 'reference' | 'turret' | 'plane'];
    if (id === undefined) throw new Error(`${definition.id} names {${part}}, which the component does not have`);
    return part === 'plane' ? id : componentName(id, makeUp);
  });
  return title.charAt(0).toUpperCase() + title.slice(1);
}
