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
  if (makeUp.toolChanger?.id === id) return `tool changer ${id}`;
  return id;
}

/** What a sheet is bound to: `main spindle S1, axis Z1, plane ZX`. */
export function componentWords(component: BoundComponent, makeUp: MakeUp): string {
  const isAxis = (id: string) =>
    makeUp.linearAxes.some((axis) => axis.id === id) || makeUp.rotaryAxes.some((axis) => axis.id === id);
  const named = (id: string) => (isAxis(id) ? `axis ${id}` : componentName(id, makeUp));
  const words = componentIds(component).map(named);
  if (component.station !== undefined) words.splice(1, 0, `station ${component.station}`);
  if (component.plane) words.push(`plane ${component.plane}`);
  if (words.length === 0)
    words.push(component.channel === undefined ? 'whole machine' : `channel ${component.channel}`);
  return words.join(', ');
}

/** Ids of the make-up that a sheet is bound to, the carrier first. */
export function componentIds(component: BoundComponent): string[] {
  const { turret, spindle, axis, reference, tailstock, guideBush, toolChanger, rotary } = component;
  return [turret, spindle, axis, reference, tailstock, guideBush, toolChanger, rotary].filter((id) => id !== undefined);
}

/** A definition's title with the component put in. */
export function boundTitle(definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): string {
  const title = putIn(definition.boundTitle, definition, component, makeUp);
  return title.charAt(0).toUpperCase() + title.slice(1);
}

/**
 * Text with `{spindle}`, `{axis}`, `{reference}`, `{turret}`, `{tailstock}`, `{guideBush}`, `{toolChanger}`, `{rotary}`, `{station}`,
 * `{channel}` and `{plane}` replaced by the component's; `{station}` is `station 3`, and only `3` where the word stands before it.
 * @throws Error naming a placeholder that the component does not fill
 */
export function putIn(text: string, definition: TestDefinition, component: BoundComponent, makeUp: MakeUp): string {
  return text.replace(/(\w+ )?\{(\w+)\}/g, (_, before: string | undefined, part: string) => {
    const value = component[part as keyof BoundComponent];
    if (value === undefined) throw new Error(`${definition.id} names {${part}}, which the component does not have`);
    const words = typeof value === 'number' ? `${part} ${value}` : value;
    const known = before?.trim().toLowerCase() === part && typeof value === 'number';
    return `${before ?? ''}${known ? value : part === 'plane' ? words : componentName(words, makeUp)}`;
  });
}
