import type { z } from 'zod';
import type { LeftOutReason, planForm } from '@/lib/schemas/job';
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
}

export interface TestChoice {
  taken: boolean;
  reason: LeftOutReason | '';
  text: string;
  /** Open: a contract tolerance is being given. */
  contract: { tolerance: string; source: string } | null;
}

export type PlanChoices = Record<string, TestChoice>;

export const allTaken = (tests: ProposedTest[]): PlanChoices =>
  Object.fromEntries(tests.map(({ key }) => [key, { taken: true, reason: '' as const, text: '', contract: null }]));

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
  for (const { key, refused } of tests) {
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
    const toleranceUm = micrometres(choice.contract.tolerance);
    if ('problem' in toleranceUm) problems.push({ key, field: 'tolerance', message: toleranceUm.problem });
    if (choice.contract.source.trim() === '') {
      problems.push({ key, field: 'source', message: 'Say where it is agreed: order, item.' });
    }
    if ('value' in toleranceUm)
      form.contractTolerances.push({ key, toleranceUm: toleranceUm.value, source: choice.contract.source });
  }
  return { form, problems };
}

/** Typed in µm, or in another unit of length with the unit behind it. */
function micrometres(text: string): { value: string } | { problem: string } {
  const parsed = parseNumber(text, { defaultUnit: 'µm' });
  if (!parsed.ok) return { problem: parsed.problem };
  const unit = parsed.unit ?? 'µm';
  if (!convertible(unit, 'µm')) return { problem: `${unit} does not fit here. Write it in µm or mm.` };
  const value = convert(parsed.value, unit, 'µm');
  return value.startsWith('-') || !/[1-9]/.test(value) ? { problem: 'A tolerance is more than 0.' } : { value };
}
