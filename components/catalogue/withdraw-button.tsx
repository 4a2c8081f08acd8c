'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { FieldErrorLine } from '@/components/ui/field';
import { useApiAction } from './use-api-action';

/** Takes an own test out of new plans, after it was asked once more. */
export function WithdrawButton({ id }: { id: string }) {
  const [asking, setAsking] = useState(false);
  const { send, sending, problem } = useApiAction(`/api/catalogue/own/${id}/withdrawal`, () => setAsking(false));
  return (
    <>
      <Button variant="danger" onClick={() => setAsking(true)}>
        Withdraw
      </Button>
      <Dialog
        open={asking}
        onOpenChange={setAsking}
        title={`Withdraw ${id}?`}
        description="New plans will not have it. Sheets that were planned keep it, and a new version brings it back."
      >
        <div className="grid justify-items-start gap-3">
          {problem && <FieldErrorLine>{problem.detail}</FieldErrorLine>}
          <Button variant="danger" disabled={sending} onClick={() => send()}>
            Withdraw it
          </Button>
        </div>
      </Dialog>
    </>
  );
}
