'use client';

import { useWatch } from 'react-hook-form';
import { Checkbox } from '@/components/ui/inputs';
import { useMachineForm } from './machine-input';

const parts = {
  tailstock: { label: 'Tailstock', id: 'TS1' },
  guideBush: { label: 'Guide bush', id: 'GB1' },
  toolChanger: { label: 'Tool changer', id: 'TC1' },
} as const;

/** A part of which there is one or none. */
export function SinglePart({ name }: { name: keyof typeof parts }) {
  const { control, setValue } = useMachineForm();
  const value = useWatch({ control, name: `makeUp.${name}` });
  return (
    <Checkbox
      label={parts[name].label}
      checked={Boolean(value)}
      onChange={(event) =>
        setValue(`makeUp.${name}`, event.target.checked ? { id: parts[name].id, channel: 1 } : null, {
          shouldDirty: true,
        })
      }
    />
  );
}
