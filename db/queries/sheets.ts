import type { Db } from '@/db/client';
import type { LeftOutReason } from '@/lib/schemas/job';
import type {
  BoundComponent,
  CellDefault,
  DependsOn,
  Direction,
  PlannedTolerance,
  TestDefinition,
} from '@/standards/types';

export interface SheetRow {
  id: string;
  jobId: string;
  position: number;
  key: string;
  definition: { id: string; code: string; edition: string; version: number };
  title: string;
  component: BoundComponent;
  dependsOn: DependsOn;
  tolerance: PlannedTolerance | null;
  direction: Direction;
  setUp: Record<string, CellDefault>;
  /** The organisation's own definition, whole; null: one of the catalogue. */
  ownDefinition: TestDefinition | null;
  /** Rules by which it was begun. */
  ruleSet: string;
  setUpTogether: string | null;
  /** null, as the step: planned before these were kept. */
  minutes: number | null;
  workingStep: number | null;
  leftOutReason: LeftOutReason | null;
  leftOutText: string | null;
  leftOutBy: string | null;
  leftOutAt: Date | null;
  remark: string | null;
  version: number;
}

export const sheetColumns = {
  id: 'sheets.id',
  jobId: 'sheets.job_id',
  position: 'sheets.position',
  key: 'sheets.key',
  definition: 'sheets.definition',
  title: 'sheets.title',
  component: 'sheets.component',
  dependsOn: 'sheets.depends_on',
  tolerance: 'sheets.tolerance',
  direction: 'sheets.direction',
  setUp: 'sheets.set_up',
  ownDefinition: 'sheets.own_definition',
  setUpTogether: 'sheets.set_up_together',
  minutes: 'sheets.minutes',
  workingStep: 'sheets.working_step',
  ruleSet: 'sheets.rule_set',
  leftOutReason: 'sheets.left_out_reason',
  leftOutText: 'sheets.left_out_text',
  leftOutBy: 'sheets.left_out_by',
  leftOutAt: 'sheets.left_out_at',
  remark: 'sheets.remark',
  version: 'sheets.version',
};

export const listSheets = (db: Db, jobId: string): Promise<SheetRow[]> =>
  db('sheets').where({ job_id: jobId }).orderBy('position').select(sheetColumns);

export const findSheet = (db: Db, id: string): Promise<SheetRow | undefined> =>
  db('sheets').where({ id }).first(sheetColumns);

/** One writer at a time: operations on a sheet are applied one batch after another. */
export const lockSheet = (db: Db, id: string): Promise<SheetRow | undefined> =>
  db('sheets').where({ id }).forUpdate().first(sheetColumns);

export async function updateSheet(
  db: Db,
  id: string,
  version: number,
  change: { remark?: string | null; leftOut?: { reason: LeftOutReason; text: string | null } | null; by: string },
): Promise<boolean> {
  const columns: Record<string, unknown> = { version: version + 1 };
  if (change.remark !== undefined) columns.remark = change.remark;
  if (change.leftOut !== undefined) {
    columns.left_out_reason = change.leftOut?.reason ?? null;
    columns.left_out_text = change.leftOut?.text ?? null;
    columns.left_out_by = change.leftOut ? change.by : null;
    columns.left_out_at = change.leftOut ? db.fn.now() : null;
  }
  return (await db('sheets').where({ id, version }).update(columns)) === 1;
}
