/**
 * A test's title with what it is bound to, said once: parts whose id the title has already are not repeated.
 * `Z1 motion parallel to the axis of main spindle S1, in ZX` stays; `Lost motion of carriage` + `axis Z1` gets `, axis Z1`.
 */
export function titleWithComponent(title: string, component: string): string {
  const inTitle = new Set(title.split(/[^\p{L}\p{N}]+/u));
  const missing = component.split(', ').filter((part) => part !== '' && !inTitle.has(part.split(' ').at(-1) ?? ''));
  return [title, ...missing].join(', ');
}
