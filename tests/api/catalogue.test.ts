import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { GET as getTest } from '@/app/api/catalogue/[code]/[test]/route';
import { GET as getCatalogue } from '@/app/api/catalogue/route';
import { exampleComponent } from '@/lib/planning/catalogue';
import { toleranceLines, toleranceUnit } from '@/lib/planning/tolerance-words';
import { allDefinitions, codes, codeTitle } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';
import { callRoute } from '@/tests/helpers/call-route';
import { openTestWorkshop, type TestWorkshop } from '@/tests/helpers/test-workshop';

let workshop: TestWorkshop;
beforeAll(async () => {
  workshop = await openTestWorkshop();
});
afterAll(() => workshop.close());

describe('the catalogue', () => {
  it('lists every code with its tests, each with its tolerance and where it comes from', async () => {
    const { body } = await callRoute<{
      items: { slug: string; title: string; tests: Pick<TestDefinition, 'id' | 'tolerance'>[] }[];
    }>(getCatalogue, { as: workshop.people.customer });
    expect(body.items.map(({ title }) => title)).toEqual(codes().map(({ code, edition }) => codeTitle(code, edition)));
    expect(new Set(body.items.map(({ slug }) => slug)).size).toBe(body.items.length);
    for (const { title, tests } of body.items) expect(tests.length, title).toBeGreaterThan(0);
    const tests = body.items.flatMap(({ tests }) => tests);
    expect(new Set(tests.map(({ id }) => id))).toEqual(new Set(allDefinitions().map(({ id }) => id)));
    for (const { id, tolerance } of tests) {
      if (tolerance) expect(tolerance.provenance.text, id).not.toBe('');
    }
  });

  it('answers one test by slug or by title, the id in any case', async () => {
    for (const code of ['iso-13041-1-2020', 'ISO 13041-1:2020']) {
      const { body } = await callRoute<{ definition: TestDefinition }>(getTest, {
        as: workshop.people.inspector,
        params: { code, test: 'ax-1a' },
      });
      expect(body.definition).toMatchObject({ id: 'AX-1a', method: 'parallelism', edition: '2020' });
    }
    const older = await callRoute<{ definition: TestDefinition }>(getTest, {
      as: workshop.people.inspector,
      params: { code: 'iso-13041-1-2004', test: 'ax-1a' },
    });
    expect(older.body.definition).toMatchObject({ id: 'AX-1a', edition: '2004', testNumber: 'G3 a)' });
    const missing = await callRoute(getTest, {
      as: workshop.people.inspector,
      params: { code: 'iso-13041-1-2020', test: 'WP-1' },
    });
    expect(missing.status).toBe(404);
  });

  it('is not for somebody who is not signed in', async () => {
    expect((await callRoute(getCatalogue)).status).toBe(401);
  });

  it('can show every test on a component and every tolerance in its unit', () => {
    for (const definition of allDefinitions()) {
      if (definition.appliesTo.kind !== 'machine')
        expect(Object.keys(exampleComponent(definition)).length, definition.id).toBeGreaterThan(0);
      if (!definition.tolerance) continue;
      const lines = toleranceLines(definition.tolerance);
      expect(lines.length, definition.id).toBeGreaterThan(0);
      const figure = toleranceUnit(definition.tolerance) === 'mm' ? /^0\.\d{1,4}$/ : /^\d+(\.\d+)?$/;
      for (const line of lines) expect(line.tolerance, definition.id).toMatch(figure);
    }
    const nose = allDefinitions().find(({ id }) => id === 'SP-1a')?.tolerance;
    expect(nose && toleranceLines(nose).map(({ tolerance }) => tolerance)).toEqual(['0.005', '0.008', '0.012']);
    const carriage = allDefinitions().find(({ id, code }) => id === 'AX-5' && code === 'ISO 1708')?.tolerance;
    expect(carriage && toleranceLines(carriage).map(({ when }) => when)).toEqual([
      'distance between centres up to 500 mm',
      'distance between centres over 500 up to 1000 mm',
      'distance between centres over 1000 up to 2000 mm',
      'distance between centres over 2000 mm',
    ]);
  });
});
