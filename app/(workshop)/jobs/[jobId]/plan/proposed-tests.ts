import type { ProposedTest } from '@/components/jobs/plan-choices';
import type { StartChoice } from '@/components/jobs/plan-start';
import { toleranceWords } from '@/components/sheet/tolerance-words';
import { dayIn } from '@/lib/dates';
import { standsInFor } from '@/lib/planning/alternatives';
import { testHref } from '@/lib/planning/catalogue-with-own';
import { componentIds } from '@/lib/planning/component-words';
import { definitionOf } from '@/lib/planning/definition-of';
import { confirmationWords, isSettled } from '@/lib/planning/is-settled';
import { provenanceWords } from '@/lib/reporting/record-words';
import type { PlanMaking } from '@/lib/services/plan-making';
import { codeTitle } from '@/standards/registry';
import type { PlannedSheet, ShownIn } from '@/standards/types';
import { workingStepTitle } from '@/standards/working-order';

/** Proposals as the page shows them, in their order. */
export const proposedTests = (making: PlanMaking, refuseUnconfirmed: boolean): ProposedTest[] =>
  making.proposals.map((sheet) => proposedTest(sheet, making, refuseUnconfirmed));

function proposedTest(sheet: PlannedSheet, making: PlanMaking, refuseUnconfirmed: boolean): ProposedTest {
  const { tolerance } = sheet;
  const { shownIn = 'mm' } = definitionOf(sheet.definition, sheet.ownDefinition);
  const estimate = making.estimates[sheet.key];
  return {
    key: sheet.key,
    group: workingStepTitle(sheet.workingStep),
    title: sheet.title,
    components: componentIds(sheet.component),
    code: `${codeTitle(sheet.definition.code, sheet.definition.edition)} · ${sheet.definition.id}`,
    tolerance: toleranceWords(tolerance, sheet.direction, shownIn),
    foundBy: tolerance?.foundBy ?? null,
    provenance: tolerance && (confirmationWords(tolerance) ?? provenanceWords[tolerance.provenance.kind]),
    unconfirmed: tolerance?.provenance.kind === 'from-memory' && !tolerance.confirmation,
    refused: refuseUnconfirmed && !isSettled(tolerance),
    href: testHref(sheet.definition),
    setUp: sheet.setUpTogether,
    minutes: estimate?.minutes ?? sheet.minutes,
    fromPasses: estimate?.fromPasses ?? null,
    follows: making.follows[sheet.key] ?? null,
    standsInFor: standsInFor(sheet, making.proposals)?.title ?? null,
    contractUnit: contractUnits[shownIn],
  };
}

const contractUnits: Record<ShownIn, ProposedTest['contractUnit']> = {
  mm: 'µm',
  'mm/m': 'µm/m',
  '″': 'arcsec',
  items: null,
};

export const startChoices = ({ starts }: PlanMaking, timeZone: string): StartChoice[] =>
  starts.map(({ id, kind, name, serialNumber, on, choices }) => {
    const what = {
      template: `Template “${name}”`,
      'same-machine': `Plan of ${name}, this machine`,
      'same-model': `Plan of ${name}, ${serialNumber} of the same model`,
    }[kind];
    return { id, kind, words: `${what}, ${dayIn(on, timeZone)}`, choices };
  });
