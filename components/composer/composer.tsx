'use client';

import { useRouter } from 'next/navigation';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { SectionTitle } from '@/components/ui/page-title';
import { api as request } from '@/lib/http/api-client';
import type { ExampleMachine } from '@/lib/planning/example-sheet';
import { findMeasurement, measurements } from '@/lib/planning/measurements';
import { newComposition } from '@/lib/planning/new-composition';
import { DIRECTION_WORDS, SCENE_WORDS } from '@/lib/reporting/words';
import { cautions } from '@/standards/cautions';
import { sketchScenes } from '@/standards/sketch-scenes';
import { workingSteps, workingStepTitle } from '@/standards/working-order';
import { AppliesToFields } from './applies-to-fields';
import { ComposerField } from './composer-field';
import { at, type ComposerForm, composerSchema, type Typed } from './composer-form';
import { ComposerPreview } from './composer-preview';
import { LayoutFields } from './layout-fields';
import { RestsOnFields } from './rests-on-fields';
import { TickList } from './tick-list';
import { ToleranceFields } from './tolerance-fields';

const kinds = measurements.map(({ id, label }) => ({ value: id, label }));
const scenes = sketchScenes.map((value) => ({ value, label: SCENE_WORDS[value] ?? value }));
const steps = Object.values(workingSteps).map((step) => ({ value: String(step), label: workingStepTitle(step) }));
const directions = Object.entries(DIRECTION_WORDS).map(([value, label]) => ({ value, label }));
const cautionChoices = Object.entries(cautions)
  .filter(([id]) => id !== 'maker-and-local-rules-first')
  .map(([value, label]) => ({ value, label }));

/** Composes a test of one's own; beside it the sheet that comes of it. */
export function Composer(props: {
  /** null: a new test, whose id is chosen here. */
  basedOn: { id: string; version: number } | null;
  composed: Typed;
  machines: ExampleMachine[];
}) {
  const { basedOn, composed, machines } = props;
  const router = useRouter();
  const api = useApiForm({
    schema: composerSchema,
    defaultValues: { id: basedOn?.id ?? '', form: composed } as never,
    send: (values, idempotencyKey) =>
      basedOn
        ? request(`/api/catalogue/own/${basedOn.id}/versions`, {
            ...{ method: 'POST', body: { form: values.form }, version: basedOn.version, idempotencyKey },
          })
        : request('/api/catalogue/own', { method: 'POST', body: values, idempotencyKey }),
    onDone: (_, values) => {
      router.push(`/catalogue/own/${values.id}`);
      router.refresh();
    },
  });
  // Items are in order or not: there is no figure that could have a tolerance or a step.
  const judgesFigure = findMeasurement(api.form.watch(at('measurement')) ?? '')?.method !== 'function-check';
  const failed = api.form.formState.submitCount > 0 && !api.form.formState.isValid && !api.sending;
  return (
    <div className="grid items-start gap-x-10 gap-y-8 xl:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
      <form onSubmit={api.submit} noValidate className="grid gap-4">
        <WhatAndWhere api={api} isNew={basedOn === null} />
        <SectionTitle>Fields of the sheet</SectionTitle>
        <LayoutFields api={api} />
        {judgesFigure && (
          <>
            <SectionTitle>Tolerance</SectionTitle>
            <ToleranceFields api={api} />
          </>
        )}
        <Judged api={api} />
        <Texts api={api} />
        <SectionTitle note="For what is to be measured again after a correction">What the result rests on</SectionTitle>
        <RestsOnFields api={api} />
        <FormProblem problem={api.problem} />
        {failed && !api.problem && (
          <Notice tone="oxide" title="Not kept yet" live>
            Look at the marked fields.
          </Notice>
        )}
        <div>
          <Button type="submit" variant="strong" disabled={api.sending}>
            {api.sending ? 'Saving' : basedOn ? `Keep as version ${basedOn.version + 1}` : 'Keep this test'}
          </Button>
        </div>
      </form>
      <div className="[&_[data-at-foot]]:static xl:sticky xl:top-4 xl:max-h-[calc(100vh-2rem)] xl:overflow-y-auto">
        <ComposerPreview api={api} machines={machines} />
      </div>
    </div>
  );
}

