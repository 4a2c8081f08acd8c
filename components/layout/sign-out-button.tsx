'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { signOut } from '@/lib/http/sign-in-client';

export function SignOutButton() {
  const [state, setState] = useState<'ready' | 'leaving' | 'failed'>('ready');
  const leave = async () => {
    setState('leaving');
    try {
      await signOut();
      // A full load: nothing of the signed-in pages may stay in memory.
      window.location.assign('/sign-in');
    } catch {
      setState('failed');
    }
  };
  return (
    <div className="grid gap-1">
      <Button small onClick={leave} disabled={state === 'leaving'}>
        Sign out
      </Button>
      {state === 'failed' && (
        <p role="alert" className="text-sm text-oxide">
          The server did not answer. You are still signed in.
        </p>
      )}
    </div>
  );
}
