'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { api } from '@/lib/http/api-client';

/** Takes an instrument out of use, or back; it stays in every report that named it. */
export function RetireButton({ id, version, retired }: { id: string; version: number; retired: boolean }) {
  const router = useRouter();
  const change = useMutation({
    mutationFn: () => api(`/api/instruments/${id}`, { method: 'PATCH', body: { retired: !retired }, version }),
    onSuccess: () => router.refresh(),
  });
  return (
    <div>
      <Button small variant={retired ? 'plain' : 'danger'} disabled={change.isPending} onClick={() => change.mutate()}>
        {retired ? 'Take into use again' : 'Take out of use'}
      </Button>
      {change.error && (
        <p role="alert" className="mt-1 text-sm text-oxide">
          {change.error.message}
        </p>
      )}
    </div>
  );
}
