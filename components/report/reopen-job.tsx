'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { z } from 'zod';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { TextArea } from '@/components/ui/inputs';
import { api } from '@/lib/http/api-client';
import { line } from '@/lib/schemas/common';

const reopening = z.object({ reason: line('The reason', 500) });

/** Opens a job again after its report is out; asks why. What was issued stays as it is. */
export function ReopenJob(props: { jobId: string; nextRevision: number; reason?: string; strong?: boolean }) {
  const { jobId, nextRevision, reason, strong } = props;
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button variant={strong ? 'strong' : 'plain'} onClick={() => setOpen(true)}>
        Open the job again
      </Button>
      <Dialog
        open={open}
        onOpenChange={setOpen}
        title="Open the job again"
        description={`Readings can be taken and corrected again. What was issued stays as it is; the next report is revision ${nextRevision} and replaces it.`}
      >
        <ReopenForm jobId={jobId} reason={reason ?? ''} />
      </Dialog>
    </>
  );
}

function ReopenForm({ jobId, reason }: { jobId: string; reason: string }) {
  const router = useRouter();
  const { form, submit, problem, sending, errorAt } = useApiForm({
    schema: reopening,
    defaultValues: { reason },
    send: (body, idempotencyKey) => api(`/api/jobs/${jobId}/reopen`, { method: 'POST', body, idempotencyKey }),
    onDone: () => {
      router.push(`/jobs/${jobId}`);
      router.refresh();
    },
  });
  return (
    <form onSubmit={submit} noValidate className="grid gap-4">
      <Field label="Why it is opened again" error={errorAt('reason')}>
        <TextArea {...form.register('reason')} />
      </Field>
      <FormProblem problem={problem} />
      <div>
        <Button type="submit" variant="strong" disabled={sending}>
          {sending ? 'Opening' : 'Open the job again'}
        </Button>
      </div>
    </form>
  );
}
