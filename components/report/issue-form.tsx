'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { z } from 'zod';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { FieldErrorLine } from '@/components/ui/field';
import { Checkbox } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { ApiProblem, api } from '@/lib/http/api-client';
import { issueIntent } from '@/lib/schemas/signature';

/** The reviewer's one deliberate act: what is to be confirmed is confirmed together, then the report goes out. */
export function IssueForm({ jobId, blocking, toConfirm }: { jobId: string; blocking: number; toConfirm: number }) {
  const router = useRouter();
  const [out, setOut] = useState(false);
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: z.object({
      confirmed: z
        .boolean()
        .refine((confirmed) => confirmed || toConfirm === 0, 'Say that you have seen what is to be confirmed.'),
      annex: z.boolean(),
    }),
    defaultValues: { confirmed: false, annex: false },
    send: async (body, idempotencyKey) => {
      try {
        return (await api<{ id: string }>(`/api/jobs/${jobId}/reports`, { method: 'POST', body, idempotencyKey })).data;
      } catch (error) {
        // The list on this page is older than the refusal: it is fetched again beside it.
        if (error instanceof ApiProblem && error.status > 0) router.refresh();
        throw error;
      }
    },
    onDone: ({ id }) => {
      setOut(true);
      router.push(`/reports/${id}`);
    },
  });
  return (
    <form onSubmit={submit} noValidate className="grid gap-3">
      {toConfirm > 0 && (
        <div>
          <Checkbox
            label={
              toConfirm === 1
                ? 'I have seen the one point to be confirmed; the report goes out with it.'
                : `I have seen the ${toConfirm} points to be confirmed; the report goes out with them.`
            }
            {...form.register('confirmed')}
          />
          {errorAt('confirmed') && <FieldErrorLine>{errorAt('confirmed')}</FieldErrorLine>}
        </div>
      )}
      <Checkbox
        label="With the annex of calculations"
        hint="How every figure came about, after the signatures; it makes the report longer"
        {...form.register('annex')}
      />
      {problem && (
        <Notice tone="oxide" title={problem.title} live>
          {problem.errors.length > 1 ? (
            <ul className="list-disc pl-5">
              {problem.errors.map(({ detail }) => (
                <li key={detail}>{detail}</li>
              ))}
            </ul>
          ) : (
            <p>{problem.detail}</p>
          )}
        </Notice>
      )}
      {blocking === 0 && <p className="text-lg">{issueIntent}</p>}
      <Button type="submit" variant="strong" disabled={blocking > 0 || sending || out} aria-describedby="issue-note">
        {sending || out ? 'Issuing' : 'Check and issue the report'}
      </Button>
      <p id="issue-note" className="text-sm text-ink2">
        {blocking > 0
          ? `${blocking === 1 ? 'One point blocks' : `${blocking} points block`} the report. Put it right first.`
          : 'It gets its number, its content is frozen, and the customer is told.'}
      </p>
    </form>
  );
}