function WhatAndWhere({ api, isNew }: { api: ComposerForm; isNew: boolean }) {
  const { form } = api;
  const measurement = findMeasurement(form.watch(at('measurement')) ?? '');
  const choose = (id: string) => {
    const usual = newComposition(id);
    for (const field of ['layout', 'scene', 'judge', 'direction', 'judgedFigure', 'tolerance', 'appliesTo'] as const)
      form.setValue(at(field), usual[field] as unknown as string);
    form.setValue(at('workingStep'), String(usual.workingStep));
    form.setValue(at('dependsOn'), undefined as unknown as string);
  };
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      {isNew && (
        <div className="sm:col-span-2">
          <IdField api={api} />
        </div>
      )}
      <ComposerField api={api} path="title" label="Title" className="sm:col-span-2" />
      <ComposerField api={api} path="measurement" label="What is measured" options={kinds} onPick={choose} />
      {measurement && measurement.judges.length > 0 ? (
        <ComposerField
          api={api}
          path="judge"
          label="Figure that is judged"
          options={[{ value: '', label: 'the usual one' }, ...measurement.judges]}
        />
      ) : (
        <p className="self-center text-sm text-ink2">It gives {measurement?.gives}.</p>
      )}
      <div className="sm:col-span-2">
        <AppliesToFields api={api} />
      </div>
      <ComposerField api={api} path="workingStep" label="Place in the working order" options={steps} />
      <ComposerField api={api} path="minutes" label="Minutes, set up and measured once" figure />
    </div>
  );
}

function IdField({ api }: { api: ComposerForm }) {
  return (
    <Field
      label="Own number"
      hint="Stands on sheets and reports for ever, such as OWN-1. It cannot be changed."
      error={api.errorAt('id')}
    >
      <TextInput className="max-w-60 font-mono uppercase" {...api.form.register('id')} />
    </Field>
  );
}

function Judged({ api }: { api: ComposerForm }) {
  const measurement = findMeasurement(api.form.watch(at('measurement')) ?? '');
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      {measurement?.signed && (
        <>
          <ComposerField
            api={api}
            path="direction"
            label="How the result may lie"
            options={directions}
            className="sm:col-span-2"
          />
          <ComposerField api={api} path="positiveMeans" label="A positive figure means" />
          <ComposerField api={api} path="negativeMeans" label="A negative figure means" />
        </>
      )}
      <ComposerField api={api} path="judgedFigure" label="What is judged, in words" className="sm:col-span-2" />
      {measurement?.shownIn !== 'items' && (
        <ComposerField
          api={api}
          path="resolutionUm"
          label={`Result shown in steps of, ${measurement?.toleranceUnit}`}
          figure
        />
      )}
    </div>
  );
}

function Texts({ api }: { api: ComposerForm }) {
  return (
    <>
      <SectionTitle>How it is measured</SectionTitle>
      <ComposerField api={api} path="scene" label="Sketch of the set-up" options={scenes} />
      <ComposerField
        api={api}
        path="procedure"
        label="Steps, a line each"
        rows={6}
        hint="How the sign counts and that the reading must come back belong here"
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <ComposerField api={api} path="instruments" label="Kinds of instrument, a line each" rows={4} />
        <ComposerField
          api={api}
          path="usualMistakes"
          label="What goes wrong most often, a line each"
          optional
          rows={4}
        />
      </div>
      <TickList
        api={api}
        path="cautions"
        legend="Cautions before the first reading"
        hint="That the machine maker’s instructions and local rules come first is always said."
        options={cautionChoices}
      />
      <div className="grid gap-4 sm:grid-cols-2">
        <ComposerField
          api={api}
          path="boundTitle"
          label="Title on the sheet"
          optional
          hint="{axis}, {spindle}, {turret} … stand for the component"
        />
        <ComposerField
          api={api}
          path="setUpTogether"
          label="What stands set up meanwhile"
          optional
          hint="Sheets with the same words are done one after another"
        />
      </div>
    </>
  );
}
