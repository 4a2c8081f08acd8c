import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    -- What was opened: component of the make-up → { condition, text }. A component without an entry: not said.
    alter table jobs add column component_conditions jsonb not null default '{}'`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table jobs drop column component_conditions');
}
