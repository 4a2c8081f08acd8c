import { openedWords } from '@/lib/reporting/opened-words';
import type { ReportModel } from '@/lib/reporting/report-model';
import { dateSpan } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { Facts, known } from './facts';
import { ReportSection } from './report-section';

/** What was measured, for whom, by whom: only what is known. */
export function MachineAndJob({ model }: { model: ReportModel }) {
  const words = REPORT_WORDS.machine;
  const { machine, customer, job, document } = model;
  return (
    <ReportSection title={words.heading}>
      <Facts
        columns={2}
        facts={known([
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
        ])}
      />
      <Facts
        facts={known([
          [words.purpose, `${job.purpose}, ${dateSpan(job.from, job.to)}`],
          [words.scope, job.scope],
          [words.codes, job.codes.join(', ')],
          [words.decisionRule, job.decisionRule],
          [
            words.makeUp,
            machine.components.map(({ id, what }) => (what.includes(id) ? what : `${id} ${what}`)).join(' · '),
          ],
          [words.opened, openedWords(machine.components)],
          [words.people, job.people.map(({ name, role }) => `${name}, ${role}`).join(' · ')],
        ])}
      />
    </ReportSection>
  );
}
