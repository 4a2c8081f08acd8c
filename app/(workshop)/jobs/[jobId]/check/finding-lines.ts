import type { FindingLine } from '@/components/report/findings-list';
import type { JobBoard } from '@/db/read-models/job-board';
import { componentWords } from '@/lib/planning/component-words';
import type { CheckFinding } from '@/lib/reporting/check-findings';

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
    const component = sheet ? componentWords(sheet.component, job.makeUp) : '';
    const title = sheet ? (sheet.title.includes(component) ? sheet.title : `${sheet.title}, ${component}`) : '';
    return {
      kind,
      weight,
      position,
      text,
      title: title || (jobTitles[kind] ?? 'The job'),
      href: sheet
        ? `/jobs/${job.id}/sheets/${sheet.id}`
        : kind === 'no-plan'
          ? `/jobs/${job.id}/plan`
          : `/jobs/${job.id}`,
    };
  });
}
