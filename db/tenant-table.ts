import type { Knex } from 'knex';

export interface TenantTable {
  name: string;
  /** Column definitions besides organisation_id and id. */
  columns: string;
  /**
   * Which rows somebody from a customer may read, as SQL over the table's own columns; `false`: none.
   * Staff of the organisation read all of its rows.
   */
  customerReads: string;
  /** Rows that somebody from a customer may add. */
  customerAdds?: string;
  /** Privileges of the application's role; evidence is only ever added. */
  grants?: string;
}

/**
 * Creates a table that belongs to organisations: organisation in the primary key, row-level security forced, so that a forgotten
 * `where` cannot show another company's rows. The settings are set per transaction (db/client.ts); without them every access fails.
 */
export async function createTenantTable(knex: Knex, table: TenantTable): Promise<void> {
  const { name } = table;
  await knex.raw(`
    create table ${name} (
      organisation_id uuid not null references organisations (organisation_id),
      id uuid not null,
      ${table.columns.trim().replace(/,$/, '')},
      primary key (organisation_id, id)
    )`);
  await secureTenantTable(knex, table);
}

export async function secureTenantTable(knex: Knex, table: Omit<TenantTable, 'columns'>): Promise<void> {
  const { name } = table;
  const own = 'organisation_id = (select app_organisation())';
  const adds = table.customerAdds ?? 'false';
  await knex.raw(`
    alter table ${name} enable row level security;
    alter table ${name} force row level security;
    create policy ${name}_read on ${name} for select
      using (${own} and ((select app_is_staff()) or (${table.customerReads})));
    create policy ${name}_add on ${name} for insert
      with check (${own} and ((select app_is_staff()) or (${adds})));
    create policy ${name}_change on ${name} for update
      using (${own} and (select app_is_staff())) with check (${own} and (select app_is_staff()));
    create policy ${name}_remove on ${name} for delete
      using (${own} and (select app_is_staff()));
    grant ${table.grants ?? 'select, insert, update, delete'} on ${name} to witnessmark_app`);
}

/** Replaces the read policy, where it speaks of a table that is made later. */
export async function replaceReadPolicy(knex: Knex, name: string, customerReads: string): Promise<void> {
  await knex.raw(`
    drop policy ${name}_read on ${name};
    create policy ${name}_read on ${name} for select
      using (organisation_id = (select app_organisation()) and ((select app_is_staff()) or (${customerReads})))`);
}

/**
 * For a migration that reads rows of all organisations (a foreign key over rows that are there): the owner is not subject to row-level
 * security on these tables meanwhile. Part of the migration's transaction: nobody else ever sees it off.
 */
export async function asOwnerOfAllRows(knex: Knex, tables: string[], work: () => PromiseLike<unknown>): Promise<void> {
  for (const table of tables) await knex.raw(`alter table ${table} no force row level security`);
  await work();
  for (const table of tables) await knex.raw(`alter table ${table} force row level security`);
}

export async function dropTables(knex: Knex, names: string[]): Promise<void> {
  for (const name of names) await knex.raw(`drop table if exists ${name} cascade`);
}
