'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { DataCell, Row, RowHead } from '@/components/ui/table';
import { api } from '@/lib/http/api-client';

export function InvitationRow(props: { id: string; name: string; email: string; roles: string[]; until: string }) {
  const router = useRouter();
  const revoke = useMutation({
    mutationFn: () => api(`/api/invitations/${props.id}`, { method: 'DELETE' }),
    onSuccess: () => router.refresh(),
  });
  return (
    <Row>
      <RowHead>{props.name}</RowHead>
      <DataCell className="text-[15px]">{props.email}</DataCell>
      <DataCell>{props.roles.join(', ')}</DataCell>
      <DataCell>open until {props.until}</DataCell>
      <DataCell className="text-right">
        <Button small variant="danger" disabled={revoke.isPending} onClick={() => revoke.mutate()}>
          Take back
        </Button>
        {revoke.error && (
          <p role="alert" className="mt-1 text-sm text-oxide">
            {revoke.error.message}
          </p>
        )}
      </DataCell>
    </Row>
  );
}
