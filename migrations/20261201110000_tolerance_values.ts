import type { Knex } from 'knex';
import { createTenantTable, dropTables } from '@/db/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    -- Whether a value that somebody confirmed waits for a second person; whether a new job takes confirmed tolerances only.
    alter table organisations add column four_eyes boolean not null default false;
    alter table organisations add column refuse_unconfirmed boolean not null default false;
    alter table jobs add column refuse_unconfirmed boolean not null default false`);

  await createTenantTable(knex, {
    name: 'tolerance_values',
    columns: `
      -- Order in which they were written; the newest that holds is the organisation's value.
      sequence bigint generated always as identity,
      code text not null,
      edition text not null,
      definition_id text not null,
      version integer not null,
      -- Which figure of the rule: made and read by lib/planning/organisation-values.ts.
      cell text not null,
      state text not null check (state in ('confirmed', 'replaced', 'withdrawn')),
      figure numeric check (figure > 0),
      unit text not null check (unit in ('µm', 'µm/m', '″')),
      -- Of the licensed copy that it was looked up in, or where the own figure comes from.
      of_edition text not null,
      clause text not null,
      remark text,
      account_id uuid not null,
      account_name text not null,
      recorded_at timestamptz not null default now(),
      -- Kept with the row: what the organisation wants later changes nothing that was written before.
      needs_second boolean not null,
      second_account_id uuid,
      second_account_name text,
      second_at timestamptz,
      check ((state = 'withdrawn') = (figure is null)),
      check (state = 'withdrawn' or (of_edition <> '' and clause <> '')),
      check (second_account_id is null or (needs_second and second_account_id <> account_id)),
      check ((second_account_id is null) = (second_at is null) and (second_account_id is null) = (second_account_name is null))`,
    customerReads: '(select app_customer()) is not null',
    grants: 'select, insert, update (second_account_id, second_account_name, second_at)',
  });
  await knex.raw(`
    create index tolerance_values_cell on tolerance_values (organisation_id, code, edition, definition_id, version, cell, sequence desc);

    -- The one change of a row: the second person agrees, once.
    create function tolerance_values_are_kept() returns trigger language plpgsql as $$
    begin
      if old.second_account_id is not null
         or to_jsonb(new) - array['second_account_id', 'second_account_name', 'second_at']
            is distinct from to_jsonb(old) - array['second_account_id', 'second_account_name', 'second_at'] then
        raise exception 'a value that was written down does not change' using errcode = 'WM001';
      end if;
      return new;
    end $$;
    create trigger tolerance_values_kept before update on tolerance_values
      for each row execute function tolerance_values_are_kept()`);
}

export async function down(knex: Knex): Promise<void> {
  await dropTables(knex, ['tolerance_values']);
  await knex.raw(`
    drop function tolerance_values_are_kept();
    alter table jobs drop column refuse_unconfirmed;
    alter table organisations drop column refuse_unconfirmed;
    alter table organisations drop column four_eyes`);
}
