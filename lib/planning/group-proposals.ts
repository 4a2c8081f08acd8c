import type { PlannedSheet } from '@/standards/types';
import { workingStepTitle } from '@/standards/working-order';

export interface ProposalGroup {
  workingStep: number;
  title: string;
  sheets: PlannedSheet[];
}

/** Proposals under the headings of the working order, kept in their order. */
export function groupProposals(proposals: readonly PlannedSheet[]): ProposalGroup[] {
  const groups = new Map<number, ProposalGroup>();
  for (const sheet of proposals) {
    const step = sheet.workingStep;
    const group = groups.get(step) ?? { workingStep: step, title: workingStepTitle(step), sheets: [] };
    group.sheets.push(sheet);
    groups.set(step, group);
  }
  return [...groups.values()];
}

/** Neighbours that are set up together, under its words; a sheet that stands alone is a run of its own, without words. */
export function setUpRuns<T extends { setUpTogether: string | null }>(
  sheets: readonly T[],
): { words: string | null; sheets: T[] }[] {
  const runs: { words: string | null; sheets: T[] }[] = [];
  for (const sheet of sheets) {
    const last = runs.at(-1);
    if (last && last.words === sheet.setUpTogether) last.sheets.push(sheet);
    else runs.push({ words: sheet.setUpTogether, sheets: [sheet] });
  }
  return runs;
}
