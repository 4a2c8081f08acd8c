'use client';

import { Button, LinkButton } from '@/components/ui/button';

/** In plain words, with the id under which the server has noted it. */
export function WentWrong({ error, retry }: { error: Error & { digest?: string }; retry: () => void }) {
  return (
    <div className="max-w-prose py-8" role="alert">
      <h1 className="text-2xl font-semibold">Something went wrong here</h1>
      <p className="mt-2">
        This was not your doing, and nothing that was saved is lost. Try again; if it happens once more, tell your
        administrator
        {error.digest ? (
          <>
            {' '}
            this number: <span className="font-mono">{error.digest}</span>
          </>
        ) : (
          ' what you were doing'
        )}
        .
      </p>
      <div className="mt-5 flex flex-wrap gap-3">
        <Button variant="strong" onClick={retry}>
          Try again
        </Button>
        <LinkButton href="/">Go to the start</LinkButton>
      </div>
    </div>
  );
}
