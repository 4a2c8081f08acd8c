'use client';

import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useAction } from './use-action';

/** The inspector is done at the machine; the office checks. */
export function HandInButton({ jobId }: { jobId: string }) {
  const action = useAction(`/api/jobs/${jobId}/hand-in`);
  return (
    <>
      <Button variant="strong" disabled={action.isPending} onClick={() => action.mutate({})}>
        Hand in for the check
      </Button>
      {action.error && (
        <Notice tone="oxide" title={action.error.title} live>
          {action.error.detail}
        </Notice>
      )}
    </>
  );
}
