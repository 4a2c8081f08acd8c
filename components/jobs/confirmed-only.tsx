'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { FormProblem } from '@/components/forms/form-problem';
import { type ApiProblem, api } from '@/lib/http/api-client';

/** Whether the plan refuses tolerances that nobody confirmed; it can be changed until the plan is made. */
export function ConfirmedOnly(props: {
  jobId: string;
  version: number;
  refuseUnconfirmed: boolean;
  mayChange: boolean;
}) {
  const { jobId, version, refuseUnconfirmed, mayChange } = props;
  const router = useRouter();
  const change = useMutation<unknown, ApiProblem>({
    mutationFn: () =>
      api(`/api/jobs/${jobId}`, { method: 'PATCH', version, body: { refuseUnconfirmed: !refuseUnconfirmed } }),
    onSettled: () => router.refresh(),
  });
  return (
    <section aria-labelledby="confirmed-only">
      <h2 id="confirmed-only" className="font-semibold">
        Tolerances
      </h2>
      <p className="text-[15px]">
        {refuseUnconfirmed
          ? 'Only confirmed ones and those of the contract.'
          : 'Also those that nobody has confirmed; the report says so of each.'}
      </p>
      {mayChange && (
        <button
          type="button"
          disabled={change.isPending}
          className="min-h-12 text-left font-medium text-blue underline"
          onClick={() => change.mutate()}
        >
          {refuseUnconfirmed ? 'Take unconfirmed ones too' : 'Take confirmed ones only'}
        </button>
      )}
      <FormProblem problem={change.error} />
    </section>
  );
}
