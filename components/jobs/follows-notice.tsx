'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { ProposedTest } from './plan-choices';

/** Which tests follow from what was opened, and one press to take just these. */
export function FollowsNotice({ tests, onTake }: { tests: ProposedTest[]; onTake: () => void }) {
  const [done, setDone] = useState(false);
  const following = tests.filter(({ follows }) => follows !== null).length;
  const rest = tests.length - following;
  return (
    <Notice tone="brass" title={`${following} tests follow from what was opened`} className="my-3">
      <p>
        {rest === 0
          ? 'No test is left over.'
          : `The other ${rest} rest on nothing that was touched. Each test below says why it follows.`}
      </p>
      {rest > 0 && (
        <Button
          className="mt-2"
          onClick={() => {
            onTake();
            setDone(true);
          }}
        >
          Take these; the other {rest} were not touched by the work
        </Button>
      )}
      {done && (
        <p role="status" className="mt-1">
          Done: every choice can still be changed.
        </p>
      )}
    </Notice>
  );
}
