import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { InvitationRow } from '@/components/people/invitation-row';
import { InviteForm } from '@/components/people/invite-form';
import { MemberRow } from '@/components/people/member-row';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { HeadCell, Table, TableHead } from '@/components/ui/table';
import { inScope } from '@/db/client';
import { listCustomers } from '@/db/queries/customers';
import { listOpenInvitations } from '@/db/queries/invitations';
import { listMembers } from '@/db/queries/members';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { dayIn } from '@/lib/dates';

export const metadata: Metadata = { title: 'Team' };

export default async function TeamPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'member.manage')) notFound();
  const { members, invitations, customers } = await inScope(scopeOf(viewer), async (trx) => ({
    members: await listMembers(trx),
    invitations: await listOpenInvitations(trx),
    customers: await listCustomers(trx),
  }));
  return (
    <>
      <PageTitle note="A change holds from the person’s next click">Team</PageTitle>
      <Table caption="Members">
        <TableHead>
          <HeadCell>Name</HeadCell>
          <HeadCell>E-mail address</HeadCell>
          <HeadCell>Roles</HeadCell>
          <HeadCell>Signing in</HeadCell>
          <HeadCell>
            <span className="sr-only">What can be done</span>
          </HeadCell>
        </TableHead>
        <tbody>
          {members.map(({ disabledAt, accountId, ...member }) => (
            <MemberRow
              key={member.id}
              member={{ ...member, disabled: disabledAt !== null }}
              isMe={accountId === viewer.accountId}
            />
          ))}
          {invitations.map(({ id, name, email, roles, expiresAt }) => (
            <InvitationRow
              key={id}
              id={id}
              name={name}
              email={email}
              roles={roles}
              until={dayIn(expiresAt, viewer.timeZone)}
            />
          ))}
        </tbody>
      </Table>
      <SectionTitle>Invite somebody</SectionTitle>
      <InviteForm customers={customers.map(({ id, name }) => ({ id, name }))} />
    </>
  );
}
