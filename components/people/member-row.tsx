'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { FormProblem } from '@/components/forms/form-problem';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/inputs';
import { DataCell, Row, RowHead } from '@/components/ui/table';
import { type Role, roles } from '@/lib/auth/permissions';
import { ApiProblem, api } from '@/lib/http/api-client';
import { roleWords } from '@/lib/schemas/people';

export interface MemberLine {
  id: string;
  name: string;
  email: string;
  functionTitle: string | null;
  roles: Role[];
  customerName: string | null;
  disabled: boolean;
  version: number;
}

const staffRoles = roles.filter((role) => role !== 'customer');

/** One member: roles can be changed, and the right to sign in taken and given back. */
export function MemberRow({ member, isMe }: { member: MemberLine; isMe: boolean }) {
  const router = useRouter();
  const [asking, setAsking] = useState(false);
  const [editing, setEditing] = useState<Role[] | null>(null);
  const change = useMutation({
    mutationFn: (body: { roles?: Role[]; disabled?: boolean }) =>
      api(`/api/members/${member.id}`, { method: 'PATCH', body, version: member.version }),
    onSuccess: () => {
      setAsking(false);
      setEditing(null);
      router.refresh();
    },
  });
  const problem = change.error instanceof ApiProblem ? change.error : null;
  const toggle = (role: Role, held: boolean) =>
    setEditing((before) => staffRoles.filter((each) => (each === role ? held : before?.includes(each))));
  return (
    <Row>
      <RowHead>
        {member.name}
        {member.functionTitle && <span className="block text-sm font-normal text-ink2">{member.functionTitle}</span>}
      </RowHead>
      <DataCell className="text-[15px]">{member.email}</DataCell>
      <DataCell>
        {editing ? (
          <fieldset>
            <legend className="sr-only">Roles of {member.name}</legend>
            {staffRoles.map((role) => (
              <Checkbox
                key={role}
                label={roleWords[role].name}
                checked={editing.includes(role)}
                onChange={(event) => toggle(role, event.target.checked)}
              />
            ))}
          </fieldset>
        ) : (
          <>
            {member.roles.join(', ')}
            {member.customerName && <span className="block text-sm text-ink2">{member.customerName}</span>}
          </>
        )}
      </DataCell>
      <DataCell>{member.disabled ? 'may not sign in' : 'may sign in'}</DataCell>
      <DataCell className="w-64">
        <div className="flex flex-wrap justify-end gap-2">
          {editing ? (
            <>
              <Button
                small
                disabled={editing.length === 0 || change.isPending}
                onClick={() => change.mutate({ roles: editing })}
              >
                Save roles
              </Button>
              <Button small variant="quiet" onClick={() => setEditing(null)}>
                Leave as it was
              </Button>
            </>
          ) : asking ? (
            <>
              <Button
                small
                variant="danger"
                disabled={change.isPending}
                onClick={() => change.mutate({ disabled: true })}
              >
                Yes, disable {member.name}
              </Button>
              <Button small variant="quiet" onClick={() => setAsking(false)}>
                No
              </Button>
            </>
          ) : (
            <>
              {!member.customerName && !member.disabled && (
                <Button small onClick={() => setEditing(member.roles)}>
                  Change roles
                </Button>
              )}
              {member.disabled ? (
                <Button small disabled={change.isPending} onClick={() => change.mutate({ disabled: false })}>
                  Let sign in again
                </Button>
              ) : (
                !isMe && (
                  <Button small variant="danger" onClick={() => setAsking(true)}>
                    Disable
                  </Button>
                )
              )}
            </>
          )}
        </div>
        {problem && (
          <div className="mt-2">
            <FormProblem problem={problem} />
          </div>
        )}
      </DataCell>
    </Row>
  );
}
