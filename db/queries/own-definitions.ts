import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { TestDefinition } from '@/standards/types';
import { own } from './jobs';

export interface OwnDefinitionRow {
  definitionId: string;
  version: number;
  withdrawn: boolean;
  /** null in the row that withdraws. */
  definition: TestDefinition | null;
  /** The composer's fields, to begin a new version from. */
  composed: unknown;
  accountName: string;
  recordedAt: Date;
}

const columns = {
  definitionId: 'definition_id',
  version: 'version',
  withdrawn: 'withdrawn',
  definition: 'definition',
  composed: 'composed',
  accountName: 'account_name',
  recordedAt: 'recorded_at',
};

/** Newest row of each own test, withdrawn ones too, by id. */
export const newestOwnDefinitions = (db: Db): Promise<OwnDefinitionRow[]> =>
  db('own_definitions')
    .distinctOn('definition_id')
    .orderBy([{ column: 'definition_id' }, { column: 'sequence', order: 'desc' }])
    .select(columns);

/** Own tests that a plan can be made of: the newest version of each that is not withdrawn. */
export async function currentOwnDefinitions(db: Db): Promise<TestDefinition[]> {
  return (await newestOwnDefinitions(db)).flatMap(({ definition }) => definition ?? []);
}

/** Everything that was ever written of one own test, newest first; rows that withdraw it among them. */
export const ownDefinitionHistory = (db: Db, definitionId: string): Promise<OwnDefinitionRow[]> =>
  db('own_definitions').where({ definition_id: definitionId }).orderBy('sequence', 'desc').select(columns);

/** Writers of own tests wait for each other, so that a version number is given once. */
export const lockOwnDefinitions = (db: Db): Promise<unknown> =>
  db.raw(`select pg_advisory_xact_lock(hashtextextended('own_definitions ' || app_organisation()::text, 0))`);

export async function insertOwnDefinition(
  db: Db,
  row: Pick<OwnDefinitionRow, 'definitionId' | 'version' | 'withdrawn' | 'definition' | 'composed'> & {
    account: { accountId: string; name: string };
  },
): Promise<string> {
  const id = newId();
  await db('own_definitions').insert({
    organisation_id: own(db),
    id,
    definition_id: row.definitionId,
    version: row.version,
    withdrawn: row.withdrawn,
    definition: row.definition && JSON.stringify(row.definition),
    composed: row.composed === null ? null : JSON.stringify(row.composed),
    account_id: row.account.accountId,
    account_name: row.account.name,
  });
  return id;
}
