import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CustomerPageForm } from '@/components/customers/customer-page-form';
import { MachineLinks } from '@/components/machines/machine-links';
import { PageTitle, SectionTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { findCustomer } from '@/db/queries/customers';
import { machineList } from '@/db/read-models/machine-list';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { id } from '@/lib/schemas/common';

export const metadata: Metadata = { title: 'Customer' };

export default async function CustomerPage({ params }: { params: Promise<{ customerId: string }> }) {
  const viewer = await requireViewer();
  const { customerId } = await params;
  if (!can(viewer.roles, 'customer.manage') || !id.safeParse(customerId).success) notFound();
  const { customer, machines } = await inScope(scopeOf(viewer), async (trx) => ({
    customer: await findCustomer(trx, customerId),
    machines: (await machineList(trx, { ownerId: customerId, limit: 200 })).items,
  }));
  if (!customer) notFound();
  return (
    <>
      <PageTitle>{customer.name}</PageTitle>
      <CustomerPageForm customer={customer} />
      <SectionTitle>Machines</SectionTitle>
      {machines.length === 0 ? <p className="text-ink2">None at the moment.</p> : <MachineLinks machines={machines} />}
    </>
  );
}
