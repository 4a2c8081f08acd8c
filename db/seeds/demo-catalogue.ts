import type { Knex } from 'knex';
import type { Viewer } from '@/lib/auth/viewer';
import { newComposition } from '@/lib/planning/new-composition';
import { toleranceCells } from '@/lib/planning/organisation-values';
import { type OwnDefinitionInput, ownDefinitionFields } from '@/lib/schemas/own-definition';
import { composeOwnTest } from '@/lib/services/own-definitions';
import { findTest, sayOfTolerance } from '@/lib/services/tolerance-values';

const geometric = 'iso-13041-1-2020';
const copy = { ofEdition: '2020, copy no. 3', remark: null };

const flange: OwnDefinitionInput = {
  ...newComposition('run-out'),
  title: 'Chuck flange: radial run-out of the register',
  boundTitle: 'Chuck flange on {spindle}: radial run-out of the register',
  layout: { kind: 'turns', insertions: 1, anglesDeg: '0 45 90 135 180 225 270 315 360', insertionLabel: 'turn' },
  tolerance: {
    ...{ by: 'all', allUm: '10', unit: 'µm', perLength: null, local: null, basis: null },
    provenance: { kind: 'builder', text: 'own working instruction 12, line 4' },
  },
  procedure: [
    'Bolt the flange on and wipe its register clean. Mark 0° on flange and spindle.',
    'Set the stylus square to the register. Pushing the plunger in counts positive.',
    'Turn slowly by hand and read every 45°; back at 0° it must show the first value again.',
  ],
  usualMistakes: 'A burr on the spindle nose tilts the flange.',
  judgedFigure: 'largest less smallest reading of the turn on the flange',
  cautions: ['isolate-before-touching', 'turn-spindle-by-hand'],
};

/** What the quality manager has looked up so far, one figure put in its place, and a test of the workshop's own. */
export async function addCatalogueWork(trx: Knex.Transaction, administrator: Viewer): Promise<void> {
  for (const [test, clause] of [
    ['SP-1a', 'p. 21'],
    ['SP-2a', 'p. 22'],
  ] as const) {
    const { test: definition } = await findTest(trx, geometric, test);
    const cells = toleranceCells(definition).map(({ cell }) => ({ cell }));
    await sayOfTolerance(trx, administrator, definition, { state: 'confirmed', cells, clause, ...copy });
  }
  const { test: far } = await findTest(trx, geometric, 'SP-2b');
  await sayOfTolerance(trx, administrator, far, {
    ...{ state: 'replaced', cells: [{ cell: 'class-2', figure: '14' }], clause: 'p. 22', ...copy },
    remark: 'smaller by agreement in the house',
  });
  await composeOwnTest(trx, administrator, 'OWN-1', ownDefinitionFields.parse(flange));
}
