'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { z } from 'zod';
import { FormProblem } from '@/components/forms/form-problem';
import { useApiForm } from '@/components/forms/use-api-form';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { api } from '@/lib/http/api-client';

interface Settings {
  fourEyes: boolean;
  refuseUnconfirmed: boolean;
  version: number;
}

const fields = z.object({ fourEyes: z.boolean(), refuseUnconfirmed: z.boolean() });

/** Whether a confirmed tolerance waits for a second person, and whether a new job takes confirmed ones only. */
export function ConfirmationForm({ organisation }: { organisation: Settings }) {
  const router = useRouter();
  const [saved, setVersion] = useState(organisation.version);
  // Another form of the page may have saved meanwhile; what is typed here stays.
  const version = Math.max(saved, organisation.version);
  const [kept, setKept] = useState(false);
  const { form, submit, problem, sending } = useApiForm({
    schema: fields,
    defaultValues: { fourEyes: organisation.fourEyes, refuseUnconfirmed: organisation.refuseUnconfirmed },
    send: (values) => {
      setKept(false);
      return api<{ version: number }>('/api/organisation', { method: 'PATCH', body: values, version });
    },
    onDone: ({ data }) => {
      setVersion(data.version);
      setKept(true);
      router.refresh();
    },
  });
  return (
    <form onSubmit={submit} noValidate className="grid max-w-3xl gap-3">
      <p>
        Tolerances are confirmed test by test in the{' '}
        <Link href="/catalogue" className="text-blue underline">
          catalogue
        </Link>
        .
      </p>
      <Checkbox
        label="Two people confirm a tolerance"
        hint="A value holds when a second administrator or a reviewer has looked it up too. What was confirmed before stays."
        {...form.register('fourEyes')}
      />
      <Checkbox
        label="A new job takes confirmed tolerances only"
        hint="It can be chosen differently for each job."
        {...form.register('refuseUnconfirmed')}
      />
      <FormProblem problem={problem} />
      {kept && <Notice title="Saved" live />}
      <div>
        <Button type="submit" disabled={sending}>
          {sending ? 'Saving' : 'Save this'}
        </Button>
      </div>
    </form>
  );
}
