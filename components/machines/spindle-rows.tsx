'use client';

import { useFieldArray, useWatch } from 'react-hook-form';
import { NumberText, Select, TextInput } from '@/components/ui/inputs';
import { rowMessages, useMachineForm } from './machine-input';
import { PartCell, PartRow, PartTable } from './row-parts';

/** Main, sub- and tool spindles; a tool spindle may ride on a turret or post. */
export function SpindleRows({ turrets }: { turrets: string[] }) {
  const { register, control, formState } = useMachineForm();
  const { fields, append, remove } = useFieldArray({ control, name: 'makeUp.spindles', keyName: 'rowKey' });
  const spindles = useWatch({ control, name: 'makeUp.spindles' });
  const errors = formState.errors.makeUp?.spindles;
  return (
    <PartTable
      title="Spindles"
      heads={['Name', 'Kind', 'Channel', 'Highest speed, 1/min', 'Rides on']}
      addLabel="Add a spindle"
      onAdd={() =>
        append({ id: `S${fields.length + 1}`, type: fields.length === 1 ? 'sub' : 'tool', channel: 1, carriedBy: null })
      }
      problem={errors?.message ?? errors?.root?.message}
    >
      {fields.map((field, index) => {
        const name = `spindle ${spindles[index]?.id ?? ''}`;
        const path = `makeUp.spindles.${index}` as const;
        return (
          <PartRow
            key={field.rowKey}
            name={name}
            columns={5}
            messages={rowMessages(errors?.[index])}
            onRemove={fields.length > 1 ? () => remove(index) : undefined}
          >
            <PartCell>
              <TextInput
                aria-label={`${name}: name`}
                className="min-w-16 max-w-24 font-mono"
                {...register(`${path}.id`)}
              />
            </PartCell>
            <PartCell>
              <Select aria-label={`${name}: kind`} className="min-w-36" {...register(`${path}.type`)}>
                <option value="main">main spindle</option>
                <option value="sub">sub-spindle</option>
                <option value="tool">tool spindle</option>
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
              <NumberText
                aria-label={`${name}: highest speed, 1/min`}
                className="min-w-24 max-w-32"
                {...register(`${path}.maximumSpeedPerMin`)}
              />
            </PartCell>
            <PartCell>
              {spindles[index]?.type === 'tool' ? (
                <Select aria-label={`${name}: rides on`} className="min-w-36" {...register(`${path}.onTurret`)}>
                  <option value="">no turret or post</option>
                  {turrets.map((id) => (
                    <option key={id}>{id}</option>
                  ))}
                </Select>
              ) : (
                <span className="text-sm text-ink2">the axis that carries it</span>
              )}
            </PartCell>
          </PartRow>
        );
      })}
    </PartTable>
  );
}
