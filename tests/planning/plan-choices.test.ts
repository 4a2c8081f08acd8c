import { describe, expect, it } from 'vitest';
import { allTaken, chooseFor, type ProposedTest, planOf } from '@/components/jobs/plan-choices';
import { componentIds } from '@/components/tables/path-sheets';
import { planForm } from '@/lib/schemas/job';

const test = (key: string, components: string[]): ProposedTest => ({
  key,
  group: 'Spindles',
  title: key,
  components,
  code: 'ISO 13041-1:2020',
  tolerance: 'T 0.01 mm',
  foundBy: null,
  provenance: null,
  unconfirmed: false,
  refused: false,
});
const tests = [test('SP-1a:S1', ['S1']), test('SP-1b:S2', ['S2']), test('TU-3:T2:S2', ['T2', 'S2'])];

describe('the choices of a plan', () => {
  it('take everything to begin with', () => {
    const { form, problems } = planOf(tests, allTaken(tests));
    expect(form.include).toEqual(['SP-1a:S1', 'SP-1b:S2', 'TU-3:T2:S2']);
    expect(problems).toEqual([]);
    expect(planForm.safeParse(form).success).toBe(true);
  });

  it('want a reason for what is not taken', () => {
    const out = chooseFor(allTaken(tests), ['SP-1b:S2', 'TU-3:T2:S2'], { taken: false });
    expect(planOf(tests, out).problems.map(({ key, field }) => `${field} ${key}`)).toEqual([
      'reason SP-1b:S2',
      'reason TU-3:T2:S2',
    ]);
    const reasoned = chooseFor(out, ['SP-1b:S2', 'TU-3:T2:S2'], { reason: 'not-agreed', text: 'order 7' });
    const { form, problems } = planOf(tests, reasoned);
    expect(problems).toEqual([]);
    expect(form.exclusions).toEqual([
      { key: 'SP-1b:S2', reason: 'not-agreed', text: 'order 7' },
      { key: 'TU-3:T2:S2', reason: 'not-agreed', text: 'order 7' },
    ]);
  });

  it.each([
    ['8', '8'],
    ['7,5', '7.5'],
    ['0.012 mm', '12'],
    ['0.0005 in', '12.7'],
  ])('read a contract tolerance %s as %s µm', (typed, um) => {
    const choices = chooseFor(allTaken(tests), ['SP-1a:S1'], {
      contract: { tolerance: typed, source: 'order 7, item 2' },
    });
    expect(planOf(tests, choices).form.contractTolerances).toEqual([
      { key: 'SP-1a:S1', toleranceUm: um, source: 'order 7, item 2' },
    ]);
  });

  it.each(['', '0', '-3', '5 °C', '1.2.3'])('refuse “%s” as a contract tolerance', (typed) => {
    const choices = chooseFor(allTaken(tests), ['SP-1a:S1'], { contract: { tolerance: typed, source: 'order 7' } });
    expect(planOf(tests, choices).problems).toMatchObject([{ key: 'SP-1a:S1', field: 'tolerance' }]);
  });
});

it('a line of the path names only the components that its title does not', () => {
  expect(componentIds({ axis: 'Z1', spindle: 'S1' }, 'Z1 motion parallel to the axis of main spindle S1')).toBe('');
  expect(componentIds({ turret: 'T1', axis: 'Z1', spindle: 'S1' }, 'Two-collar cutting test, turret T1')).toBe(
    'Z1 · S1',
  );
});

it('a tolerance that is not confirmed stops a plan that wants it so, until the contract gives one or the test is left out', () => {
  const [one, other] = [test('SP-1a:S1', ['S1']), { ...test('SP-2a:S1', ['S1']), refused: true }];
  const problems = (change: Partial<ReturnType<typeof allTaken>[string]>) =>
    planOf([one, other], chooseFor(allTaken([one, other]), [other.key], change)).problems;
  expect(problems({})).toEqual([
    { key: other.key, field: 'unconfirmed', message: expect.stringMatching(/not confirmed/) },
  ]);
  expect(problems({ contract: { tolerance: '8', source: 'order 7714' } })).toEqual([]);
  expect(problems({ taken: false, reason: 'not-agreed' })).toEqual([]);
});
