'use client';

import { useWatch } from 'react-hook-form';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/inputs';
import { machineKinds } from '@/lib/schemas/make-up';
import { AxisRows } from './axis-rows';
import { useMachineForm } from './machine-input';
import { RotaryAxisRows } from './rotary-axis-rows';
import { SinglePart } from './single-part';
import { SizeFields } from './size-fields';
import { SpindleRows } from './spindle-rows';
import { TurretRows } from './turret-rows';

const tidy = (id: string) => id.trim().toUpperCase();

/** Axes, spindles, turrets and sizes in simple rows. What follows from the rest is not asked (lib/schemas/linked-make-up). */
export function MakeUpFields() {
  const { register, control } = useMachineForm();
  const [spindles, turrets, tailstock, guideBush] = useWatch({
    control,
    name: ['makeUp.spindles', 'makeUp.turrets', 'makeUp.tailstock', 'makeUp.guideBush'],
  });
  const carried = [
    ...turrets.map(({ id }) => tidy(id)),
    ...spindles.map(({ id }) => tidy(id)),
    ...(tailstock ? [tailstock.id] : []),
    ...(guideBush ? [guideBush.id] : []),
  ].filter(Boolean);
  const workSpindles = spindles.filter(({ type }) => type !== 'tool').map(({ id }) => tidy(id));
  return (
    <div className="grid gap-7">
      <SizeFields />
      <SpindleRows turrets={turrets.map(({ id }) => tidy(id)).filter(Boolean)} />
      <TurretRows workSpindles={workSpindles} />
      <AxisRows carried={carried} />
      <div className="grid gap-7 lg:grid-cols-2">
        <RotaryAxisRows carried={carried} />
        <div className="grid content-start gap-2">
          <Field label="Kind of machine, as it prints">
            <Select {...register('makeUp.kind')}>
              {Object.entries(machineKinds).map(([kind, words]) => (
                <option key={kind} value={kind}>
                  {words}
                </option>
              ))}
            </Select>
          </Field>
          <div className="flex flex-wrap gap-x-8">
            <SinglePart name="tailstock" />
            <SinglePart name="guideBush" />
            <SinglePart name="toolChanger" />
          </div>
        </div>
      </div>
    </div>
  );
}
