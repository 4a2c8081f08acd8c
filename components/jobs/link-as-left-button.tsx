'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { useAction } from './use-action';

/** For all sheets on which nothing had to be done: as left is declared to be as found, reading for reading. */
export function LinkAsLeftButton({ jobId, sheetIds }: { jobId: string; sheetIds: string[] }) {
  const [asking, setAsking] = useState(false);
  const action = useAction<{ linked: number }>(`/api/jobs/${jobId}/as-left-links`, { onDone: () => setAsking(false) });
  const count = sheetIds.length === 1 ? '1 sheet' : `${sheetIds.length} sheets`;
  return (
    <>
      <Button onClick={() => setAsking(true)}>As left = as found on {count}</Button>
      {asking && (
        <Dialog
          open
          onOpenChange={setAsking}
          title={`As left = as found on ${count}`}
          description="These sheets are complete as found and within tolerance or for information, and nothing newer was measured on them. The report says that nothing was done and that the readings as found stand."
        >
          {action.error && (
            <Notice tone="oxide" title={action.error.title} live className="mb-4">
              {action.error.detail}
            </Notice>
          )}
          <div className="flex flex-wrap justify-end gap-3">
            <Button onClick={() => setAsking(false)}>Not yet</Button>
            <Button variant="strong" disabled={action.isPending} onClick={() => action.mutate({ sheetIds })}>
              Declare it for {count}
            </Button>
          </div>
        </Dialog>
      )}
    </>
  );
}
