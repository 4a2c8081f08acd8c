import type { Db } from '@/db/client';
import { type JobRow, lockJob } from '@/db/queries/jobs';
import { type Exclusion, insertPlan } from '@/db/queries/plans';
import { conflict, DomainError, type FieldError, notFound } from '@/lib/errors';
import { withContractTolerance } from '@/lib/planning/contract-tolerance';
import { isSettled } from '@/lib/planning/is-settled';
import { planSheets } from '@/lib/planning/plan-sheets';
import type { PlanForm } from '@/lib/schemas/job';
import { sameCode } from '@/lib/schemas/test-codes';
import { currentDefinitions } from '@/standards/registry';
import type { PlannedSheet } from '@/standards/types';
import { type OrganisationCatalogue, organisationCatalogue } from './organisation-catalogue';

/**
 * Every test that fits the job's machine, in working order.
 * @param own values and tests of the organisation, from `organisationCatalogue`; absent: the catalogue as it stands
 */
export const proposalsFor = (
  job: Pick<JobRow, 'makeUp' | 'codes'>,
  own: OrganisationCatalogue = { values: new Map(), ownDefinitions: [] },
): PlannedSheet[] =>
  planSheets(
    job.makeUp,
    [...currentDefinitions(), ...own.ownDefinitions].filter((definition) =>
      job.codes.some((entry) => sameCode(entry, definition)),
    ),
    own.values,
  );

/** The same with the organisation's values and own tests as they stand now. */
export const proposalsNow = async (db: Db, job: Pick<JobRow, 'makeUp' | 'codes'>): Promise<PlannedSheet[]> =>
  proposalsFor(job, await organisationCatalogue(db));

/**
 * Makes the plan of a job out of the proposals: what is taken becomes a sheet, everything else is kept with its reason.
 * @throws DomainError 422 when a proposal is neither taken nor given a reason; 409 when the job has a plan already
 */
export async function makePlan(db: Db, jobId: string, form: PlanForm): Promise<{ sheets: number }> {
  const job = await lockJob(db, jobId);
  if (!job) throw notFound('job');
  if (job.planMadeAt)
    throw conflict('This job has a plan already. Leave single tests out, or take them in again, on the plan.');
  const proposals = await proposalsNow(db, job);
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
  if (job.refuseUnconfirmed) errors.push(...unconfirmedErrors(form.include, byKey));
  if (errors.length > 0)
    throw new DomainError(422, 'The plan is not complete', errors.map((error) => error.detail).join(' '), errors);
  const sheets = proposals
    .filter((proposal) => taken.has(proposal.key))
    .map((proposal) => byKey.get(proposal.key) ?? proposal);
  await insertPlan(db, jobId, sheets, exclusions);
  return { sheets: sheets.length };
}

/** What a job that takes confirmed tolerances only cannot plan, each with what can be done. */
function unconfirmedErrors(include: string[], byKey: ReadonlyMap<string, PlannedSheet>): FieldError[] {
  return include.flatMap((key, index) => {
    const planned = byKey.get(key);
    if (!planned || isSettled(planned.tolerance)) return [];
    const detail = `“${planned.title}”: its tolerance is not confirmed. Confirm it in the catalogue, give the contract’s, or leave the test out with a reason.`;
    return [{ pointer: `/include/${index}`, detail }];
  });
}
