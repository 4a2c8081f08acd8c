'use client';

import { FieldErrorLine } from '@/components/ui/field';
import { Checkbox } from '@/components/ui/inputs';
import { type RestsOn, restsOn } from '@/lib/planning/applies-to-words';
import type { AppliesTo } from '@/standards/types';
import { at, type ComposerForm } from './composer-form';

const lists: { key: keyof RestsOn; legend: string }[] = [
  { key: 'components', legend: 'Must not be loosened afterwards' },
  { key: 'moved', legend: 'Motion that is measured' },
  { key: 'positioned', legend: 'Place that enters the result' },
];
const words: Record<string, string> = {
  reference: 'the second of the relation',
  'turret-axes': 'axes of the turret',
  'spindle-axis': 'axis that carries the spindle',
  'guide-bush': 'guide bush',
  'tool-changer': 'tool changer',
  rotary: 'rotary axis',
};

/** What a later correction would have to touch to make a result doubtful; the choice of component proposes it. */
export function RestsOnFields({ api }: { api: ComposerForm }) {
  const kind = api.form.watch(at('appliesTo.kind')) as unknown as AppliesTo['kind'];
  const { can, usual } = restsOn(kind);
  const chosen = (api.form.watch(at('dependsOn')) as unknown as RestsOn | undefined) ?? usual;
  const toggle = (key: keyof RestsOn, part: string, wanted: boolean) => {
    const next = can[key].filter((one) => (one === part ? wanted : chosen[key].includes(one)));
    api.form.setValue(at('dependsOn'), { ...chosen, [key]: next } as unknown as string);
  };
  return (
    <div className="grid gap-3 sm:grid-cols-3">
      {lists.map(({ key, legend }) => (
        <fieldset key={key}>
          <legend className="font-medium">{legend}</legend>
          {can[key].length === 0 && <p className="text-sm text-ink2">nothing here</p>}
          {can[key].map((part) => (
            <Checkbox
              key={part}
              label={words[part] ?? part}
              checked={chosen[key].includes(part)}
              onChange={(event) => toggle(key, part, event.target.checked)}
            />
          ))}
          {api.errorAt(at(`dependsOn.${key}`)) && (
            <FieldErrorLine>{api.errorAt(at(`dependsOn.${key}`))}</FieldErrorLine>
          )}
        </fieldset>
      ))}
    </div>
  );
}
