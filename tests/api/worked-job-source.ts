import seed from '@/db/seeds/data/worked-job.json';
import type { EvaluationInput } from '@/lib/evaluation';
import type { Unit } from '@/lib/units/unit';
import job from '@/tests/evaluation/data/worked-job.json';

/**
 * The worked job with its expected figures, which follow by hand from the readings. Made up by us for this product: it holds the way
 * of the figures through the database and into the report, and is no outside check of the formulas.
 */
export interface SourcePass {
  id: string;
  kind: 'as-found' | 'adjusting' | 'as-left';
  linkTo?: string;
  takenAt: string;
  by: string;
  instruments?: string[];
  readings?: {
    at: string;
    text: string;
    unit: Unit;
    history?: { text: string; at: string; by: string; reason?: string }[];
  }[];
  request: EvaluationInput;
  expected: { deviation: string };
  /** Absent where there is no tolerance. */
  conformity?: { expected: { limit: string; margin: string } };
  verdict: string;
  display: { value: string; extraDigits?: number };
}

export interface SourceSheet {
  id: string;
  key: string;
  component: object;
  dependsOn: object;
  tolerance: { value: string; provenance: { sourceKind: 'shop' | 'contract'; text: string } } | null;
  direction: string | null;
  leftOut?: { reason: string; text: string };
  passes: SourcePass[];
}

export interface SourceRow {
  sheet: string;
  asFound: { pass: string; verdict: string } | null;
  asLeft: { pass: string; linked: boolean; verdict: string } | null;
  tolerance: string | null;
}

/** The job's tests in its own order, under the keys of our plan. */
export const sourceSheets = seed.sheets.map(({ id, key }) => {
  const planned = job.plan.find((sheet) => sheet.id === id);
  if (!planned) throw new Error(`the job has no ${id}`);
  return { ...planned, passes: planned.passes ?? [], key } as unknown as SourceSheet;
});

export const sourceRows = sourceSheets.map(({ id }) => {
  const row = job.final.rows.find(({ sheet }) => sheet === id);
  if (!row) throw new Error(`the job's outcome has no ${id}`);
  return { asFound: null, asLeft: null, tolerance: null, ...row } as unknown as SourceRow;
});

export const sourceOrder = job.plan.map(({ id }) => id);

export { job as sourceJob, seed as sourceSeed };
