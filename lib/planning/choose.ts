import type { PlannedSheet } from '@/standards/types';
import { workingStepTitle } from '@/standards/working-order';

/** Why a proposed test is not measured; it prints on the report. */
export const leftOutReasons = {
  'not-applicable': 'not applicable',
  'not-agreed': 'not agreed',
  'not-possible': 'not possible',
  'not-touched-by-the-work': 'not touched by the work',
} as const;
export type LeftOutReason = keyof typeof leftOutReasons;

export type Choice = { kind: 'measure' } | { kind: 'leave-out'; reason: LeftOutReason; text: string | null };
/** By key of the sheet; a proposal without an entry is measured. */
export type Choices = Record<string, Choice>;

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

export interface ChosenPlan {
  measured: PlannedSheet[];
  leftOut: { sheet: PlannedSheet; reason: LeftOutReason; text: string | null }[];
}

/** Splits the proposals by what was chosen; nothing is dropped silently. */
export function choosePlan(proposals: readonly PlannedSheet[], choices: Choices): ChosenPlan {
  const plan: ChosenPlan = { measured: [], leftOut: [] };
  for (const sheet of proposals) {
    const choice = choices[sheet.key];
    if (choice?.kind === 'leave-out') plan.leftOut.push({ sheet, reason: choice.reason, text: choice.text });
    else plan.measured.push(sheet);
  }
  return plan;
}
