import type { Db } from '@/db/client';
import { ruleSet } from '@/lib/evaluation/rule-set';
import { newId } from '@/lib/id';
import type { LeftOutReason } from '@/lib/schemas/job';
import type { PlannedSheet } from '@/standards/types';
import { own } from './jobs';
import { batches, insertPasses } from './passes';

export interface Exclusion {
  key: string;
  title: string;
  reason: LeftOutReason;
  text: string | null;
}

/**
 * Stores a plan: a sheet for each test that was taken, in working order, each with its first pass (as found) and the proposed
 * set-up; what was not taken, with its reason.
 */
export async function insertPlan(
  db: Db,
  jobId: string,
  sheets: PlannedSheet[],
  exclusions: Exclusion[],
): Promise<void> {
  const rows = sheets.map((sheet, index) => ({
    organisation_id: own(db),
    id: newId(),
    job_id: jobId,
    position: index + 1,
    key: sheet.key,
    definition: JSON.stringify(sheet.definition),
    title: sheet.title,
    component: JSON.stringify(sheet.component),
    depends_on: JSON.stringify(sheet.dependsOn),
    tolerance: sheet.tolerance && JSON.stringify(sheet.tolerance),
    direction: sheet.direction,
    set_up: JSON.stringify(sheet.setUp),
    own_definition: sheet.ownDefinition && JSON.stringify(sheet.ownDefinition),
    set_up_together: sheet.setUpTogether,
    minutes: sheet.minutes,
    working_step: sheet.workingStep,
    rule_set: ruleSet,
  }));
  for (const batch of batches(rows)) await db('sheets').insert(batch);
  await insertPasses(
    db,
    sheets.map(({ setUp }, index) => ({
      sheetId: rows[index]!.id,
      kind: 'as-found' as const,
      number: 1,
      linkedTo: null,
      setUp,
    })),
  );
  if (exclusions.length > 0) {
    await db('job_exclusions').insert(
      exclusions.map((exclusion) => ({
        organisation_id: own(db),
        id: newId(),
        job_id: jobId,
        key: exclusion.key,
        title: exclusion.title,
        reason: exclusion.reason,
        text: exclusion.text,
      })),
    );
  }
  await db('jobs')
    .where({ id: jobId })
    .update({ plan_made_at: db.fn.now(), version: db.raw('version + 1') });
}

export const listExclusions = (db: Db, jobId: string): Promise<Exclusion[]> =>
  db('job_exclusions').where({ job_id: jobId }).orderBy('id').select('key', 'title', 'reason', 'text');
