'use client';

import { useRouter } from 'next/navigation';
import { CustomerForm, type CustomerLine } from './customer-form';

/** The form as a page: afterwards the list. */
export function CustomerPageForm({ customer }: { customer?: CustomerLine }) {
  const router = useRouter();
  return (
    <CustomerForm
      customer={customer}
      onDone={() => {
        router.push('/customers');
        router.refresh();
      }}
    />
  );
}
