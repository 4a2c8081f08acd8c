import type { Db } from '@/db/client';
import { readCursor, writeCursor } from '@/db/cursor';
import type { MachineKind } from '@/lib/schemas/make-up';

export interface MachineListItem {
  id: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  year: number | null;
  site: string | null;
  kind: MachineKind;
  customerName: string | null;
  lastReport: { id: string; number: string; revision: number; state: string } | null;
}

/** By manufacturer and serial number, each with its owner now and its newest report; keyset over the sort key. */
export async function machineList(
  db: Db,
  filter: { ownerId?: string; after?: string | null; limit: number },
): Promise<{ items: MachineListItem[]; next: string | null }> {
  const after = readCursor(filter.after, 3);
  const { rows } = await db.raw(
    `select m.id, m.manufacturer, m.model, m.serial_number as "serialNumber", m.year, m.site, m.kind,
            o.customer_name as "customerName", r.report as "lastReport"
       from machines m
       left join lateral (
         select w.customer_id, c.name as customer_name
           from machine_owners w join customers c on c.organisation_id = w.organisation_id and c.id = w.customer_id
          where w.organisation_id = m.organisation_id and w.machine_id = m.id and w.until_date is null
          limit 1) o on true
       left join lateral (
         select json_build_object('id', r.id, 'number', r.number, 'revision', r.revision, 'state', r.state) as report
           from jobs j join reports r on r.organisation_id = j.organisation_id and r.job_id = j.id
          where j.organisation_id = m.organisation_id and j.machine_id = m.id
          order by r.issued_at desc, r.revision desc limit 1) r on true
      where (:owner::uuid is null or o.customer_id = :owner)
        and (:id::uuid is null or (m.manufacturer, m.serial_number, m.id) > (:manufacturer, :serial, :id::uuid))
      order by m.manufacturer, m.serial_number, m.id limit :limit`,
    {
      owner: filter.ownerId ?? null,
      manufacturer: after?.[0] ?? null,
      serial: after?.[1] ?? null,
      id: after?.[2] ?? null,
      limit: filter.limit + 1,
    },
  );
  const items: MachineListItem[] = rows.slice(0, filter.limit);
  const last = items.at(-1);
  const more = rows.length > filter.limit && last;
  return { items, next: more ? writeCursor([last.manufacturer, last.serialNumber, last.id]) : null };
}
