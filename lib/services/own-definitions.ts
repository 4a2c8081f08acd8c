import type { Db } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { ownOrganisation, updateOrganisation } from '@/db/queries/organisations';
import {
  currentOwnDefinitions,
  insertOwnDefinition,
  lockOwnDefinitions,
  type OwnDefinitionRow,
  ownDefinitionHistory,
} from '@/db/queries/own-definitions';
import type { Viewer } from '@/lib/auth/viewer';
import { changedMeanwhile, conflict, DomainError, invalid, notFound } from '@/lib/errors';
import { composeDefinition } from '@/lib/planning/compose-definition';
import { ownDefinitionProblems } from '@/lib/planning/own-definition-problems';
import type { OwnDefinitionForm } from '@/lib/schemas/own-definition';
import { sameCode } from '@/lib/schemas/test-codes';
import { ownTests } from '@/standards/own-tests';
import type { TestDefinition } from '@/standards/types';

/**
 * A new own test, version 1. The first one makes own tests one of the codes that a new job is proposed with.
 * @throws DomainError 409 where the id is taken, also by a test that was withdrawn; 422 at the fields that do not hold together
 */
export async function composeOwnTest(db: Db, viewer: Viewer, id: string, form: OwnDefinitionForm) {
  refuseProblems(form);
  await lockOwnDefinitions(db);
  if ((await ownDefinitionHistory(db, id)).length > 0) {
    const detail = `There is an own test ${id} already. Choose another id, or make a new version of it.`;
    throw new DomainError(409, 'Taken already', detail, [{ pointer: '/id', detail }]);
  }
  const first = (await currentOwnDefinitions(db)).length === 0;
  const definition = await writeVersion(db, viewer, composeDefinition(form, id, 1), form);
  if (first) await proposeOwnTests(db);
  return definition;
}

/**
 * A new version; sheets that were planned with an older one keep it. A withdrawn test comes back with it.
 * @throws DomainError 412 where somebody else made a version meanwhile
 */
export async function composeOwnVersion(
  db: Db,
  viewer: Viewer,
  id: string,
  basedOn: number,
  form: OwnDefinitionForm,
): Promise<TestDefinition> {
  refuseProblems(form);
  await lockOwnDefinitions(db);
  const newest = await newestVersion(db, id);
  if (newest.version !== basedOn) throw changedMeanwhile();
  return writeVersion(db, viewer, composeDefinition(form, id, newest.version + 1), form);
}

/** Not planned any more; sheets that have it keep it. @throws DomainError 409 where it is withdrawn already */
export async function withdrawOwnTest(db: Db, viewer: Viewer, id: string): Promise<{ version: number }> {
  await lockOwnDefinitions(db);
  const newest = await newestVersion(db, id);
  if (newest.withdrawn) throw conflict(`${id} is withdrawn already.`);
  const row = { definitionId: id, version: newest.version, withdrawn: true, definition: null, composed: null };
  const rowId = await insertOwnDefinition(db, { ...row, account: viewer });
  await recordEvent(db, viewer, {
    action: 'own-test.withdrawn',
    subjectType: 'own-test',
    subjectId: rowId,
    detail: { id, version: newest.version },
  });
  return { version: newest.version };
}

async function newestVersion(db: Db, id: string): Promise<OwnDefinitionRow> {
  const [newest] = await ownDefinitionHistory(db, id);
  if (!newest) throw notFound('own test');
  return newest;
}

async function writeVersion(db: Db, viewer: Viewer, definition: TestDefinition, form: OwnDefinitionForm) {
  const { id, version } = definition;
  const rowId = await insertOwnDefinition(db, {
    ...{ definitionId: id, version, withdrawn: false, definition, composed: form },
    account: viewer,
  });
  await recordEvent(db, viewer, {
    action: 'own-test.composed',
    subjectType: 'own-test',
    subjectId: rowId,
    detail: { id, version, title: definition.title },
  });
  return definition;
}

/** An organisation that has chosen its codes gets its own tests beside them; one that has not is proposed with all anyway. */
async function proposeOwnTests(db: Db): Promise<void> {
  const { codes, version } = await ownOrganisation(db);
  if (!codes || codes.some((one) => sameCode(one, ownTests))) return;
  const next = [...codes, { code: ownTests.code, edition: ownTests.edition }];
  if (!(await updateOrganisation(db, version, { codes: next }))) throw changedMeanwhile();
}

function refuseProblems(form: OwnDefinitionForm): void {
  const problems = ownDefinitionProblems(form);
  if (problems.length > 0)
    throw invalid(problems.map(({ pointer, detail }) => ({ pointer: `/form${pointer}`, detail })));
}
