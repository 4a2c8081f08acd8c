import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { MachineForm } from '@/components/machines/machine-form';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { listCustomers } from '@/db/queries/customers';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';

export const metadata: Metadata = { title: 'Register a machine' };

export default async function NewMachinePage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'machine.manage')) notFound();
  const customers = await inScope(scopeOf(viewer), listCustomers);
  return (
    <>
      <PageTitle>Register a machine</PageTitle>
      <MachineForm customers={customers.map(({ id, name }) => ({ id, name }))} />
    </>
  );
}
