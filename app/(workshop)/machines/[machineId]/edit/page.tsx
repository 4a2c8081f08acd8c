import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { MachineForm } from '@/components/machines/machine-form';
import { PageTitle } from '@/components/ui/page-title';
import { inScope } from '@/db/client';
import { findMachine } from '@/db/queries/machines';
import { can } from '@/lib/auth/permissions';
import { requireViewer, scopeOf } from '@/lib/auth/session';
import { id } from '@/lib/schemas/common';

export const metadata: Metadata = { title: 'Change a machine' };

export default async function EditMachinePage({ params }: { params: Promise<{ machineId: string }> }) {
  const viewer = await requireViewer();
  const { machineId } = await params;
  if (!can(viewer.roles, 'machine.manage') || !id.safeParse(machineId).success) notFound();
  const machine = await inScope(scopeOf(viewer), (trx) => findMachine(trx, machineId));
  if (!machine) notFound();
  return (
    <>
      <PageTitle note="Plans that are made already keep the make-up that they were made from">
        Change <span className="font-mono">{machine.serialNumber}</span>
      </PageTitle>
      <MachineForm machine={machine} customers={[]} />
    </>
  );
}
