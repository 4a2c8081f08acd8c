'use client';

import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { ApiProblem } from '@/lib/http/api-client';
import { leftOutReasons } from '@/lib/schemas/job';
import type { SaveState } from './save-words';
import type { LiveSheet, SheetData } from './sheet-data';
import { useChangeSheet } from './use-sheet-changes';

/** What holds for the sheet as a whole: signed out, closed, left out, refused, something just done. */
export function SheetNotices(props: {
  data: SheetData;
  live: LiveSheet;
  server: SaveState['server'];
  again: () => Promise<void>;
  failed: ApiProblem | null;
  said: string;
  onHeard: () => void;
}) {
  const { data, live, server, again, failed, said, onHeard } = props;
  const change = useChangeSheet(data.sheet.id, again);
  return (
    <div className="grid gap-2 [&:not(:empty)]:mb-3">
      {server === 'signed-out' && (
        <Notice tone="brass" title="You are signed out" live>
          Go on entering: everything is kept on this device.{' '}
          <a href="/sign-in" target="_blank" rel="noreferrer" className="underline">
            Sign in, in a new tab
          </a>
          , and come back here: what waits is sent then.
        </Notice>
      )}
      {server === 'refusing' && (
        <Notice tone="brass" title="The server takes no readings from you at the moment" live>
          Your rights may have changed. What you typed stays on this device.
        </Notice>
      )}
      {data.job.closed && <Notice title="These readings do not change any more">{data.job.closed}</Notice>}
      {!data.viewer.mayMeasure && !data.job.closed && (
        <Notice title="To be read only">Your role does not include entering readings.</Notice>
      )}
      {live.leftOut && (
        <Notice tone="brass" title={`Left out: ${leftOutReasons[live.leftOut.reason]}`}>
          {live.leftOut.text && <p>{live.leftOut.text}</p>}
          {live.leftOut.by && <p className="text-sm text-ink2">{live.leftOut.by}</p>}
          {!data.job.closed && data.viewer.mayMeasure && (
            <Button
              className="mt-2"
              disabled={change.isPending}
              onClick={() => change.mutate({ version: live.version, body: { leftOut: null } })}
            >
              Take it in again
            </Button>
          )}
        </Notice>
      )}
      {[failed, change.error].map((problem) =>
        problem ? (
          <Notice key={problem.title} tone="oxide" title={problem.title} live>
            {problem.detail}
          </Notice>
        ) : null,
      )}
      {said && (
        <Notice title="Done" live>
          {said}{' '}
          <button type="button" className="min-h-6 underline" onClick={onHeard}>
            Close
          </button>
        </Notice>
      )}
    </div>
  );
}
