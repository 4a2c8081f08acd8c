import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  // Codes and editions that a new job is proposed with; null: all of the catalogue.
  await knex.raw('alter table organisations add column codes jsonb');
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table organisations drop column codes');
}
