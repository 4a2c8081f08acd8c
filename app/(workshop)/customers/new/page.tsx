import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { CustomerPageForm } from '@/components/customers/customer-page-form';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';

export const metadata: Metadata = { title: 'Add a customer' };

export default async function NewCustomerPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'customer.manage')) notFound();
  return (
    <>
      <PageTitle>Add a customer</PageTitle>
      <CustomerPageForm />
    </>
  );
}
