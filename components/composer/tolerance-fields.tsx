'use client';

import { Button } from '@/components/ui/button';
import { Field, FieldErrorLine } from '@/components/ui/field';
import { Checkbox, Select } from '@/components/ui/inputs';
import { findMeasurement } from '@/lib/planning/measurements';
import { provenanceWords } from '@/lib/reporting/record-words';
import { ComposerField } from './composer-field';
import { at, type ComposerForm } from './composer-form';

const ways = [
  { value: 'none', label: 'no tolerance: for information' },
  { value: 'all', label: 'one figure for all machines' },
  { value: 'size-class', label: 'by size class of the machine' },
  { value: 'travel', label: 'by travel of the axis' },
  { value: 'centre-distance', label: 'by distance between centres' },
];
const figures: Record<string, object> = {
  all: { allUm: '' },
  'size-class': { byClassUm: ['', '', ''] },
  travel: { steps: [{ overMm: '0', upToMm: '', toleranceUm: '' }] },
  'centre-distance': { steps: [{ overMm: '0', upToMm: '', toleranceUm: '' }] },
};
const from = Object.entries(provenanceWords).map(([value, label]) => ({ value, label }));
const bases = [
  { value: 'offset', label: 'the offset of the axes' },
  { value: 'total-indicator-reading', label: 'the total indicator reading' },
];

interface Step {
  overMm: string;
  upToMm: string | null;
  toleranceUm: string;
}

/** How large the result may be, how that depends on the machine, and where it comes from. */
export function ToleranceFields({ api }: { api: ComposerForm }) {
  const { form, errorAt } = api;
  const by = form.watch(at('tolerance.by')) as unknown as string;
  const measurement = findMeasurement(form.watch(at('measurement')) ?? '');
  const unit = measurement?.toleranceUnit ?? 'µm';
  const choose = (next: string) =>
    form.setValue(
      at('tolerance'),
      (next === 'none'
        ? { by: next }
        : {
            ...{ by: next, ...figures[next], unit, perLength: null, local: null },
            basis: measurement?.method === 'coaxiality' ? 'offset' : null,
            provenance: { kind: 'builder', text: '' },
          }) as unknown as string,
    );
  const problem = errorAt(at('tolerance'));
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      <Field label="Given" error={errorAt(at('tolerance.by')) ?? problem} className="sm:col-span-2">
        <Select value={by} onChange={(event) => choose(event.target.value)}>
          {ways.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </Select>
      </Field>
      {by !== 'none' && (
        <>
          {by === 'all' && <ComposerField api={api} path="tolerance.allUm" label={`Tolerance, ${unit}`} figure />}
          {by === 'size-class' &&
            [0, 1, 2].map((k) => (
              <ComposerField
                key={k}
                api={api}
                path={`tolerance.byClassUm.${k}`}
                label={`Size class ${k + 1}, ${unit}`}
                figure
              />
            ))}
          {(by === 'travel' || by === 'centre-distance') && <Steps api={api} unit={unit} />}
          {measurement?.perLength && <PerLength api={api} unit={unit} />}
          {measurement?.method === 'straightness' && <Local api={api} unit={unit} />}
          {measurement?.method === 'coaxiality' && (
            <ComposerField api={api} path="tolerance.basis" label="It counts" options={bases} />
          )}
          <ComposerField api={api} path="tolerance.provenance.kind" label="Where it comes from" options={from} />
          <ComposerField
            api={api}
            path="tolerance.provenance.text"
            label="Exactly"
            hint="Drawing, order, page: it prints beside the figure"
          />
          {errorAt(at('tolerance.unit')) && <FieldErrorLine>{errorAt(at('tolerance.unit'))}</FieldErrorLine>}
        </>
      )}
    </div>
  );
}

function Steps({ api, unit }: { api: ComposerForm; unit: string }) {
  const steps = (api.form.watch(at('tolerance.steps')) ?? []) as unknown as Step[];
  const keep = (next: Step[]) => api.form.setValue(at('tolerance.steps'), next as unknown as string);
  return (
    <div className="grid gap-3 sm:col-span-2">
      {steps.map((_, index) => {
        const path = `tolerance.steps.${index}`;
        return (
          <div key={path} className="grid gap-3 sm:grid-cols-3">
            <ComposerField api={api} path={`${path}.overMm`} label="Over, mm" figure />
            <ComposerField api={api} path={`${path}.upToMm`} label="Up to, mm" hint="Empty: no upper limit" figure />
            <ComposerField api={api} path={`${path}.toleranceUm`} label={`Tolerance, ${unit}`} figure />
          </div>
        );
      })}
      <div className="flex flex-wrap gap-3">
        <Button
          small
          onClick={() => keep([...steps, { overMm: steps.at(-1)?.upToMm ?? '', upToMm: '', toleranceUm: '' }])}
        >
          Add a line
        </Button>
        {steps.length > 1 && (
          <Button small variant="danger" onClick={() => keep(steps.slice(0, -1))}>
            Take the last line out
          </Button>
        )}
      </div>
    </div>
  );
}

function PerLength({ api, unit }: { api: ComposerForm; unit: string }) {
  const given = api.form.watch(at('tolerance.perLength')) as unknown as object | null;
  const set = (wanted: boolean) =>
    api.form.setValue(
      at('tolerance.perLength'),
      (wanted ? { baseLengthMm: '300', minimumUm: '5', maximumUm: '' } : null) as unknown as string,
    );
  return (
    <div className="grid gap-3 sm:col-span-2">
      <Checkbox
        label="Given over a length; over another one in proportion"
        checked={given !== null}
        onChange={(event) => set(event.target.checked)}
      />
      {api.errorAt(at('tolerance.perLength')) && (
        <FieldErrorLine>{api.errorAt(at('tolerance.perLength'))}</FieldErrorLine>
      )}
      {given && (
        <div className="grid gap-3 sm:grid-cols-3">
          <ComposerField api={api} path="tolerance.perLength.baseLengthMm" label="Over, mm" figure />
          <ComposerField api={api} path="tolerance.perLength.minimumUm" label={`Never below, ${unit}`} figure />
          <ComposerField
            api={api}
            path="tolerance.perLength.maximumUm"
            label={`Never above, ${unit}`}
            optional
            figure
          />
        </div>
      )}
    </div>
  );
}

function Local({ api, unit }: { api: ComposerForm; unit: string }) {
  const given = api.form.watch(at('tolerance.local')) as unknown as object | null;
  const set = (wanted: boolean) =>
    api.form.setValue(
      at('tolerance.local'),
      (wanted ? { toleranceUm: '', lengthMm: '100' } : null) as unknown as string,
    );
  return (
    <div className="grid gap-3 sm:col-span-2">
      <Checkbox
        label="Besides, a local tolerance"
        checked={given !== null}
        onChange={(event) => set(event.target.checked)}
      />
      {given && (
        <div className="grid gap-3 sm:grid-cols-2">
          <ComposerField api={api} path="tolerance.local.toleranceUm" label={`Local tolerance, ${unit}`} figure />
          <ComposerField api={api} path="tolerance.local.lengthMm" label="Over any, mm" figure />
        </div>
      )}
    </div>
  );
}
