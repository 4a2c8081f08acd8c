'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { z } from 'zod';
import { CodeChoice, type OfferedCode } from '@/components/forms/code-choice';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { api } from '@/lib/http/api-client';
import { newestEditions } from '@/lib/planning/newest-editions';
import { type TestCodeChoice, testCodes } from '@/lib/schemas/test-codes';

/** The codes that a new job is proposed with. Tolerances of the catalogue are a start, to be confirmed; it says so here. */
export function CodesForm(props: {
  offered: OfferedCode[];
  chosen: TestCodeChoice | null;
  version: number;
  goOnTo?: string;
}) {
  const { offered, chosen, goOnTo } = props;
  const router = useRouter();
  const [saved, setVersion] = useState(props.version);
  // Another form of the page may have saved meanwhile; what is typed here stays.
  const version = Math.max(saved, props.version);
  const [kept, setKept] = useState(false);
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: z.object({ codes: testCodes }),
    defaultValues: { codes: chosen ?? newestEditions(offered).map(({ code, edition }) => ({ code, edition })) },
    send: (values) => {
      setKept(false);
      return api<{ version: number }>('/api/organisation', { method: 'PATCH', body: values, version });
    },
    onDone: ({ data }) => {
      setVersion(data.version);
      if (goOnTo) return router.push(goOnTo);
      setKept(true);
      router.refresh();
    },
  });
  const codes = useWatch({ control: form.control, name: 'codes' }) ?? [];
  return (
    <form onSubmit={submit} noValidate className="grid max-w-3xl gap-4">
      <CodeChoice
        offered={offered}
        chosen={codes}
        onChoose={(next) => form.setValue('codes', next, { shouldValidate: form.formState.isSubmitted })}
        hint="A new job is proposed with these; each job can choose differently."
        error={errorAt('codes')}
      />
      <Notice tone="brass" title="Figures to be confirmed">
        No tolerance here is quoted from a standard’s text. Those marked “from memory, to be confirmed” are a start:
        hold them against your own copy, or put the contract’s figure in their place.
      </Notice>
      <FormProblem problem={problem} />
      {kept && (
        <Notice title="Saved" live>
          The next job is proposed with them.
        </Notice>
      )}
      <div>
        <Button type="submit" variant="strong" disabled={sending}>
          {sending ? 'Saving' : goOnTo ? 'Save and go on' : 'Save the codes'}
        </Button>
      </div>
    </form>
  );
}
