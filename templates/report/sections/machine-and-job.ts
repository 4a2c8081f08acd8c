import { openedWords } from '@/lib/reporting/opened-words';
import type { ReportModel } from '@/lib/reporting/report-model';
import { dateSpan } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import type { FlowItem } from '@/templates/report/flow/ops';
import { heading, type Kit, pairs } from '@/templates/report/flow/parts';

/** What was measured, for whom, by whom: only what is known. */
export function machineAndJob(kit: Kit, model: ReportModel): FlowItem[] {
  const words = REPORT_WORDS.machine;
  const { machine, customer, job, document } = model;
  const short: [string, string | null][] = [
    [words.kind, machine.kind],
    [words.reference, job.reference],
    [words.control, machine.control],
    [words.order, customer.order],
    [words.hours, machine.hours],
    [words.engineer, customer.engineer],
    [words.sizeClass, machine.sizeClass],
    [words.checkedBy, document.checkedBy],
    [words.site, machine.site],
    [words.issuedBy, document.issuedBy],
  ];
  const long: [string, string | null][] = [
    [words.purpose, `${job.purpose}, ${dateSpan(job.from, job.to)}`],
    [words.scope, job.scope],
    [words.codes, job.codes.join(', ')],
    [words.decisionRule, job.decisionRule],
    [words.makeUp, machine.components.map(({ id, what }) => `${id} ${what}`).join(' · ')],
    [words.opened, openedWords(machine.components)],
    [words.people, job.people.map(({ name, role }) => `${name}, ${role}`).join(' · ')],
  ];
  return [
    ...heading(kit, words.heading),
    pairs(kit, known(short), { columns: 2, labelPt: 92 }),
    pairs(kit, known(long), { columns: 1, labelPt: 92 }),
  ];
}

function known(entries: readonly [string, string | null][]): { label: string; value: string }[] {
  return entries.flatMap(([label, value]) => (value ? [{ label, value }] : []));
}
