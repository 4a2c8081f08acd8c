import type { Db } from '@/db/client';
import { type JobRow, lockJob } from '@/db/queries/jobs';
import { type Exclusion, insertPlan } from '@/db/queries/plans';
import { conflict, DomainError, type FieldError, notFound } from '@/lib/errors';
import { withContractTolerance } from '@/lib/planning/contract-tolerance';
import { planSheets } from '@/lib/planning/plan-sheets';
import type { PlanForm } from '@/lib/schemas/job';
import { currentDefinitions } from '@/standards/registry';
import type { PlannedSheet } from '@/standards/types';

/** Every test that fits the job's machine, in working order. */
export const proposalsFor = (job: Pick<JobRow, 'makeUp' | 'codes'>): PlannedSheet[] =>
  planSheets(
    job.makeUp,
    currentDefinitions().filter((definition) =>
      job.codes.some((entry) => entry.code === definition.code && entry.edition === definition.edition),
    ),
  );

/**
 * Makes the plan of a job out of the proposals: what is taken becomes a sheet, everything else is kept with its reason.
 * @throws DomainError 422 when a proposal is neither taken nor given a reason; 409 when the job has a plan already
 */
export async function makePlan(db: Db, jobId: string, form: PlanForm): Promise<{ sheets: number }> {
  const job = await lockJob(db, jobId);
  if (!job) throw notFound('job');
  if (job.planMadeAt)
    throw conflict('This job has a plan already. Leave single tests out, or take them in again, on the plan.');
  const proposals = proposalsFor(job);
  const byKey = new Map(proposals.map((proposal) => [proposal.key, proposal]));
  const taken = new Set(form.include);
  const errors: FieldError[] = [];
  form.include.forEach((key, index) => {
    if (!byKey.has(key))
      errors.push({ pointer: `/include/${index}`, detail: `There is no test “${key}” for this machine.` });
  });
  const reasons = new Map(form.exclusions.map((exclusion) => [exclusion.key, exclusion]));
  const exclusions: Exclusion[] = [];
  for (const proposal of proposals) {
    if (taken.has(proposal.key)) continue;
    const given = reasons.get(proposal.key);
    if (!given) errors.push({ pointer: '/exclusions', detail: `“${proposal.title}” is not taken: give a reason.` });
    else exclusions.push({ key: proposal.key, title: proposal.title, reason: given.reason, text: given.text });
  }
  form.contractTolerances.forEach((contract, index) => {
    const planned = byKey.get(contract.key);
    if (!planned)
      errors.push({
        pointer: `/contractTolerances/${index}/key`,
        detail: `There is no test “${contract.key}” for this machine.`,
      });
    else
      byKey.set(contract.key, withContractTolerance(planned, { baseUm: contract.toleranceUm, text: contract.source }));
  });
  if (errors.length > 0)
    throw new DomainError(422, 'The plan is not complete', errors.map((error) => error.detail).join(' '), errors);
  const sheets = proposals
    .filter((proposal) => taken.has(proposal.key))
    .map((proposal) => byKey.get(proposal.key) ?? proposal);
  await insertPlan(db, jobId, sheets, exclusions);
  return { sheets: sheets.length };
}
