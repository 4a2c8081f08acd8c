import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { PlanForm } from '@/lib/schemas/job';
import { own } from './jobs';

export interface PlanTemplate {
  id: string;
  manufacturer: string;
  model: string;
  name: string;
  /** A selection: keys that are taken, reasons of the others, contract tolerances. */
  choices: PlanForm;
  accountName: string;
  createdAt: Date;
}

const columns = {
  id: 'id',
  manufacturer: 'manufacturer',
  model: 'model',
  name: 'name',
  choices: 'choices',
  accountName: 'account_name',
  createdAt: 'created_at',
};

/** Newest first; of one maker and model where they are given, in any case of letters. */
export const listPlanTemplates = (
  db: Db,
  of: { manufacturer?: string; model?: string } = {},
): Promise<PlanTemplate[]> => {
  const query = db('plan_templates').orderBy('created_at', 'desc').select(columns);
  if (of.manufacturer !== undefined) query.whereRaw('lower(manufacturer) = lower(?)', [of.manufacturer]);
  if (of.model !== undefined) query.whereRaw('lower(model) = lower(?)', [of.model]);
  return query;
};

export async function keepPlanTemplate(
  db: Db,
  template: Omit<PlanTemplate, 'id' | 'createdAt'> & { fromJobId: string },
): Promise<string> {
  const id = newId();
  const row = await db('plan_templates')
    .insert({
      organisation_id: own(db),
      id,
      manufacturer: template.manufacturer,
      model: template.model,
      name: template.name,
      choices: JSON.stringify(template.choices),
      from_job_id: template.fromJobId,
      account_name: template.accountName,
    })
    .onConflict(db.raw('(organisation_id, lower(manufacturer), lower(model), lower(name))'))
    .merge({
      choices: JSON.stringify(template.choices),
      from_job_id: template.fromJobId,
      account_name: template.accountName,
      created_at: db.fn.now(),
      version: db.raw('plan_templates.version + 1'),
    })
    .returning('id');
  return row[0].id;
}

export const removePlanTemplate = async (db: Db, id: string): Promise<boolean> =>
  (await db('plan_templates').where({ id }).delete()) === 1;
