import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { InstrumentForm } from '@/components/instruments/instrument-form';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/auth/permissions';
import { requireViewer } from '@/lib/auth/session';
import { instrumentKinds } from '@/lib/planning/instrument-kinds';

export const metadata: Metadata = { title: 'Add an instrument' };

export default async function NewInstrumentPage() {
  const viewer = await requireViewer();
  if (!can(viewer.roles, 'instrument.manage')) notFound();
  return (
    <>
      <PageTitle note="Its certificate comes next">Add an instrument</PageTitle>
      <InstrumentForm kinds={instrumentKinds()} />
    </>
  );
}
