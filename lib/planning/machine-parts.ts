import type { MakeUp } from '@/lib/schemas/make-up';
import { componentName } from './component-words';

export interface MachinePart {
  id: string;
  /** `main spindle S1`, `axis Z1`, `bed`. */
  words: string;
}

/** Everything of a machine that can be opened: spindles, turrets, axes, single parts, the bed. */
export function machineParts(makeUp: MakeUp): MachinePart[] {
  const named = ({ id }: { id: string }) => ({ id, words: componentName(id, makeUp) });
  const axis = ({ id }: { id: string }) => ({ id, words: `axis ${id}` });
  return [
    ...makeUp.spindles.map(named),
    ...makeUp.turrets.map(named),
    ...makeUp.linearAxes.map(axis),
    ...makeUp.rotaryAxes.map(axis),
    ...[makeUp.tailstock, makeUp.guideBush, makeUp.toolChanger].flatMap((part) => (part ? [named(part)] : [])),
    { id: 'bed', words: 'bed' },
  ];
}
