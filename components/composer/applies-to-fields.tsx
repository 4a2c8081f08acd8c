'use client';

import { appliesToChoices } from '@/lib/planning/applies-to-words';
import type { AppliesTo } from '@/standards/types';
import { ComposerField } from './composer-field';
import { at, type ComposerForm } from './composer-form';
import { TickList } from './tick-list';

const planes = ['ZX', 'YZ', 'XY'].map((value) => ({ value, label: `plane ${value}` }));
const noPlane = { value: '', label: 'no plane' };
const turretTypes = [
  { value: 'turret', label: 'turrets' },
  { value: 'tool-post', label: 'tool posts' },
  { value: 'gang-slide', label: 'gang slides' },
];
const roles = [
  { value: 'longitudinal', label: 'its Z-like axis' },
  { value: 'cross', label: 'its X-like axis' },
  { value: 'vertical', label: 'its Y-like axis' },
];

/** With what each kind of component begins, besides its kind. */
const beginnings: Partial<Record<AppliesTo['kind'], object>> = {
  spindle: { types: ['main'] },
  'sub-spindle-and-its-axis': { plane: 'ZX' },
  'linear-axis': { letters: [] },
  'linear-axis-in-planes': { letters: [], planes: ['ZX'] },
  'longitudinal-axis': { planes: ['ZX'] },
  'longitudinal-axis-and-spindle': { plane: 'ZX' },
  'axis-pair': { plane: 'ZX' },
  'rotary-axis': { letters: ['A', 'B', 'C'] },
  turret: { types: [] },
  'turret-and-axis': { role: 'longitudinal', types: [] },
  'turret-axis-and-spindle': { role: 'cross' },
  'station-and-spindle': { types: ['gang-slide', 'tool-post'] },
  'guide-bush-and-axis': { plane: 'ZX' },
};
const withOptionalPlane: AppliesTo['kind'][] = ['turret-and-axis', 'tailstock-and-axis', 'tailstock-and-spindle'];

const options = Object.entries(appliesToChoices).map(([value, { label }]) => ({ value, label }));

/** On what the test is done; a plan has a sheet for each such component that the machine has. */
export function AppliesToFields({ api }: { api: ComposerForm }) {
  const kind = api.form.watch(at('appliesTo.kind')) as unknown as AppliesTo['kind'];
  const begin = beginnings[kind] ?? {};
  const choose = (next: string) => {
    const chosen = next as AppliesTo['kind'];
    api.form.setValue(at('appliesTo'), { kind: chosen, ...beginnings[chosen] } as unknown as string);
    api.form.setValue(at('dependsOn'), undefined as unknown as string);
  };
  const ticks = (field: string, legend: string, choices: { value: string; label: string }[], hint?: string) => (
    <TickList api={api} path={`appliesTo.${field}`} legend={legend} options={choices} hint={hint} />
  );
  return (
    <div className="grid gap-4">
      <ComposerField api={api} path="appliesTo.kind" label="Done on" options={options} onPick={choose} />
      {kind === 'spindle' &&
        ticks('types', 'Which spindles', [
          { value: 'main', label: 'main spindle' },
          { value: 'sub', label: 'sub-spindle' },
        ])}
      {'letters' in begin &&
        (kind === 'rotary-axis'
          ? ticks('letters', 'Letters', letterOptions(['A', 'B', 'C']))
          : ticks('letters', 'Letters', letterOptions(['X', 'Y', 'Z']), 'None ticked: every linear axis'))}
      {'planes' in begin && ticks('planes', 'Planes, a sheet in each', planes)}
      {'role' in begin && <ComposerField api={api} path="appliesTo.role" label="Which axis" options={roles} />}
      {'plane' in begin && <ComposerField api={api} path="appliesTo.plane" label="Plane" options={planes} />}
      {withOptionalPlane.includes(kind) && (
        <ComposerField api={api} path="appliesTo.plane" label="Plane" options={[noPlane, ...planes]} />
      )}
      {'types' in begin &&
        kind !== 'spindle' &&
        ticks('types', 'Which carriers', turretTypes, kind === 'station-and-spindle' ? undefined : 'None ticked: all')}
    </div>
  );
}

const letterOptions = (letters: string[]) => letters.map((value) => ({ value, label: value }));
