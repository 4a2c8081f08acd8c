import { describe, expect, it } from 'vitest';
import { filterTests } from '@/components/jobs/filter-tests';
import {
  choicesByOpened,
  choicesFrom,
  chooseFor,
  firstChoices,
  type ProposedTest,
  planOf,
} from '@/components/jobs/plan-choices';
import { takenOverWords } from '@/components/jobs/plan-start';
import { componentIds } from '@/components/tables/path-sheets';
import { planForm } from '@/lib/schemas/job';

const test = (key: string, components: string[], change: Partial<ProposedTest> = {}): ProposedTest => ({
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
  href: '/catalogue/iso-13041-1-2020/SP-1a',
  setUp: null,
  minutes: 15,
  fromPasses: null,
  follows: null,
  standsInFor: null,
  contractUnit: 'µm',
  ...change,
});
const tests = [test('SP-1a:S1', ['S1']), test('SP-1b:S2', ['S2']), test('TU-3:T2:S2', ['T2', 'S2'])];

describe('the choices of a plan', () => {
  it('take everything to begin with', () => {
    const { form, problems } = planOf(tests, firstChoices(tests));
    expect(form.include).toEqual(['SP-1a:S1', 'SP-1b:S2', 'TU-3:T2:S2']);
    expect(problems).toEqual([]);
    expect(planForm.safeParse(form).success).toBe(true);
  });

  it('want a reason for what is not taken', () => {
    const out = chooseFor(firstChoices(tests), ['SP-1b:S2', 'TU-3:T2:S2'], { taken: false });
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
    const choices = chooseFor(firstChoices(tests), ['SP-1a:S1'], {
      contract: { tolerance: typed, source: 'order 7, item 2' },
    });
    expect(planOf(tests, choices).form.contractTolerances).toEqual([
      { key: 'SP-1a:S1', toleranceUm: um, source: 'order 7, item 2' },
    ]);
  });

  it.each(['', '0', '-3', '5 °C', '1.2.3'])('refuse “%s” as a contract tolerance', (typed) => {
    const choices = chooseFor(firstChoices(tests), ['SP-1a:S1'], { contract: { tolerance: typed, source: 'order 7' } });
    expect(planOf(tests, choices).problems).toMatchObject([{ key: 'SP-1a:S1', field: 'tolerance' }]);
  });
});

describe('another way to measure the same', () => {
  const two = [test('AX-5:Z1', ['Z1']), test('AX-5L:Z1', ['Z1'], { standsInFor: 'Straightness of Z1' })];

  it('is not taken to begin with, and says what is', () => {
    const { form, problems } = planOf(two, firstChoices(two));
    expect(problems).toEqual([]);
    expect(form.include).toEqual(['AX-5:Z1']);
    expect(form.exclusions).toEqual([
      { key: 'AX-5L:Z1', reason: 'not-applicable', text: 'measured by: Straightness of Z1' },
    ]);
  });
});

describe('a plan that begins from another', () => {
  const start = {
    include: ['SP-1a:S1', 'XX-1:S9'],
    exclusions: [{ key: 'SP-1b:S2', reason: 'not-possible' as const, text: 'no room' }],
    contractTolerances: [{ key: 'SP-1a:S1', toleranceUm: '4', source: 'order 6, item 1' }],
  };

  it('takes over what was taken, why not, and contract tolerances; what it does not know stays', () => {
    const { form, problems } = planOf(tests, choicesFrom(tests, start));
    expect(problems).toEqual([]);
    expect(form).toEqual({
      include: ['SP-1a:S1', 'TU-3:T2:S2'],
      exclusions: start.exclusions,
      contractTolerances: start.contractTolerances,
    });
    expect(
      takenOverWords(
        start,
        tests.map(({ key }) => key),
      ),
    ).toBe(
      '1 tests are taken. 1 of its tests do not fit this machine and its codes. 1 tests that it does not know stand as ' +
        'every plan begins. 1 tolerances come from the contract of that time: look at each.',
    );
  });

  it('keeps an angle in µm/m as it was agreed', () => {
    const angle = [test('C-1:S1:C1', ['S1'], { contractUnit: 'arcsec' })];
    const agreed = [{ key: 'C-1:S1:C1', toleranceUm: '38.785', source: 'order 6' }];
    const choices = choicesFrom(angle, { include: ['C-1:S1:C1'], exclusions: [], contractTolerances: agreed });
    expect(planOf(angle, choices).form.contractTolerances).toEqual(agreed);
    const typed = chooseFor(choices, ['C-1:S1:C1'], { contract: { tolerance: '8', source: 'order 6' } });
    expect(planOf(angle, typed).form.contractTolerances?.[0]?.toleranceUm).toMatch(/^38\.78509448876287948/);
    const wrong = chooseFor(choices, ['C-1:S1:C1'], { contract: { tolerance: '0.01 mm', source: 'order 6' } });
    expect(planOf(angle, wrong).problems).toMatchObject([{ field: 'tolerance' }]);
  });
});

describe('what was opened', () => {
  it('is taken, and everything else was not touched by the work', () => {
    const opened = [
      test('TU-3:T2:S1', ['T2'], { follows: ['turret T2 was repaired'] }),
      test('AX-9:T2', ['T2'], { follows: ['turret T2 was repaired'], standsInFor: 'Something else' }),
      test('SP-1a:S1', ['S1']),
      test('FC-1', [], { follows: [] }),
    ];
    const before = chooseFor(firstChoices(opened), ['TU-3:T2:S1', 'FC-1'], {
      taken: true,
      contract: { tolerance: '8', source: 'order 7' },
    });
    const { form, problems } = planOf(opened, choicesByOpened(opened, before));
    expect(problems).toEqual([]);
    expect(form.include).toEqual(['TU-3:T2:S1', 'FC-1']);
    expect(form.exclusions).toMatchObject([
      { key: 'AX-9:T2', reason: 'not-applicable' },
      { key: 'SP-1a:S1', reason: 'not-touched' },
    ]);
    expect(form.contractTolerances).toHaveLength(2);
  });
});

describe('filtering', () => {
  it('finds every word, in any case, in title, code, step, set-up or component', () => {
    const some = [
      ...tests,
      test('AX-1a:Z1:S1', ['Z1', 'S1'], { setUp: 'test mandrel in main spindle S1', group: 'Z to the spindle axis' }),
    ];
    const keys = (text: string) => filterTests(some, text).map(({ key }) => key);
    expect(keys('')).toHaveLength(4);
    expect(keys('  ')).toHaveLength(4);
    expect(keys('MANDREL z1')).toEqual(['AX-1a:Z1:S1']);
    expect(keys('t2')).toEqual(['TU-3:T2:S2']);
    expect(keys('13041 tu-3')).toEqual(['TU-3:T2:S2']);
    expect(keys('laser')).toEqual([]);
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
  const problems = (change: Partial<ReturnType<typeof firstChoices>[string]>) =>
    planOf([one, other], chooseFor(firstChoices([one, other]), [other.key], change)).problems;
  expect(problems({})).toEqual([
    { key: other.key, field: 'unconfirmed', message: expect.stringMatching(/not confirmed/) },
  ]);
  expect(problems({ contract: { tolerance: '8', source: 'order 7714' } })).toEqual([]);
  expect(problems({ taken: false, reason: 'not-agreed' })).toEqual([]);
});
