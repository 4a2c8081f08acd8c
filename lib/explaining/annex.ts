import { definitionOf } from '@/lib/planning/definition-of';
import { passKindWords } from '@/lib/reporting/record-words';
import type { AnnexEntry } from '@/lib/reporting/report-model';
import type { StoredJob, StoredSheet } from '@/lib/reporting/stored-job';
import { explainOutcome } from './explain-outcome';

/** Every result of a job with the way to it, in the order of the report; linked sets stand for the ones that they are linked to. */
export function annex(stored: Pick<StoredJob, 'sheets' | 'job'>): AnnexEntry[] {
  return stored.sheets.flatMap((sheet) => (sheet.leftOutReason ? [] : entriesOf(sheet, stored.job.decisionRule)));
}

function entriesOf(sheet: StoredSheet, decisionRule: 'simple' | 'guarded'): AnnexEntry[] {
  const definition = definitionOf(sheet.definition, sheet.ownDefinition);
  const rules = { definition: sheet.definition, tolerance: sheet.tolerance, direction: sheet.direction, decisionRule };
  return sheet.passes.flatMap((pass) => {
    if (!pass.result || pass.linkedTo) return [];
    return {
      sheetOrder: sheet.position,
      title: sheet.title,
      passWords: passKindWords(pass),
      explanation: explainOutcome(pass.result.outcome, rules, definition, pass.cells),
    };
  });
}
