import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { SheetOutcome, Verdict } from '@/lib/sheet/types';
import { own } from './jobs';

export type JudgedOutcome = Extract<SheetOutcome, { state: 'partial' | 'complete' }>;

export interface ResultRow {
  passId: string;
  state: 'partial' | 'complete';
  deviationUm: string;
  toleranceUm: string | null;
  verdict: Verdict;
  displayedUm: string;
  displayedMm: string;
  outcome: JudgedOutcome;
  ruleSet: string;
}

export const listResults = (db: Db, passIds: string[]): Promise<ResultRow[]> =>
  db('pass_results').whereIn('pass_id', passIds).select({
    passId: 'pass_id',
    state: 'state',
    deviationUm: 'deviation_um',
    toleranceUm: 'tolerance_um',
    verdict: 'verdict',
    displayedUm: 'displayed_um',
    displayedMm: 'displayed_mm',
    outcome: 'outcome',
    ruleSet: 'rule_set',
  });

/** Keeps what a pass comes to now; nothing, while it cannot be evaluated. */
export async function keepResult(db: Db, passId: string, ruleSet: string, outcome: SheetOutcome): Promise<void> {
  if (outcome.state !== 'partial' && outcome.state !== 'complete') {
    await db('pass_results').where({ pass_id: passId }).delete();
    return;
  }
  const { judgement, displayed, result } = outcome;
  const row = {
    state: outcome.state,
    deviation_um: result.deviation,
    tolerance_um: judgement.toleranceUm,
    limit_um: judgement.limitUm,
    margin_um: judgement.marginUm,
    verdict: judgement.verdict,
    displayed_um: displayed.textUm,
    displayed_mm: displayed.textMm,
    outcome: JSON.stringify(outcome),
    rule_set: ruleSet,
    computed_at: db.fn.now(),
  };
  await db('pass_results')
    .insert({ organisation_id: own(db), id: newId(), pass_id: passId, ...row })
    .onConflict(['organisation_id', 'pass_id'])
    .merge(Object.keys(row));
}
