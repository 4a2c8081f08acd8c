import type { Db } from '@/db/client';

export interface JobListItem {
  id: string;
  reference: string;
  purpose: string;
  state: 'open' | 'in-check' | 'issued' | 'closed';
  startsOn: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  machineId: string;
  customerName: string;
  planned: number;
  leftOut: number;
  measured: number;
  out: number;
}

/** Newest first; keyset over the id, which is in order of time. */
export async function listJobs(
  db: Db,
  filter: { state?: JobListItem['state']; machineId?: string; after: string | null; limit: number },
): Promise<{ items: JobListItem[]; next: string | null }> {
  const { rows } = await db.raw(
    `select j.id, j.reference, j.purpose, j.state, j.starts_on as "startsOn", m.manufacturer, m.model,
            m.serial_number as "serialNumber", m.id as "machineId", c.name as "customerName",
            coalesce(s.planned, 0)::int as planned, coalesce(s.left_out, 0)::int as "leftOut",
            coalesce(s.measured, 0)::int as measured, coalesce(s.out, 0)::int as out
       from jobs j
       join machines m on m.organisation_id = j.organisation_id and m.id = j.machine_id
       join customers c on c.organisation_id = j.organisation_id and c.id = j.customer_id
       left join lateral (
         select count(*) as planned, count(sh.left_out_reason) as left_out,
                count(f.verdict) filter (where sh.left_out_reason is null) as measured,
                count(*) filter (where sh.left_out_reason is null and f.verdict = 'out-of-tolerance') as out
           from sheets sh
           left join lateral (
             select r.verdict from passes p
               join pass_results r on r.organisation_id = p.organisation_id and r.pass_id = coalesce(p.linked_to, p.id)
              where p.organisation_id = sh.organisation_id and p.sheet_id = sh.id and p.kind <> 'adjusting' and r.state = 'complete'
              order by (p.kind = 'as-left') desc, p.number desc limit 1
           ) f on true
          where sh.organisation_id = j.organisation_id and sh.job_id = j.id
       ) s on true
      where (:state::text is null or j.state = :state) and (:machine::uuid is null or j.machine_id = :machine)
        and (:after::uuid is null or j.id < :after)
      order by j.id desc limit :limit`,
    { state: filter.state ?? null, machine: filter.machineId ?? null, after: filter.after, limit: filter.limit + 1 },
  );
  const items = rows.slice(0, filter.limit);
  return { items, next: rows.length > filter.limit ? items.at(-1).id : null };
}
