import type { Db } from '@/db/client';
import { listPlanTemplates } from '@/db/queries/plan-templates';
import { type Exclusion, listExclusions } from '@/db/queries/plans';
import { listSheets, type SheetRow } from '@/db/queries/sheets';
import type { PlanForm } from '@/lib/schemas/job';

/** A template of the model, or the plan of an earlier job. */
export interface PlanStartSource {
  kind: 'template' | 'same-machine' | 'same-model';
  id: string;
  /** Name of the template, reference of the job. */
  name: string;
  /** Serial number, where it is another machine. */
  serialNumber: string | null;
  on: Date;
  plan: PlanForm | { sheets: SheetRow[]; exclusions: Exclusion[] };
}

const MOST_JOBS = 3;

/** Templates of the machine's model, then plans of earlier jobs: of the machine itself, then of others of its model. Newest first. */
export async function planStarts(db: Db, job: { id: string; machineId: string }): Promise<PlanStartSource[]> {
  const machine: { manufacturer: string; model: string } | undefined = await db('machines')
    .where({ id: job.machineId })
    .first('manufacturer', 'model');
  if (!machine) return [];
  const templates = await listPlanTemplates(db, machine);
  const earlier = [
    ...(await plansOf(db, job.id, (query) => query.where('jobs.machine_id', job.machineId))),
    ...(await plansOf(db, job.id, (query) =>
      query
        .whereNot('jobs.machine_id', job.machineId)
        .whereRaw('lower(machines.manufacturer) = lower(?) and lower(machines.model) = lower(?)', [
          machine.manufacturer,
          machine.model,
        ]),
    )),
  ];
  const starts: PlanStartSource[] = templates.map(({ id, name, createdAt, choices }) => ({
    kind: 'template',
    id,
    name,
    serialNumber: null,
    on: createdAt,
    plan: choices,
  }));
  for (const { id, reference, serialNumber, machineId, planMadeAt } of earlier) {
    const same = machineId === job.machineId;
    starts.push({
      kind: same ? 'same-machine' : 'same-model',
      id,
      name: reference,
      serialNumber: same ? null : serialNumber,
      on: planMadeAt,
      plan: { sheets: await listSheets(db, id), exclusions: await listExclusions(db, id) },
    });
  }
  return starts;
}

interface EarlierPlan {
  id: string;
  reference: string;
  machineId: string;
  serialNumber: string;
  planMadeAt: Date;
}

function plansOf(
  db: Db,
  but: string,
  which: (query: ReturnType<Db['queryBuilder']>) => ReturnType<Db['queryBuilder']>,
): Promise<EarlierPlan[]> {
  const query = db('jobs')
    .join('machines', 'machines.id', 'jobs.machine_id')
    .whereNot('jobs.id', but)
    .whereNotNull('jobs.plan_made_at')
    .orderBy('jobs.plan_made_at', 'desc')
    .limit(MOST_JOBS)
    .select({
      id: 'jobs.id',
      reference: 'jobs.reference',
      machineId: 'jobs.machine_id',
      serialNumber: 'machines.serial_number',
      planMadeAt: 'jobs.plan_made_at',
    });
  return which(query) as unknown as Promise<EarlierPlan[]>;
}
