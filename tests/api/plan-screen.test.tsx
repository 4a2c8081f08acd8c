import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { proposedTests, startChoices } from '@/app/(workshop)/jobs/[jobId]/plan/proposed-tests';
import { firstChoices } from '@/components/jobs/plan-choices';
import { PlanGroup } from '@/components/jobs/plan-group';
import { filterLines, type PathSheet, PlanPath } from '@/components/tables/plan-path';
import { planSheets } from '@/lib/planning/plan-sheets';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import type { PlanMaking } from '@/lib/services/plan-making';
import { newestDefinitions } from '@/tests/planning/data/newest-definitions';

const { makeUp } = startingMakeUps.find(({ kind }) => kind === 'multi-channel-turning-centre')!;
const proposals = planSheets(makeUp, newestDefinitions);
const making: PlanMaking = {
  proposals,
  estimates: { 'SP-1a:S1': { minutes: 9, fromPasses: 4 } },
  follows: { 'SP-1a:S1': ['main spindle S1 was replaced'] },
  starts: [],
};
const tests = proposedTests(making, false);
const plain = (html: string) => html.replace(/<[^>]*>/g, ' ').replace(/\s+/g, ' ');

describe('the proposals of a machine with three channels', () => {
  it('are sixty or more, each with words of its own and none with a broken figure', () => {
    expect(tests.length).toBeGreaterThanOrEqual(60);
    expect(new Set(tests.map(({ key }) => key)).size).toBe(tests.length);
    for (const { key, group, tolerance, minutes, components } of tests) {
      expect(group, key).not.toBe('Other tests');
      // A figure of a tolerance, not one of thirty digits.
      expect(tolerance, key).not.toMatch(/undefined|NaN|\d\.\d{7}/);
      expect(minutes, key).toBeGreaterThan(0);
      for (const id of components) expect(id).toMatch(/^[A-Z]{1,3}\d$/);
    }
  });

  it('stand under their step, those that are set up together under its words, with counts and times', () => {
    const step = tests[0]!.group;
    const members = tests.filter(({ group }) => group === 'Work spindle run-outs');
    const html = renderToStaticMarkup(
      <PlanGroup
        group="Work spindle run-outs"
        tests={members}
        choices={firstChoices(tests)}
        problems={[]}
        opened
        onChoose={() => undefined}
      />,
    );
    const text = plain(html);
    expect(step).not.toBe('');
    expect(html.match(/<h2/g)).toHaveLength(1);
    // A set-up for one test alone needs no heading.
    const together = [...new Set(members.flatMap(({ setUp }) => setUp ?? []))].filter(
      (words) => members.filter(({ setUp }) => setUp === words).length > 1,
    );
    expect(together.length).toBeGreaterThan(0);
    expect(html.match(/<h3/g)).toHaveLength(together.length);
    for (const words of together) expect(text).toContain(`Set up together: ${words}`);
    expect(text).toContain(`${members.length} of ${members.length} taken`);
    expect(text).toContain('9 min, median of 4 of your own measurements');
    expect(text).toContain('Follows: main spindle S1 was replaced.');
    expect(text).toContain('Rests on nothing that was touched.');
  });

  it('begin from what is offered, in words', () => {
    const choices = { include: [], exclusions: [], contractTolerances: [] };
    const on = new Date('2026-03-12T23:30:00Z');
    const start = { id: 'a', name: 'Yearly', serialNumber: null, on, choices };
    const words = startChoices(
      {
        ...making,
        starts: [
          { ...start, kind: 'template' },
          { ...start, kind: 'same-machine', name: 'QMF-2039' },
          { ...start, kind: 'same-model', name: 'QMF-2040', serialNumber: 'LK32-0081-8' },
        ],
      },
      'Europe/Berlin',
    ).map((one) => one.words);
    expect(words).toEqual([
      'Template “Yearly”, 13 Mar 2026',
      'Plan of QMF-2039, this machine, 13 Mar 2026',
      'Plan of QMF-2040, LK32-0081-8 of the same model, 13 Mar 2026',
    ]);
  });
});

describe('the plan of a job', () => {
  const line = (position: number, change: Partial<PathSheet> = {}): PathSheet => ({
    id: `s${position}`,
    position,
    title: `Test ${position}`,
    component: '',
    mark: 'not-measured',
    result: '',
    isNext: false,
    step: 'Work spindle run-outs',
    setUp: 'test mandrel in main spindle S1',
    minutesLeft: 20,
    ...change,
  });

  it('stands in the same groups, with what is still to measure', () => {
    const html = renderToStaticMarkup(
      <PlanPath
        jobId="j"
        sheets={[
          line(1, { minutesLeft: 0, mark: 'within-tolerance', result: '0.0040' }),
          line(2),
          line(3, { setUp: null, minutesLeft: 50 }),
          line(4, { step: 'Y to X', setUp: null }),
        ]}
      />,
    );
    const text = plain(html);
    expect(text).toContain('Work spindle run-outs 3 tests · 1 h 10 min to measure');
    expect(text).toContain('Set up together: test mandrel in main spindle S1 2 tests · 20 min to measure');
    expect(text).toContain('Y to X 1 test · 20 min to measure');
    expect(html.match(/href="\/jobs\/j\/sheets\//g)).toHaveLength(4);
  });

  it('can be searched when it is long, by everything that a line shows', () => {
    const many = Array.from({ length: 60 }, (_, index) =>
      line(index + 1, index === 7 ? { title: 'Lost motion of Z2' } : {}),
    );
    many[9] = line(10, { mark: 'out-of-tolerance', result: '0.0240' });
    const html = renderToStaticMarkup(<PlanPath jobId="j" sheets={many} />);
    expect(plain(html)).toContain('60 tests');
    expect(html).toContain('type="search"');
    expect(renderToStaticMarkup(<PlanPath jobId="j" sheets={many.slice(0, 20)} />)).not.toContain('type="search"');
    const found = (text: string) => filterLines(many, text).map(({ position }) => position);
    expect(found('lost z2')).toEqual([8]);
    expect(found('tolerance 0.0240')).toEqual([10]);
    expect(found('MANDREL')).toHaveLength(60);
    expect(found('laser')).toEqual([]);
  });

  it('is one list without headings where a plan is from before they were kept', () => {
    const old = [1, 2].map((position) => line(position, { step: null, setUp: null }));
    const html = renderToStaticMarkup(<PlanPath jobId="j" sheets={old} />);
    expect(html).not.toMatch(/<h[23]/);
    expect(html.match(/<ol/g)).toHaveLength(1);
  });
});
