import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { LinkButton } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { PageTitle } from '@/components/ui/page-title';
import { DataCell, HeadCell, Row, RowHead, Table, TableHead } from '@/components/ui/table';
import { inScope } from '@/db/client';
import { customerList } from '@/db/read-models/customer-list';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';

export const metadata: Metadata = { title: 'Customers' };

export default async function CustomersPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'customer.list')) notFound();
  const customers = await inScope(scopeOf(viewer), customerList);
  const add = (
    <LinkButton href="/customers/new" variant="strong">
      Add a customer
    </LinkButton>
  );
  return (
    <>
      <PageTitle action={customers.length > 0 && add}>Customers</PageTitle>
      {customers.length === 0 ? (
        <EmptyState title="No customer yet" action={add}>
          A customer owns machines and signs their reports.
        </EmptyState>
      ) : (
        <Table caption="Customers">
          <TableHead>
            <HeadCell>Name</HeadCell>
            <HeadCell>Whom to ask for</HeadCell>
            <HeadCell>E-mail address</HeadCell>
            <HeadCell figure>Machines</HeadCell>
          </TableHead>
          <tbody>
            {customers.map((customer) => (
              <Row key={customer.id}>
                <RowHead>
                  <Link
                    href={`/customers/${customer.id}`}
                    className="inline-flex min-h-9 items-center text-blue underline"
                  >
                    {customer.name}
                  </Link>
                </RowHead>
                <DataCell>{customer.contact}</DataCell>
                <DataCell className="text-[15px]">{customer.email}</DataCell>
                <DataCell figure>{customer.machines}</DataCell>
              </Row>
            ))}
          </tbody>
        </Table>
      )}
    </>
  );
}
