import { describe, expect, it } from 'vitest';
import { appliesToChoices, restsOn, titleParts } from '@/lib/planning/applies-to-words';
import { bind } from '@/lib/planning/bind';
import { composeDefinition } from '@/lib/planning/compose-definition';
import { exampleSheet } from '@/lib/planning/example-sheet';
import { measurements } from '@/lib/planning/measurements';
import { newComposition } from '@/lib/planning/new-composition';
import { ownDefinitionProblems, trialCells } from '@/lib/planning/own-definition-problems';
import { type OwnDefinitionInput, ownDefinitionFields } from '@/lib/schemas/own-definition';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import type { AppliesTo } from '@/standards/types';

const bed: OwnDefinitionInput = {
  ...newComposition('straightness'),
  title: 'Carriage on the new bed strip',
  procedure: [
    'Clamp the straightedge along the travel.',
    'Read at each position; back at the first it must show the same.',
  ],
  judgedFigure: 'breadth of the line over the travel',
  tolerance: {
    by: 'all',
    allUm: '8',
    unit: 'µm',
    perLength: null,
    local: null,
    basis: null,
    provenance: { kind: 'builder', text: 'our drawing 4411, sheet 2' },
  },
};
const parsed = (change: Partial<OwnDefinitionInput> = {}) => ownDefinitionFields.parse({ ...bed, ...change });
const pointers = (change: Partial<OwnDefinitionInput>) =>
  ownDefinitionProblems(parsed(change)).map(({ pointer }) => pointer);

describe('a composed test', () => {
  it('is a whole definition that plans, draws fields and judges', () => {
    const form = parsed();
    expect(ownDefinitionProblems(form)).toEqual([]);
    const definition = composeDefinition(form, 'OWN-1', 3);
    expect(definition).toMatchObject({
      id: 'OWN-1',
      code: 'own tests',
      edition: '',
      version: 3,
      method: 'straightness',
      boundTitle: 'Carriage on the new bed strip: {axis}',
      tolerance: { by: 'all', allUm: '8', provenance: { kind: 'builder' } },
      dependsOn: { components: ['bed'], moved: ['axis'], positioned: [] },
    });
    expect(definition.cautions).toContain('maker-and-local-rules-first');
    // Plain data: it comes back from the database as it went in.
    expect(JSON.parse(JSON.stringify(definition))).toEqual(definition);
    const { sheet } = exampleSheet(definition)!;
    const outcome = judgeSheet(
      { definition: sheet.definition, tolerance: sheet.tolerance, direction: 'either', decisionRule: 'simple' },
      definition,
      trialCells(definition, sheet.setUp),
    );
    expect(outcome).toMatchObject({ state: 'complete', judgement: { toleranceUm: '8', verdict: 'within-tolerance' } });
  });

  it('permits one side only where the result has a sign, and then says what the sign means', () => {
    expect(pointers({ direction: 'convex-only' })).toEqual(['/direction']);
    const square = {
      ...newComposition('squareness'),
      title: bed.title,
      procedure: bed.procedure,
      judgedFigure: bed.judgedFigure,
    };
    expect(pointers({ ...square, positiveMeans: '', negativeMeans: '' })).toEqual(['/positiveMeans', '/negativeMeans']);
    const meant = { positiveMeans: 'more than 90°', negativeMeans: 'less than 90°' };
    expect(pointers({ ...square, ...meant, direction: 'toward-tool' })).toEqual([]);
  });

  it('takes the fields of its measurement only', () => {
    expect(pointers({ measurement: 'run-out' })).toEqual(['/layout/kind']);
    expect(pointers({ measurement: 'tasting' })).toEqual(['/measurement']);
    expect(pointers({ judge: 'range' })).toEqual(['/judge']);
  });

  it('has a tolerance without gap or fall, that fits the result', () => {
    const parse = (steps: object[]) => {
      const { allUm: _, ...rest } = bed.tolerance as Extract<OwnDefinitionInput['tolerance'], { by: 'all' }>;
      return ownDefinitionProblems(parsed({ tolerance: { ...rest, by: 'travel', steps } as never })).map(
        (p) => p.pointer,
      );
    };
    expect(() => parse([])).toThrow(/at least one line/);
    expect(
      parse([
        { overMm: '0', upToMm: '300', toleranceUm: '8' },
        { overMm: '300', upToMm: '', toleranceUm: '12' },
      ]),
    ).toEqual([]);
    expect(
      parse([
        { overMm: '0', upToMm: '300', toleranceUm: '8' },
        { overMm: '400', upToMm: '350', toleranceUm: '7' },
      ]),
    ).toEqual(['/tolerance/steps/1/overMm', '/tolerance/steps/1/upToMm', '/tolerance/steps/1/toleranceUm']);
    expect(pointers({ tolerance: { ...bed.tolerance, unit: 'µm/m' } as never })).toEqual(['/tolerance/unit']);
    expect(pointers({ tolerance: { ...bed.tolerance, basis: 'offset' } as never })).toEqual(['/tolerance/basis']);
  });

  it('names only parts that its component has', () => {
    expect(pointers({ boundTitle: 'Bed under {axis}' })).toEqual([]);
    expect(pointers({ boundTitle: 'Bed under {spindle}' })).toEqual(['/boundTitle']);
    expect(pointers({ dependsOn: { components: ['turret'], moved: ['axis'], positioned: [] } })).toEqual([
      '/dependsOn/components',
    ]);
    expect(pointers({ scene: 'a photograph', workingStep: 17, cautions: ['be-careful'] })).toEqual([
      '/scene',
      '/workingStep',
      '/cautions',
    ]);
  });
});

describe.each(measurements)('$label', (measurement) => {
  it('begins with fields that can be filled in and give a result', () => {
    const form = ownDefinitionFields.parse({
      ...newComposition(measurement.id),
      title: 'A test of our own',
      judgedFigure: measurement.gives,
      procedure: bed.procedure,
      ...(measurement.signed ? { positiveMeans: 'one way', negativeMeans: 'the other way' } : {}),
      ...(measurement.id === 'function-check'
        ? {
            layout: {
              kind: 'check-list',
              items: [{ question: 'Does the door switch stop the spindle?', value: null }],
            },
          }
        : {}),
    });
    expect(ownDefinitionProblems(form)).toEqual([]);
    const definition = composeDefinition(form, 'OWN-1', 1);
    expect(exampleSheet(definition), 'a machine to show it on').not.toBeNull();
  });
});

describe.each(Object.keys(appliesToChoices) as AppliesTo['kind'][])('done on %s', (kind) => {
  it('has on every machine the parts that it promises', () => {
    const { parts } = appliesToChoices[kind];
    const extras = {
      ...{ types: kind === 'spindle' ? ['main', 'sub'] : ['turret', 'tool-post', 'gang-slide'], planes: ['ZX', 'YZ'] },
      ...{ plane: 'ZX', role: 'longitudinal', letters: kind === 'rotary-axis' ? ['A', 'B', 'C'] : undefined },
    };
    const found = startingMakeUps.flatMap(({ makeUp }) => bind({ kind, ...extras } as unknown as AppliesTo, makeUp));
    for (const component of found)
      for (const part of parts) if (part !== 'channel') expect(component[part], `${kind} ${part}`).toBeDefined();
    expect(titleParts(kind)).toEqual(parts);
    const { can, usual } = restsOn(kind);
    for (const list of ['components', 'moved', 'positioned'] as const)
      for (const one of usual[list]) expect(can[list]).toContain(one);
  });
});
