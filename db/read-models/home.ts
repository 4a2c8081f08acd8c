import type { Db } from '@/db/client';
import type { Role } from '@/lib/auth/permissions';

interface JobHead {
  id: string;
  reference: string;
  serialNumber: string;
  machine: string;
}

export interface WaitingJob extends JobHead {
  planMade: boolean;
  measured: number;
  planned: number;
  /** The first sheet in working order that has no complete readings; null: all have. */
  next: { id: string; position: number; title: string } | null;
}

export interface WaitingReport extends JobHead {
  reportId: string;
  number: string;
  revision: number;
  issuedAt: Date;
  reason: string | null;
}

export interface HomeView {
  /** In work, to be measured by the person looking. */
  toMeasure: WaitingJob[];
  toCheck: WaitingJob[];
  refused: WaitingReport[];
  toSign: WaitingReport[];
  overdueInstruments: { id: string; number: string; name: string; dueOn: string | null }[];
  failedMails: { id: string; recipient: string; subject: string; createdAt: Date }[];
  failedPdfs: { reportId: string; number: string; revision: number; errorId: string | null }[];
}

/** What waits for one person, by what they may do; nothing else. */
export async function homeView(
  db: Db,
  viewer: { membershipId: string; roles: readonly Role[] },
  today: string,
): Promise<HomeView> {
  const has = (role: Role) => viewer.roles.includes(role);
  return {
    toMeasure: has('inspector') ? await waitingJobs(db, 'open', viewer.membershipId) : [],
    toCheck: has('reviewer') ? await waitingJobs(db, 'in-check', null) : [],
    refused: has('reviewer') ? await waitingReports(db, 'refused') : [],
    toSign: has('customer') ? await waitingReports(db, 'issued') : [],
    overdueInstruments: has('administrator') ? await overdueInstruments(db, today) : [],
    failedMails: has('administrator') ? await failedMails(db) : [],
    failedPdfs: has('administrator') ? await failedPdfs(db) : [],
  };
}

/** Jobs in a state, each with its next sheet. `membershipId`: those that name this person, and those that name nobody to measure. */
async function waitingJobs(db: Db, state: string, membershipId: string | null): Promise<WaitingJob[]> {
  const { rows } = await db.raw(
    `select j.id, j.reference, m.serial_number as "serialNumber", m.manufacturer || ' ' || m.model as machine,
            j.plan_made_at is not null as "planMade", coalesce(s.measured, 0)::int as measured, coalesce(s.planned, 0)::int as planned,
            s.next
       from jobs j
       join machines m on m.organisation_id = j.organisation_id and m.id = j.machine_id
       left join lateral (
         select count(*) as planned, count(*) filter (where done) as measured,
                (array_agg(json_build_object('id', id, 'position', position, 'title', title) order by position)
                  filter (where not done))[1] as next
           from (select sh.id, sh.position, sh.title, exists (
                   select 1 from passes p
                     join pass_results r on r.organisation_id = p.organisation_id and r.pass_id = coalesce(p.linked_to, p.id)
                    where p.organisation_id = sh.organisation_id and p.sheet_id = sh.id and p.kind <> 'adjusting'
                      and r.state = 'complete') as done
                   from sheets sh
                  where sh.organisation_id = j.organisation_id and sh.job_id = j.id and sh.left_out_reason is null) each_sheet
       ) s on true
      where j.state = :state
        and (:member::uuid is null
             or exists (select 1 from job_people p where p.organisation_id = j.organisation_id and p.job_id = j.id
                          and p.membership_id = :member and p.role = 'inspector')
             or not exists (select 1 from job_people p where p.organisation_id = j.organisation_id and p.job_id = j.id
                          and p.role = 'inspector'))
      order by j.starts_on, j.id limit 30`,
    { state, member: membershipId },
  );
  return rows;
}

async function waitingReports(db: Db, state: string): Promise<WaitingReport[]> {
  const { rows } = await db.raw(
    `select j.id, j.reference, m.serial_number as "serialNumber", m.manufacturer || ' ' || m.model as machine,
            r.id as "reportId", r.number, r.revision, r.issued_at as "issuedAt", s.reason
       from reports r
       join jobs j on j.organisation_id = r.organisation_id and j.id = r.job_id
       join machines m on m.organisation_id = j.organisation_id and m.id = j.machine_id
       left join lateral (
         select reason from signatures where organisation_id = r.organisation_id and report_id = r.id and outcome = 'refuse' limit 1
       ) s on true
      where r.state = ? order by r.issued_at limit 30`,
    [state],
  );
  return rows;
}

/** The newest certificate counts; an instrument without one counts as overdue. */
async function overdueInstruments(db: Db, today: string): Promise<HomeView['overdueInstruments']> {
  const { rows } = await db.raw(
    `select i.id, i.number, i.name, c.due_on as "dueOn"
       from instruments i
       left join lateral (
         select max(due_on) as due_on from calibrations where organisation_id = i.organisation_id and instrument_id = i.id
       ) c on true
      where i.retired_at is null and (c.due_on is null or c.due_on < ?) order by c.due_on nulls first, i.number limit 30`,
    [today],
  );
  return rows;
}

const failedMails = (db: Db): Promise<HomeView['failedMails']> =>
  db('outbox')
    .where({ state: 'failed' })
    .orderBy('created_at', 'desc')
    .limit(20)
    .select({ id: 'id', recipient: 'recipient', subject: 'subject', createdAt: 'created_at' });

const failedPdfs = (db: Db): Promise<HomeView['failedPdfs']> =>
  db('reports')
    .where({ pdf_state: 'failed' })
    .orderBy('created_at', 'desc')
    .limit(20)
    .select({ reportId: 'id', number: 'number', revision: 'revision', errorId: 'pdf_error_id' });
