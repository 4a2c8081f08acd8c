'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Field, FieldErrorLine } from '@/components/ui/field';
import { Checkbox, TextArea, TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { type ApiProblem, api } from '@/lib/http/api-client';
import { intentTexts, type Outcome, signatureForm } from '@/lib/schemas/signature';
import { OutcomeChoice } from './outcome-choice';
import { emptyRemark, RemarkFields, type RemarkSheet } from './remark-fields';
import { useSeen } from './seen';
import { SignatureField, type SignatureWay } from './signature-field';

const buttons: Record<Outcome, string> = {
  accept: 'Sign and accept',
  'accept-with-remarks': 'Sign and accept with remarks',
  refuse: 'Sign and refuse',
};

/** Answer, identity, signature and the sentence that is signed; exactly one answer is ever recorded. */
export function SigningForm(props: {
  reportId: string;
  sheets: RemarkSheet[];
  prefill: { name: string; functionTitle: string; company: string; place: string };
  firstWay: SignatureWay;
  /** Where the answer is shown once it is recorded. */
  doneHref: string;
}) {
  const { reportId, sheets, prefill, firstWay, doneHref } = props;
  const router = useRouter();
  const seen = useSeen();
  const [way, setWay] = useState(firstWay);
  const [recorded, setRecorded] = useState(false);
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: signatureForm,
    defaultValues: { ...prefill, typed: '', strokes: [], reason: '', remarks: [emptyRemark], intentText: '' },
    // What belongs to another answer, or to the other way of signing, is not sent; it stays in the form.
    prepare: (values) => ({
      ...values,
      intentText: intentTexts[values.outcome] ?? '',
      remarks: values.outcome === 'accept-with-remarks' ? values.remarks : [],
      reason: values.outcome === 'refuse' ? values.reason : null,
      typed: way === 'typed' ? values.typed : null,
      strokes: way === 'drawn' ? values.strokes : null,
      deviceTimeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
    }),
    send: (body, idempotencyKey) =>
      api(`/api/reports/${reportId}/signatures`, { method: 'POST', body, idempotencyKey }),
    onDone: () => {
      setRecorded(true);
      router.replace(doneHref);
      router.refresh();
    },
  });
  const outcome = useWatch({ control: form.control, name: 'outcome' });
  const strokes = useWatch({ control: form.control, name: 'strokes' });
  const typed = useWatch({ control: form.control, name: 'typed' });
  const rewritten = { shouldDirty: true, shouldValidate: form.formState.isSubmitted };
  return (
    <form onSubmit={submit} noValidate className="grid max-w-4xl gap-6">
      <OutcomeChoice
        register={form.register('outcome')}
        acceptable={seen}
        error={errorAt('outcome')}
        // Another answer is another sentence: it is confirmed anew.
        onChoose={() => form.resetField('intentConfirmed')}
      />
      {outcome && (
        <>
          {outcome === 'accept-with-remarks' && <RemarkFields form={form} sheets={sheets} errorAt={errorAt} />}
          {outcome === 'refuse' && (
            <Field label="Reason" error={errorAt('reason')}>
              <TextArea rows={3} {...form.register('reason')} />
            </Field>
          )}
          <fieldset className="grid min-w-0 gap-4 sm:grid-cols-2">
            <legend className="mb-1 font-medium">Who signs</legend>
            <Field label="Name" error={errorAt('name')}>
              <TextInput autoComplete="name" {...form.register('name')} />
            </Field>
            <Field label="Function" optional error={errorAt('functionTitle')}>
              <TextInput autoComplete="organization-title" {...form.register('functionTitle')} />
            </Field>
            <Field label="Company" optional error={errorAt('company')}>
              <TextInput autoComplete="organization" {...form.register('company')} />
            </Field>
            <Field label="Place" optional error={errorAt('place')}>
              <TextInput {...form.register('place')} />
            </Field>
          </fieldset>
          <SignatureField
            way={way}
            onWay={setWay}
            strokes={strokes ?? []}
            onStrokes={(drawn) => form.setValue('strokes', drawn, rewritten)}
            typed={typed ?? ''}
            onTyped={(text) => form.setValue('typed', text, rewritten)}
            error={errorAt('typed') ?? errorAt('strokes')}
          />
          <div className="border-[1.5px] border-ink bg-leaf p-4">
            <p id="intent-sentence" className="text-lg">
              {intentTexts[outcome]}
            </p>
            <Checkbox
              label="This sentence is what I sign."
              aria-describedby="intent-sentence"
              {...form.register('intentConfirmed')}
            />
            {errorAt('intentConfirmed') && <FieldErrorLine>{errorAt('intentConfirmed')}</FieldErrorLine>}
            {errorAt('intentText') && <FieldErrorLine>{errorAt('intentText')}</FieldErrorLine>}
          </div>
          <Refused problem={problem} doneHref={doneHref} />
          <div>
            <Button type="submit" variant="strong" disabled={sending || recorded || problem?.status === 409}>
              {sending || recorded ? 'Recording' : buttons[outcome]}
            </Button>
          </div>
        </>
      )}
    </form>
  );
}

/** Somebody was quicker, or the report was replaced meanwhile: where that stands is one link away. */
function Refused({ problem, doneHref }: { problem: ApiProblem | null; doneHref: string }) {
  if (problem?.status !== 409) return <FormProblem problem={problem} />;
  return (
    <Notice tone="oxide" title="Your answer was not recorded" live>
      <p>{problem.detail}</p>
      <p>
        <a href={doneHref} className="font-medium text-blue underline">
          See what was recorded
        </a>
      </p>
    </Notice>
  );
}
