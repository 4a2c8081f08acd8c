import type { FindingLine } from '@/components/report/findings-list';
import type { JobBoard } from '@/db/read-models/job-board';
import { componentWords } from '@/lib/planning/component-words';
import type { CheckFinding } from '@/lib/reporting/check-findings';
import { titleWithComponent } from '@/lib/reporting/title-with-component';

const jobTitles: Partial<Record<CheckFinding['kind'], string>> = {
  'no-plan': 'Plan',
  'no-temperature': 'Temperatures',
  'temperature-far-off': 'Temperatures',
  'no-conditions': 'Conditions',
  'tolerance-unconfirmed': 'Tolerances',
};

/** Findings as lines with a title and the way to where they are put right. */
export function findingLines(findings: CheckFinding[], board: JobBoard): FindingLine[] {
  const { job } = board;
  const sheets = new Map(board.sheets.map((sheet) => [sheet.id, sheet]));
  return findings.map(({ kind, weight, sheetId, position, text }) => {
    const sheet = sheetId === null ? undefined : sheets.get(sheetId);
    return {
      kind,
      weight,
      position,
      text,
      title: sheet
        ? titleWithComponent(sheet.title, componentWords(sheet.component, job.makeUp))
        : (jobTitles[kind] ?? 'The job'),
      href: sheet
        ? `/jobs/${job.id}/sheets/${sheet.id}`
        : kind === 'no-plan'
          ? `/jobs/${job.id}/plan`
          : `/jobs/${job.id}`,
    };
  });
}
