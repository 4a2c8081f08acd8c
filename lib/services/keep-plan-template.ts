import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { findJob } from '@/db/queries/jobs';
import { keepPlanTemplate } from '@/db/queries/plan-templates';
import { listExclusions } from '@/db/queries/plans';
import { listSheets } from '@/db/queries/sheets';
import type { Viewer } from '@/lib/auth/viewer';
import { conflict, notFound } from '@/lib/errors';
import { choicesOfPlan } from '@/lib/planning/choices-of-plan';

/** Keeps the plan of a job as a template for machines of the same maker and model. */
export async function keepTemplateOf(db: Db, viewer: Viewer, form: { jobId: string; name: string }): Promise<string> {
  const job = await findJob(db, form.jobId);
  if (!job) throw notFound('job');
  if (!job.planMadeAt) throw conflict('This job has no plan yet. Make the plan, then keep it as a template.');
  const machine: { manufacturer: string; model: string } = await db('machines')
    .where({ id: job.machineId })
    .first('manufacturer', 'model');
  const choices = choicesOfPlan({
    sheets: await listSheets(db, job.id),
    exclusions: await listExclusions(db, job.id),
  });
  const id = await keepPlanTemplate(db, {
    manufacturer: machine.manufacturer,
    model: machine.model,
    name: form.name,
    choices,
    accountName: viewer.name,
    fromJobId: job.id,
  });
  await recordEvent(db, viewer, {
    action: 'plan-template.kept',
    subjectType: 'plan-template',
    subjectId: id,
    detail: { name: form.name, from: job.reference },
  });
  return id;
}
