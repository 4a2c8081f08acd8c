import type { Db } from '@/db/client';
import { newId } from '@/lib/id';
import type { ToleranceValueState } from '@/lib/schemas/tolerance-value';
import type { DecimalText, ToleranceRule } from '@/standards/types';
import { own } from './jobs';

/** A definition as a value names it: another version is another test. */
export interface DefinitionKey {
  id: string;
  code: string;
  edition: string;
  version: number;
}

/** One thing that was said of one figure of a tolerance rule; never changed but for the second person's agreement. */
export interface ToleranceValueRow {
  id: string;
  definition: DefinitionKey;
  cell: string;
  state: ToleranceValueState;
  /** null: withdrawn. */
  figure: DecimalText | null;
  unit: NonNullable<ToleranceRule['unit']>;
  ofEdition: string;
  clause: string;
  remark: string | null;
  accountId: string;
  accountName: string;
  recordedAt: Date;
  needsSecond: boolean;
  secondAccountId: string | null;
  secondAccountName: string | null;
  secondAt: Date | null;
}

const columns = {
  id: 'id',
  code: 'code',
  edition: 'edition',
  definitionId: 'definition_id',
  version: 'version',
  cell: 'cell',
  state: 'state',
  figure: 'figure',
  unit: 'unit',
  ofEdition: 'of_edition',
  clause: 'clause',
  remark: 'remark',
  accountId: 'account_id',
  accountName: 'account_name',
  recordedAt: 'recorded_at',
  needsSecond: 'needs_second',
  secondAccountId: 'second_account_id',
  secondAccountName: 'second_account_name',
  secondAt: 'second_at',
};

type Stored = Omit<ToleranceValueRow, 'definition'> & Omit<DefinitionKey, 'id'> & { definitionId: string };

const asRow = ({ definitionId, code, edition, version, ...rest }: Stored): ToleranceValueRow => ({
  ...rest,
  definition: { id: definitionId, code, edition, version },
});

const ofDefinition = ({ id, code, edition, version }: DefinitionKey) => ({ code, edition, definition_id: id, version });
const cellColumns = ['code', 'edition', 'definition_id', 'version', 'cell'];
const byCell = [...cellColumns.map((column) => ({ column })), { column: 'sequence', order: 'desc' }];

/** A row holds once the second person has agreed, or where none is wanted. */
export const holds = (row: Pick<ToleranceValueRow, 'needsSecond' | 'secondAccountId'>): boolean =>
  !row.needsSecond || row.secondAccountId !== null;

/** The newest row of each figure that holds: what the organisation says of it now. A withdrawal among them says: nothing. */
export async function holdingToleranceValues(db: Db): Promise<ToleranceValueRow[]> {
  const rows: Stored[] = await db('tolerance_values')
    .where((held) => held.where({ needs_second: false }).orWhereNotNull('second_account_id'))
    .distinctOn(cellColumns)
    .orderBy(byCell)
    .select(columns);
  return rows.map(asRow);
}

/** The newest row of each figure, whether it holds or waits for the second person. */
export async function newestToleranceValues(db: Db): Promise<ToleranceValueRow[]> {
  const rows: Stored[] = await db('tolerance_values').distinctOn(cellColumns).orderBy(byCell).select(columns);
  return rows.map(asRow);
}

/** Everything that was ever said of the figures of one definition, newest first. */
export async function toleranceValueHistory(db: Db, definition: DefinitionKey): Promise<ToleranceValueRow[]> {
  const rows: Stored[] = await db('tolerance_values')
    .where(ofDefinition(definition))
    .orderBy('sequence', 'desc')
    .select(columns);
  return rows.map(asRow);
}

/** Locked, so that two people do not agree to it at once. */
export async function lockToleranceValue(db: Db, id: string): Promise<ToleranceValueRow | undefined> {
  const row: Stored | undefined = await db('tolerance_values').where({ id }).forUpdate().first(columns);
  return row && asRow(row);
}

export async function isNewestToleranceValue(db: Db, row: ToleranceValueRow): Promise<boolean> {
  const newest = await db('tolerance_values')
    .where({ ...ofDefinition(row.definition), cell: row.cell })
    .orderBy('sequence', 'desc')
    .first('id');
  return newest?.id === row.id;
}

export interface NewToleranceValue
  extends Pick<
    ToleranceValueRow,
    'definition' | 'cell' | 'state' | 'figure' | 'unit' | 'ofEdition' | 'clause' | 'remark' | 'needsSecond'
  > {
  account: { accountId: string; name: string };
}

export async function insertToleranceValues(db: Db, values: NewToleranceValue[]): Promise<string[]> {
  const rows = values.map((value) => ({
    organisation_id: own(db),
    id: newId(),
    ...ofDefinition(value.definition),
    cell: value.cell,
    state: value.state,
    figure: value.figure,
    unit: value.unit,
    of_edition: value.ofEdition,
    clause: value.clause,
    remark: value.remark,
    account_id: value.account.accountId,
    account_name: value.account.name,
    needs_second: value.needsSecond,
  }));
  // In parts: a statement takes 65535 parameters at most.
  for (let at = 0; at < rows.length; at += 500) await db('tolerance_values').insert(rows.slice(at, at + 500));
  return rows.map(({ id }) => id);
}

export async function agreeToToleranceValue(
  db: Db,
  id: string,
  account: { accountId: string; name: string },
): Promise<void> {
  await db('tolerance_values').where({ id }).update({
    second_account_id: account.accountId,
    second_account_name: account.name,
    second_at: db.fn.now(),
  });
}
