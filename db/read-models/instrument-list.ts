import type { Db } from '@/db/client';
import { readCursor, writeCursor } from '@/db/cursor';
import { type CalibrationState, calibrationState } from '@/lib/schemas/calibration-state';

export interface InstrumentListItem {
  id: string;
  number: string;
  name: string;
  kind: string;
  resolution: string | null;
  resolutionUnit: string | null;
  retired: boolean;
  certificate: string | null;
  /** Last valid day of the newest certificate. */
  dueOn: string | null;
  state: CalibrationState;
}

/** The register by number, each with its newest certificate and what that means today. */
export async function instrumentList(
  db: Db,
  filter: { today: string; after?: string | null; limit: number },
): Promise<{ items: InstrumentListItem[]; next: string | null }> {
  const after = readCursor(filter.after, 3);
  const { rows } = await db.raw(
    `select i.id, i.number, i.name, i.kind, i.resolution, i.resolution_unit as "resolutionUnit",
            i.retired_at is not null as retired, c.certificate, c.due_on as "dueOn"
       from instruments i
       left join lateral (
         select certificate, due_on from calibrations c
          where c.organisation_id = i.organisation_id and c.instrument_id = i.id
          order by due_on desc, id desc limit 1) c on true
      where :id::uuid is null or ((i.retired_at is not null)::text, i.number, i.id) > (:retired, :number, :id::uuid)
      order by (i.retired_at is not null)::text, i.number, i.id limit :limit`,
    { retired: after?.[0] ?? null, number: after?.[1] ?? null, id: after?.[2] ?? null, limit: filter.limit + 1 },
  );
  const items: InstrumentListItem[] = rows
    .slice(0, filter.limit)
    .map((row: Omit<InstrumentListItem, 'state'>) => ({ ...row, state: calibrationState(row.dueOn, filter.today) }));
  const last = items.at(-1);
  const more = rows.length > filter.limit && last;
  return { items, next: more ? writeCursor([String(last.retired), last.number, last.id]) : null };
}
