'use client';

import { useFieldArray, useWatch } from 'react-hook-form';
import { Checkbox, NumberText, Select, TextInput } from '@/components/ui/inputs';
import { drivenToolWords } from '@/lib/schemas/make-up';
import { rowMessages, useMachineForm } from './machine-input';
import { PartCell, PartRow, PartTable } from './row-parts';

/** Turrets, tool posts and gang slides, with the work spindles that each can reach. */
export function TurretRows({ workSpindles }: { workSpindles: string[] }) {
  const { register, control, formState } = useMachineForm();
  const { fields, append, remove } = useFieldArray({ control, name: 'makeUp.turrets', keyName: 'rowKey' });
  const turrets = useWatch({ control, name: 'makeUp.turrets' });
  const errors = formState.errors.makeUp?.turrets;
  return (
    <PartTable
      title="Turrets and tool posts"
      heads={['Name', 'Kind', 'Stations', 'Driven tools', 'Channel', 'Works at']}
      addLabel="Add a turret or tool post"
      onAdd={() =>
        append({
          id: `T${fields.length + 1}`,
          type: 'turret',
          channel: 1,
          stations: 12,
          axes: [],
          worksAt: workSpindles.slice(0, 1),
          drivenTools: 'none',
        })
      }
      problem={errors?.message ?? errors?.root?.message}
    >
      {fields.map((field, index) => {
        const name = `turret ${turrets[index]?.id ?? ''}`;
        const path = `makeUp.turrets.${index}` as const;
        return (
          <PartRow
            key={field.rowKey}
            name={name}
            columns={6}
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
              <Select aria-label={`${name}: kind`} className="min-w-32" {...register(`${path}.type`)}>
                <option value="turret">turret</option>
                <option value="tool-post">tool post</option>
                <option value="gang-slide">gang slide</option>
              </Select>
            </PartCell>
            <PartCell>
              <NumberText
                aria-label={`${name}: stations`}
                className="min-w-14 max-w-20"
                {...register(`${path}.stations`)}
              />
            </PartCell>
            <PartCell>
              <Select aria-label={`${name}: driven tools`} className="min-w-28" {...register(`${path}.drivenTools`)}>
                {Object.entries(drivenToolWords).map(([value, words]) => (
                  <option key={value} value={value}>
                    {words}
                  </option>
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
              <span className="flex flex-wrap gap-x-5">
                {workSpindles.map((id) => (
                  <Checkbox key={id} label={id} value={id} {...register(`${path}.worksAt`)} />
                ))}
              </span>
            </PartCell>
          </PartRow>
        );
      })}
    </PartTable>
  );
}
