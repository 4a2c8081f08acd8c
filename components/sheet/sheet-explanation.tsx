'use client';

import { ExplanationTable } from '@/components/explain/explanation';
import { explainOutcome } from '@/lib/explaining/explain-outcome';
import { isJudged } from './result-words';
import { useEvaluated, useOpenPass } from './sheet-context';
import type { SheetData } from './sheet-data';

/** Explanation of the open set of readings; follows every keystroke. */
export function SheetExplanation({ data }: { data: SheetData }) {
  const { session, passId } = useOpenPass();
  const outcome = useEvaluated(session, passId, (evaluated) => evaluated.outcome);
  if (!isJudged(outcome)) return <p className="py-2">There is no result yet.</p>;
  const explanation = explainOutcome(outcome, data.rules, data.definition, session.cellsOf(passId));
  return (
    <div className="pb-4">
      <ExplanationTable explanation={explanation} methodsAt="/catalogue/methods" />
    </div>
  );
}
