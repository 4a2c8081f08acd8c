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
