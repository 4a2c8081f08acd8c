import type { Db } from '@/db/client';
import { type JobRow, jobColumns } from '@/db/queries/jobs';
import type { Role } from '@/lib/auth/permissions';
import { machineView } from './machine-view';

export interface NewJobMachine {
  id: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  site: string | null;
  customerId: string | null;
  customerName: string | null;
}

export interface NewJobView {
  machine: NewJobMachine | null;
  /** Newest job on this machine: what it said is proposed again. */
  lastJob: (JobRow & { people: { membershipId: string | null; name: string; role: string }[] }) | null;
  customers: { id: string; name: string }[];
  members: { id: string; name: string; functionTitle: string | null; roles: Role[] }[];
  /** Reference of the newest job of all, to go on from. */
  lastReference: string | null;
}

/** Everything that the form for opening a job starts from. */
export async function newJobView(db: Db, machineId: string | null): Promise<NewJobView> {
  const machine = machineId ? await machineView(db, machineId) : undefined;
  const lastJob: JobRow | undefined =
    machine && (await db('jobs').where({ machine_id: machine.id }).orderBy('id', 'desc').first(jobColumns));
  const newest: { reference: string } | undefined = await db('jobs').orderBy('id', 'desc').first('reference');
  return {
    machine: machine
      ? {
          id: machine.id,
          manufacturer: machine.manufacturer,
          model: machine.model,
          serialNumber: machine.serialNumber,
          site: machine.site,
          customerId: machine.customer?.id ?? null,
          customerName: machine.customer?.name ?? null,
        }
      : null,
    lastJob: lastJob
      ? {
          ...lastJob,
          people: await db('job_people')
            .where({ job_id: lastJob.id })
            .select({ membershipId: 'membership_id', name: 'name', role: 'role' }),
        }
      : null,
    customers: await db('customers').orderBy('name').select('id', 'name'),
    members: await db('memberships')
      .whereNull('disabled_at')
      .whereRaw("roles && array['inspector','reviewer']")
      .orderBy('name')
      .select({ id: 'id', name: 'name', functionTitle: 'function_title', roles: 'roles' }),
    lastReference: newest?.reference ?? null,
  };
}
