import type { z } from 'zod';
import type { LeftOutReason, PlanForm, planForm } from '@/lib/schemas/job';
import { convert, convertible } from '@/lib/units/convert';
import { parseNumber } from '@/lib/units/parse-number';

/** One proposed test, as the page for making the plan shows it. */
export interface ProposedTest {
  key: string;
  group: string;
  title: string;
  /** Ids of its components, to choose all tests of one of them. */
  components: string[];
  code: string;
  /** `T 0.015 mm over 300 mm`. */
  tolerance: string;
  foundBy: string | null;
  provenance: string | null;
  unconfirmed: boolean;
  /** The job takes confirmed tolerances only, and this one is not. */
  refused: boolean;
  /** Page of the test in the catalogue. */
  href: string;
  /** What stands set up while it is measured; null: it is set up on its own. */
  setUp: string | null;
  minutes: number;
  /** Sets of readings that the minutes are the median of; null: our own estimate. */
  fromPasses: number | null;
  /** Why it follows from what was opened; null: it does not, or nothing is said. */
  follows: string[] | null;
  /** Title of the proposed test that measures the same another way, where this one only stands in for it. */
  standsInFor: string | null;
  /** Unit in which a contract's figure is typed; null: the test has no tolerance. */
  contractUnit: 'µm' | 'µm/m' | 'arcsec' | null;
}

export interface TestChoice {
  taken: boolean;
  reason: LeftOutReason | '';
  text: string;
  /** Open: a contract tolerance is being given. */
  contract: { tolerance: string; source: string } | null;
}

export type PlanChoices = Record<string, TestChoice>;

/** Everything is taken, but of two ways to measure the same thing only the usual one. */
export const firstChoices = (tests: ProposedTest[]): PlanChoices =>
  Object.fromEntries(tests.map((test) => [test.key, firstChoice(test)]));

function firstChoice({ standsInFor }: ProposedTest): TestChoice {
  if (standsInFor === null) return { taken: true, reason: '', text: '', contract: null };
  return { taken: false, reason: 'not-applicable', text: `measured by: ${standsInFor}`, contract: null };
}

/** What another plan took; tests that it does not know stay as they are to begin with. */
export function choicesFrom(tests: ProposedTest[], { include, exclusions, contractTolerances }: PlanForm): PlanChoices {
  const taken = new Set(include);
  const out = new Map(exclusions.map((one) => [one.key, one]));
  const agreed = new Map(contractTolerances.map((one) => [one.key, one]));
  return Object.fromEntries(
    tests.map((test) => {
      const { key, contractUnit } = test;
      const exclusion = out.get(key);
      if (exclusion)
        return [key, { taken: false, reason: exclusion.reason, text: exclusion.text ?? '', contract: null }];
      if (!taken.has(key)) return [key, firstChoice(test)];
      const contract = agreed.get(key);
      // A plan keeps angles in µm/m, whatever they were typed in.
      const unit = contractUnit === 'arcsec' ? ' µm/m' : '';
      return [
        key,
        {
          taken: true,
          reason: '' as const,
          text: '',
          contract: contract ? { tolerance: `${contract.toleranceUm}${unit}`, source: contract.source } : null,
        },
      ];
    }),
  );
}

/** What follows from what was opened is taken; the rest was not touched by the work. Contract tolerances stay. */
export function choicesByOpened(tests: ProposedTest[], choices: PlanChoices): PlanChoices {
  const next = { ...choices };
  for (const test of tests) {
    const first = firstChoice(test);
    const contract = choices[test.key]?.contract ?? null;
    if (test.follows) next[test.key] = { ...first, contract: first.taken ? contract : null };
    else next[test.key] = { taken: false, reason: 'not-touched', text: '', contract: null };
  }
  return next;
}

/** The same choice for several tests: a group, or everything of a component. */
export function chooseFor(choices: PlanChoices, keys: string[], change: Partial<TestChoice>): PlanChoices {
  const next = { ...choices };
  for (const key of keys) {
    const before = next[key];
    if (before) next[key] = { ...before, ...change };
  }
  return next;
}

export interface PlanProblem {
  key: string;
  field: 'reason' | 'tolerance' | 'source' | 'unconfirmed';
  message: string;
}

const refusedWords =
  'its tolerance is not confirmed, and this job takes confirmed ones only. Confirm it in the catalogue, give the contract’s, or leave the test out.';

/** The form that is sent, and what is still wrong with it; both in the order of the proposals. Pure. */
export function planOf(
  tests: ProposedTest[],
  choices: PlanChoices,
): { form: z.input<typeof planForm>; problems: PlanProblem[] } {
  const form: Required<z.input<typeof planForm>> = { include: [], exclusions: [], contractTolerances: [] };
  const problems: PlanProblem[] = [];
  for (const { key, refused, contractUnit } of tests) {
    const choice = choices[key];
    if (!choice) continue;
    if (!choice.taken) {
      if (choice.reason === '') problems.push({ key, field: 'reason', message: 'Not taken: give a reason.' });
      else form.exclusions.push({ key, reason: choice.reason, text: choice.text });
      continue;
    }
    form.include.push(key);
    if (!choice.contract) {
      if (refused) problems.push({ key, field: 'unconfirmed', message: refusedWords });
      continue;
    }
    const toleranceUm = contractFigure(choice.contract.tolerance, contractUnit ?? 'µm');
    if ('problem' in toleranceUm) problems.push({ key, field: 'tolerance', message: toleranceUm.problem });
    if (choice.contract.source.trim() === '') {
      problems.push({ key, field: 'source', message: 'Say where it is agreed: order, item.' });
    }
    if ('value' in toleranceUm)
      form.contractTolerances.push({ key, toleranceUm: toleranceUm.value, source: choice.contract.source });
  }
  return { form, problems };
}

/** Typed in the test's own unit, or in another of the same kind with the unit behind it; answered in µm, an angle in µm/m. */
function contractFigure(text: string, typedIn: 'µm' | 'µm/m' | 'arcsec'): { value: string } | { problem: string } {
  const parsed = parseNumber(text, { defaultUnit: typedIn });
  if (!parsed.ok) return { problem: parsed.problem };
  const unit = parsed.unit ?? typedIn;
  const kept = typedIn === 'µm' ? 'µm' : 'µm/m';
  const allowed = typedIn === 'µm' ? 'µm or mm' : 'µm/m, mm/m or arcsec';
  if (!convertible(unit, kept)) return { problem: `${unit} does not fit here. Write it in ${allowed}.` };
  const value = convert(parsed.value, unit, kept);
  return value.startsWith('-') || !/[1-9]/.test(value) ? { problem: 'A tolerance is more than 0.' } : { value };
}
