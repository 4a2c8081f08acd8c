import type { CheckCounts, Counts } from './report-model';
import type { StoredPass } from './stored-job';

/** Words of the report that depend on what was found; the fixed ones stand in words.ts. Another language is another file of this shape. */

export const passKindWords = (pass: Pick<StoredPass, 'kind' | 'number'>): string => {
  if (pass.kind === 'as-found') return 'as found';
  if (pass.kind === 'as-left') return pass.number > 1 ? `as left (${pass.number})` : 'as left';
  return `adjusting ${pass.number}`;
};

export const linkedWords = 'As left = as found: nothing was done, the readings as found stand.';

const plural = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** The one sentence that the customer reads first. */
export function headlineWords(counts: Counts, outRemarked: number, outAccepted = 0): string {
  if (counts.planned === 0) return 'No test is planned yet.';
  const parts = [`${counts.within} of ${plural(counts.judged, 'judged test', 'judged tests')} within tolerance`];
  if (counts.out > 0) parts.push(outWords(counts.out, outRemarked, outAccepted));
  if (counts.undecided > 0) parts.push(`${counts.undecided} undecided`);
  if (counts.forInformation > 0) parts.push(`${counts.forInformation} for information`);
  if (counts.leftOut > 0) parts.push(`${counts.leftOut} left out`);
  if (counts.notMeasured > 0) parts.push(`${counts.notMeasured} not measured`);
  return `${parts.join('; ')}.`;
}

function outWords(out: number, remarked: number, accepted: number): string {
  const all = (count: number) => (count === out ? '' : `${count} `);
  if (accepted > 0) return `${out} out of tolerance, ${all(accepted)}accepted with remark`;
  return `${out} out of tolerance${remarked > 0 ? `, ${all(remarked)}with remark` : ''}`;
}

/** `Function checks: 5 of 7 in order, 1 not in order, 1 left out.`; '' where none is planned. */
export function checkCountWords(checks: CheckCounts | undefined): string {
  if (!checks) return '';
  const parts = [
    `${checks.inOrder} of ${checks.planned} in order`,
    ...(checks.notInOrder > 0 ? [`${checks.notInOrder} not in order`] : []),
    ...(checks.leftOut > 0 ? [`${checks.leftOut} left out`] : []),
    ...(checks.notDone > 0 ? [`${checks.notDone} not done`] : []),
  ];
  return `Function checks: ${parts.join(', ')}.`;
}

export const conditionLabels = {
  warmUp: 'Warm-up',
  compensation: 'Compensation',
  level: 'Level',
  coolant: 'Coolant',
  notes: 'Notes',
} as const;

export const statementWords =
  'The results hold for this machine and for the conditions recorded here. Verdicts compare unrounded results with the tolerances named; a ' +
  'tolerance marked “from memory, to be confirmed” is no figure quoted from a standard. This report replaces no inspection required by law.';

export const roleWords = {
  inspector: 'Measured by',
  reviewer: 'Checked and issued by',
  customer: 'For the customer',
} as const;

export const signedOutcomeWords: Record<string, string> = {
  'handed-in': 'handed in for the check, signed in',
  checked: 'checked and issued',
  accept: 'accepted',
  'accept-with-remarks': 'accepted with remarks',
  refuse: 'refused',
};

export const provenanceWords = {
  published: 'published',
  'common-practice': 'common practice, no published source',
  'from-memory': 'from memory, to be confirmed',
  derived: 'derived',
  builder: 'by the machine’s builder',
  contract: 'by contract',
} as const;

export const criterionWords: Record<string, string> = {
  'swing-over-bed': 'swing over bed',
  'bar-diameter': 'nominal bar diameter',
  'chuck-diameter': 'nominal chuck diameter',
};
