import type { Db } from '@/db/client';
import { readCursor, writeCursor } from '@/db/cursor';
import { type Match, matches, slipPatterns } from '@/lib/schemas/serial-match';
import { foldSerial } from '@/lib/schemas/serial-number';
import { type ArchiveReport, reportsOfMachines } from './archive-reports';

export interface ArchiveMachine {
  id: string;
  manufacturer: string;
  model: string;
  serialNumber: string;
  year: number | null;
  site: string | null;
  customerName: string | null;
}

export interface ArchiveHit {
  machine: ArchiveMachine;
  match: Match;
  /** Where it was found: the serial number, or something else that leads to the machine. */
  matchedOn: 'serial number' | 'report' | 'job' | 'order' | 'machine' | 'owner';
  reports: ArchiveReport[];
}

/** A slip in fewer signs than this would fit half of the register. */
const shortestSlip = 5;

/**
 * The archive's one box: by serial number first (exact, then without dashes and look-alikes, from its beginning, any part of it), and by
 * report number, job, order, machine or owner. Nothing of that: serial numbers that are one slip away. Only what the reader may see.
 */
export async function archiveSearch(
  db: Db,
  search: { q: string; after?: string | null; limit: number },
): Promise<{ items: ArchiveHit[]; next: string | null }> {
  const after = readCursor(search.after, 3);
  let rows = await findRows(db, search.q, after, search.limit);
  if (rows.length === 0 && !after) rows = await slipRows(db, foldSerial(search.q), search.limit);
  const page = rows.slice(0, search.limit);
  const reports = await reportsOfMachines(
    db,
    page.map(({ id }) => id),
  );
  const items = page.map(({ rank, folded: _, matchedOn, ...machine }) => ({
    machine,
    match: matches[rank] ?? 'part',
    matchedOn,
    reports: reports.filter(({ machineId }) => machineId === machine.id),
  }));
  const last = page.at(-1);
  const more = rows.length > search.limit && last;
  return { items, next: more ? writeCursor([String(last.rank), last.folded, last.id]) : null };
}

interface Row extends ArchiveMachine {
  rank: number;
  folded: string;
  matchedOn: ArchiveHit['matchedOn'];
}

const escapeLike = (text: string) => text.replace(/[\\%_]/g, (sign) => `\\${sign}`);

const machineColumns = `m.id, m.manufacturer, m.model, m.serial_number as "serialNumber", m.year, m.site, m.serial_folded as folded,
  (select c.name from machine_owners o join customers c on c.organisation_id = o.organisation_id and c.id = o.customer_id
    where o.organisation_id = m.organisation_id and o.machine_id = m.id and o.until_date is null limit 1) as "customerName"`;

/** `exact` 0, `prefix` 2, `part` 3 for a text that is compared as it stands, without case. */
const textRank = (column: string) =>
  `case when lower(${column}) = :text then 0 when lower(${column}) like :textPrefix then 2 else 3 end`;

async function findRows(db: Db, q: string, after: string[] | null, limit: number): Promise<Row[]> {
  const text = q.trim().toLowerCase();
  const folded = foldSerial(q);
  const { rows } = await db.raw(
    `with hits as (
       select m.id, case when lower(m.serial_number) = :text then 0 when m.serial_folded = :folded then 1
                         when m.serial_folded like :foldedPrefix then 2 else 3 end as rank, 'serial number' as found, 0 as place
         from machines m where :folded <> '' and m.serial_folded like :foldedPart
       union all
       select j.machine_id, ${textRank('r.number')}, 'report', 1
         from reports r join jobs j on j.organisation_id = r.organisation_id and j.id = r.job_id where lower(r.number) like :textPart
       union all
       select j.machine_id, ${textRank('j.reference')}, 'job', 2 from jobs j where lower(j.reference) like :textPart
       union all
       select j.machine_id, ${textRank('j.customer_order')}, 'order', 3 from jobs j where lower(j.customer_order) like :textPart
       union all
       select m.id, ${textRank("m.manufacturer || ' ' || m.model")}, 'machine', 4
         from machines m where lower(m.manufacturer || ' ' || m.model) like :textPart
       union all
       select o.machine_id, ${textRank('c.name')}, 'owner', 5
         from machine_owners o join customers c on c.organisation_id = o.organisation_id and c.id = o.customer_id
        where lower(c.name) like :textPart),
     best as (select distinct on (id) id, rank, found from hits order by id, rank, place)
     select ${machineColumns}, b.rank, b.found as "matchedOn"
       from best b join machines m on m.organisation_id = app_organisation() and m.id = b.id
      where :id::uuid is null or (b.rank, m.serial_folded, m.id) > (:rank::int, :afterFolded, :id::uuid)
      order by b.rank, m.serial_folded, m.id limit :limit`,
    {
      text,
      textPrefix: `${escapeLike(text)}%`,
      textPart: `%${escapeLike(text)}%`,
      folded,
      foldedPrefix: `${escapeLike(folded)}%`,
      foldedPart: `%${escapeLike(folded)}%`,
      rank: after?.[0] ?? null,
      afterFolded: after?.[1] ?? null,
      id: after?.[2] ?? null,
      limit: limit + 1,
    },
  );
  return rows;
}

/** Slips are few, so they come on one page. */
async function slipRows(db: Db, folded: string, limit: number): Promise<Row[]> {
  if (folded.length < shortestSlip) return [];
  const { rows } = await db.raw(
    `select ${machineColumns}, 4 as rank, 'serial number' as "matchedOn"
       from machines m where m.serial_folded like any (?::text[]) order by m.serial_folded, m.id limit ?`,
    [slipPatterns(folded), limit],
  );
  return rows;
}
