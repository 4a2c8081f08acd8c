'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { MachineForm } from '@/components/machines/machine-form';
import { Button } from '@/components/ui/button';
import { api } from '@/lib/http/api-client';

/** Last step of the first start. Leaving it for later finishes the set-up as well: nothing is a dead end. */
export function FirstMachine({ customers, version }: { customers: { id: string; name: string }[]; version: number }) {
  const router = useRouter();
  const [problem, setProblem] = useState<string | null>(null);
  const finish = () => api('/api/organisation', { method: 'PATCH', body: { setUpDone: true }, version });
  const later = async () => {
    try {
      await finish();
      router.push('/');
      router.refresh();
    } catch (error) {
      setProblem(error instanceof Error ? error.message : String(error));
    }
  };
  return (
    <>
      <MachineForm
        customers={customers}
        goOnTo={async (id) => {
          // The machine is registered; if this note fails the shell keeps offering the set-up.
          await finish().catch(() => undefined);
          return `/machines/${id}`;
        }}
      />
      <div className="mt-6 border-t border-line pt-4">
        <Button onClick={later}>Later; go to the workshop</Button>
        {problem && (
          <p role="alert" className="mt-2 text-oxide">
            {problem}
          </p>
        )}
      </div>
    </>
  );
}
