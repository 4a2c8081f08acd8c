'use client';

import { useFieldArray, useWatch } from 'react-hook-form';
import { NumberText, Select, TextInput } from '@/components/ui/inputs';
import { rowMessages, useMachineForm } from './machine-input';
import { PartCell, PartRow, PartTable } from './row-parts';

const letters = ['X', 'Y', 'Z', 'U', 'V', 'W'] as const;

/** The linear axes: what each carries, its travel, and how it is programmed. */
export function AxisRows({ carried }: { carried: string[] }) {
  const { register, control, formState } = useMachineForm();
  const { fields, append, remove } = useFieldArray({ control, name: 'makeUp.linearAxes', keyName: 'rowKey' });
  const axes = useWatch({ control, name: 'makeUp.linearAxes' });
  const errors = formState.errors.makeUp?.linearAxes;
  return (
    <PartTable
      title="Linear axes"
      hint="Axes side by side have numbers: X1 and X2. Each carries a turret, a tool post, a spindle or the tailstock. A note says what is unusual, such as its + direction."
      heads={['Axis', 'Number', 'Carries', 'Travel, mm', 'Programmed on', 'Channel', 'Note']}
      addLabel="Add a linear axis"
      onAdd={() =>
        append({
          id: '',
          letter: 'X',
          number: axes.length + 1,
          channel: 1,
          carries: carried[0] ?? 'T1',
          travelMm: '',
          programmedOn: 'diameter',
          directionNote: '',
        })
      }
      problem={errors?.message ?? errors?.root?.message}
    >
      {fields.map((field, index) => {
        const name = `axis ${axes[index]?.letter ?? ''}${axes[index]?.number ?? ''}`;
        const path = `makeUp.linearAxes.${index}` as const;
        return (
          <PartRow
            key={field.rowKey}
            name={name}
            columns={7}
            messages={rowMessages(errors?.[index])}
            onRemove={fields.length > 1 ? () => remove(index) : undefined}
          >
            <PartCell>
              <Select aria-label={`${name}: letter`} className="min-w-16" {...register(`${path}.letter`)}>
                {letters.map((letter) => (
                  <option key={letter}>{letter}</option>
                ))}
              </Select>
            </PartCell>
            <PartCell>
              <NumberText
                aria-label={`${name}: number`}
                className="min-w-12 max-w-16"
                {...register(`${path}.number`)}
              />
            </PartCell>
            <PartCell>
              <Select aria-label={`${name}: carries`} className="min-w-20" {...register(`${path}.carries`)}>
                {carried.map((id) => (
                  <option key={id}>{id}</option>
                ))}
              </Select>
            </PartCell>
            <PartCell>
              <NumberText
                aria-label={`${name}: travel, mm`}
                className="min-w-20 max-w-28"
                {...register(`${path}.travelMm`)}
              />
            </PartCell>
            <PartCell>
              <Select aria-label={`${name}: programmed on`} className="min-w-28" {...register(`${path}.programmedOn`)}>
                <option value="radius">radius</option>
                <option value="diameter">diameter</option>
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
              <TextInput aria-label={`${name}: note`} className="min-w-28" {...register(`${path}.directionNote`)} />
            </PartCell>
          </PartRow>
        );
      })}
    </PartTable>
  );
}
