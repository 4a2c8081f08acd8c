import type { Db } from '@/db/client';
import type { Purpose } from '@/lib/schemas/job';
import type { Verdict } from '@/lib/sheet/types';
import type { ShownIn } from '@/standards/types';

export type ReportState = 'draft' | 'checked' | 'issued' | 'signed' | 'signed-with-remarks' | 'refused' | 'superseded';

export interface HistoryReport {
  id: string;
  number: string;
  revision: number;
  state: ReportState;
  issuedAt: Date | null;
  signedAt: Date | null;
  jobId: string;
  headline: string;
  hasPdf: boolean;
}

export interface HistoryJob {
  id: string;
  reference: string;
  purpose: Purpose;
  state: 'open' | 'in-check' | 'issued' | 'closed';
  startsOn: string;
  endsOn: string | null;
  customerName: string | null;
}

export interface DriftPoint {
  reportId: string;
  number: string;
  measuredOn: string;
  /** As it stands in the report, in the unit of its line, sign included. */
  asLeftMm: string;
  verdict: Verdict | null;
}

/** As-left deviations of one test of one component over the signed reports, oldest first. */
export interface Drift {
  key: string;
  title: string;
  component: string;
  toleranceMm: string | null;
  /** Unit of the figures; null: mm. */
  unit: ShownIn | null;
  points: DriftPoint[];
}

export interface MachineHistory {
  reports: HistoryReport[];
  jobs: HistoryJob[];
  drift: Drift[];
}

/** Everything that happened to one machine, as far as the reader may see it. Newest first. */
export async function machineHistory(db: Db, machineId: string): Promise<MachineHistory> {
  const reports = await db.raw(
    `select r.id, r.number, r.revision, r.state, r.issued_at as "issuedAt", r.signed_at as "signedAt", r.job_id as "jobId",
            coalesce(r.model ->> 'headline', '') as headline, r.pdf_state = 'ready' as "hasPdf"
       from reports r join jobs j on j.organisation_id = r.organisation_id and j.id = r.job_id
      where j.machine_id = ? order by r.issued_at desc, r.revision desc, r.id desc`,
    [machineId],
  );
  const jobs = await db.raw(
    `select j.id, j.reference, j.purpose, j.state, j.starts_on as "startsOn", j.ends_on as "endsOn", c.name as "customerName"
       from jobs j left join customers c on c.organisation_id = j.organisation_id and c.id = j.customer_id
      where j.machine_id = ? order by j.starts_on desc, j.id desc`,
    [machineId],
  );
  return { reports: reports.rows, jobs: jobs.rows, drift: await machineDrift(db, machineId) };
}

/**
 * Only what was signed counts, each job by its newest signed revision. The figures are those that stand in the reports; the tolerance
 * is the newest one.
 */
async function machineDrift(db: Db, machineId: string): Promise<Drift[]> {
  const { rows } = await db.raw(
    `with signed as (
       select distinct on (r.job_id) r.id, r.number, r.model, coalesce(j.ends_on, j.starts_on) as measured_on
         from reports r join jobs j on j.organisation_id = r.organisation_id and j.id = r.job_id
        where j.machine_id = ? and r.state in ('signed', 'signed-with-remarks')
        order by r.job_id, r.revision desc)
     select s.id as "reportId", s.number, s.measured_on as "measuredOn", t.entry ->> 'key' as key, t.entry ->> 'title' as title,
            t.entry ->> 'component' as component, t.entry ->> 'asLeft' as "asLeftMm", t.entry ->> 'asLeftVerdict' as verdict,
            t.entry ->> 'toleranceMm' as "toleranceMm", t.entry ->> 'unit' as unit
       from signed s cross join lateral jsonb_array_elements(s.model::jsonb -> 'summary') with ordinality as t(entry, place)
      where t.entry ->> 'asLeft' is not null
      order by s.measured_on, s.id, t.place`,
    [machineId],
  );
  const tests = new Map<string, Drift>();
  for (const { key, title, component, toleranceMm, unit, ...point } of rows) {
    // Figures in another unit are no continuation: they begin a line of their own.
    const line = unit ? `${key} ${unit}` : key;
    const test: Drift = tests.get(line) ?? { key: line, title, component, toleranceMm, unit, points: [] };
    test.points.push(point);
    test.toleranceMm = toleranceMm;
    tests.set(line, test);
  }
  return [...tests.values()];
}
