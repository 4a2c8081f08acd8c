'use client';

import { Button } from '@/components/ui/button';
import { FieldErrorLine } from '@/components/ui/field';
import { useApiAction } from './use-api-action';

/** The second person: looked up in the copy, not only nodded through. */
export function AgreeButton({ id, what }: { id: string; what: string }) {
  const { send, sending, problem } = useApiAction(`/api/catalogue/values/${id}/agreement`);
  return (
    <span className="mt-1 grid justify-items-start gap-1">
      <Button small disabled={sending} onClick={() => send()}>
        I have looked it up too<span className="sr-only">: {what}</span>
      </Button>
      {problem && <FieldErrorLine>{problem.detail}</FieldErrorLine>}
    </span>
  );
}
