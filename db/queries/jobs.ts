import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { ComponentConditions } from '@/lib/schemas/component-conditions';
import type { Conditions, JobForm } from '@/lib/schemas/job';
import type { MakeUp } from '@/lib/schemas/make-up';

export interface JobRow {
  id: string;
  reference: string;
  machineId: string;
  customerId: string;
  purpose: JobForm['purpose'];
  scope: string | null;
  customerOrder: string | null;
  customerEngineer: string | null;
  decisionRule: 'simple' | 'guarded';
  codes: { code: string; edition: string }[];
  /** Its plan takes only tolerances that are confirmed or given by the contract. */
  refuseUnconfirmed: boolean;
  startsOn: string;
  endsOn: string | null;
  place: string | null;
  hours: string | null;
  conditions: Partial<Conditions>;
  /** What was opened, by component. */
  componentConditions: ComponentConditions;
  makeUp: MakeUp;
  planMadeAt: Date | null;
  state: 'open' | 'in-check' | 'issued' | 'closed';
  version: number;
}

export const jobColumns = {
  id: 'jobs.id',
  reference: 'jobs.reference',
  machineId: 'jobs.machine_id',
  customerId: 'jobs.customer_id',
  purpose: 'jobs.purpose',
  scope: 'jobs.scope',
  customerOrder: 'jobs.customer_order',
  customerEngineer: 'jobs.customer_engineer',
  decisionRule: 'jobs.decision_rule',
  codes: 'jobs.codes',
  refuseUnconfirmed: 'jobs.refuse_unconfirmed',
  startsOn: 'jobs.starts_on',
  endsOn: 'jobs.ends_on',
  place: 'jobs.place',
  hours: 'jobs.hours',
  conditions: 'jobs.conditions',
  componentConditions: 'jobs.component_conditions',
  makeUp: 'jobs.make_up',
  planMadeAt: 'jobs.plan_made_at',
  state: 'jobs.state',
  version: 'jobs.version',
};

/** The organisation of the transaction: written into every row that it adds. */
export const own = (db: Db) => db.raw('app_organisation()');

export const findJob = (db: Db, id: string): Promise<JobRow | undefined> => db('jobs').where({ id }).first(jobColumns);

/** Locks the job, so that plan, check and issue do not cross each other. */
export const lockJob = (db: Db, id: string): Promise<JobRow | undefined> =>
  db('jobs').where({ id }).forUpdate().first(jobColumns);

/** Holds the job as it is while its readings are written: a report that is being issued waits, or is out before they are looked at. */
export const holdJob = (db: Db, id: string): Promise<JobRow | undefined> =>
  db('jobs').where({ id }).forShare().first(jobColumns);

export async function insertJob(
  db: Db,
  job: JobForm & { codes: JobRow['codes']; refuseUnconfirmed: boolean; makeUp: MakeUp; createdBy: string },
): Promise<string> {
  const id = newId();
  await db('jobs').insert({
    organisation_id: own(db),
    id,
    reference: job.reference,
    machine_id: job.machineId,
    customer_id: job.customerId,
    purpose: job.purpose,
    scope: job.scope,
    customer_order: job.customerOrder,
    customer_engineer: job.customerEngineer,
    decision_rule: job.decisionRule,
    codes: JSON.stringify(job.codes),
    refuse_unconfirmed: job.refuseUnconfirmed,
    starts_on: job.startsOn,
    ends_on: job.endsOn,
    place: job.place,
    hours: job.hours,
    make_up: JSON.stringify(job.makeUp),
    created_by: job.createdBy,
  });
  if (job.people.length > 0) {
    await db('job_people').insert(
      job.people.map((person) => ({
        organisation_id: own(db),
        id: newId(),
        job_id: id,
        membership_id: person.membershipId ?? null,
        name: person.name,
        role: person.role,
      })),
    );
  }
  return id;
}

/** Answers false when somebody else changed the job meanwhile. */
export async function updateConditions(db: Db, id: string, version: number, conditions: Conditions): Promise<boolean> {
  const changed = await db('jobs')
    .where({ id, version })
    .update({ conditions: JSON.stringify(conditions), version: version + 1 });
  return changed === 1;
}

/** Answers false when somebody else changed the job meanwhile. */
export async function updateComponentConditions(
  db: Db,
  id: string,
  version: number,
  conditions: ComponentConditions,
): Promise<boolean> {
  const changed = await db('jobs')
    .where({ id, version })
    .update({ component_conditions: JSON.stringify(conditions), version: version + 1 });
  return changed === 1;
}

/** Answers false when somebody else changed the job meanwhile. */
export async function updateRefusal(db: Db, id: string, version: number, refuseUnconfirmed: boolean): Promise<boolean> {
  const changed = await db('jobs')
    .where({ id, version })
    .update({ refuse_unconfirmed: refuseUnconfirmed, version: version + 1 });
  return changed === 1;
}

export async function setJobState(db: Db, id: string, state: JobRow['state']): Promise<void> {
  await db('jobs')
    .where({ id })
    .update({ state, version: db.raw('version + 1') });
}

/** The answer to a report closes its job; a job that was opened again meanwhile stays open. */
export async function closeJob(db: Db, id: string): Promise<void> {
  await db('jobs')
    .where({ id, state: 'issued' })
    .update({ state: 'closed', version: db.raw('version + 1') });
}

export async function insertTemperature(
  db: Db,
  row: {
    jobId: string;
    measuredAt: string;
    air: { value: string; text: string } | null;
    machine: { value: string; text: string } | null;
  },
): Promise<string> {
  const id = newId();
  await db('job_temperatures').insert({
    organisation_id: own(db),
    id,
    job_id: row.jobId,
    measured_at: row.measuredAt,
    air: row.air?.value ?? null,
    air_text: row.air?.text ?? null,
    machine: row.machine?.value ?? null,
    machine_text: row.machine?.text ?? null,
  });
  return id;
}

export interface TemperatureRow {
  id: string;
  measuredAt: Date;
  air: string | null;
  airText: string | null;
  machine: string | null;
  machineText: string | null;
}

export const listTemperatures = (db: Db, jobId: string): Promise<TemperatureRow[]> =>
  db('job_temperatures').where({ job_id: jobId }).orderBy('measured_at').select({
    id: 'id',
    measuredAt: 'measured_at',
    air: 'air',
    airText: 'air_text',
    machine: 'machine',
    machineText: 'machine_text',
  });

export const listPeople = (
  db: Db,
  jobId: string,
): Promise<{ name: string; role: 'inspector' | 'reviewer' | 'customer' }[]> =>
  db('job_people').where({ job_id: jobId }).orderBy(['role', 'name']).select('name', 'role');
