'use client';

import { useFieldArray, useWatch } from 'react-hook-form';
import { NumberText, Select, TextInput } from '@/components/ui/inputs';
import { rowMessages, useMachineForm } from './machine-input';
import { PartCell, PartRow, PartTable } from './row-parts';

/** Rotary axes: C of a spindle, B of a tool spindle. */
export function RotaryAxisRows({ carried }: { carried: string[] }) {
  const { register, control, formState } = useMachineForm();
  const { fields, append, remove } = useFieldArray({ control, name: 'makeUp.rotaryAxes', keyName: 'rowKey' });
  const axes = useWatch({ control, name: 'makeUp.rotaryAxes' });
  const errors = formState.errors.makeUp?.rotaryAxes;
  return (
    <PartTable
      title="Rotary axes"
      heads={['Name', 'Turns', 'Channel', 'Note']}
      addLabel="Add a rotary axis"
      onAdd={() => append({ id: `C${fields.length + 1}`, channel: 1, carries: carried[0] ?? 'S1', directionNote: '' })}
      isEmpty={fields.length === 0}
    >
      {fields.map((field, index) => {
        const name = `rotary axis ${axes[index]?.id ?? ''}`;
        const path = `makeUp.rotaryAxes.${index}` as const;
        return (
          <PartRow
            key={field.rowKey}
            name={name}
            columns={4}
            messages={rowMessages(errors?.[index])}
            onRemove={() => remove(index)}
          >
            <PartCell>
              <TextInput
                aria-label={`${name}: name`}
                className="min-w-16 max-w-24 font-mono"
                {...register(`${path}.id`)}
              />
            </PartCell>
            <PartCell>
              <Select aria-label={`${name}: turns`} className="min-w-22" {...register(`${path}.carries`)}>
                {carried.map((id) => (
                  <option key={id}>{id}</option>
                ))}
              </Select>
            </PartCell>
            <PartCell>
              <NumberText
                aria-label={`${name}: channel`}
                className="min-w-12 max-w-16"
                {...register(`${path}.channel`)}
              />
            </PartCell>
            <PartCell>
              <TextInput aria-label={`${name}: note`} className="min-w-36" {...register(`${path}.directionNote`)} />
            </PartCell>
          </PartRow>
        );
      })}
    </PartTable>
  );
}
