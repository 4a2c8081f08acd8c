'use client';

import { useRouter } from 'next/navigation';
import { z } from 'zod';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { api } from '@/lib/http/api-client';

/** The inspector hands the job to the office. */
export function HandIn({ jobId, strong }: { jobId: string; strong: boolean }) {
  const router = useRouter();
  const { submit, problem, sending } = useApiForm({
    schema: z.object({}),
    defaultValues: {},
    send: (_body, idempotencyKey) => api(`/api/jobs/${jobId}/hand-in`, { method: 'POST', idempotencyKey }),
    onDone: () => router.refresh(),
  });
  return (
    <form onSubmit={submit} className="grid gap-3">
      <FormProblem problem={problem} />
      <Button type="submit" variant={strong ? 'strong' : 'plain'} disabled={sending}>
        {sending ? 'Handing in' : 'Hand in for the check'}
      </Button>
    </form>
  );
}
