import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  // How finely a figure was typed, in its own unit: 12.50 was read to 0.01.
  await knex.raw('alter table readings add column resolution numeric check (resolution > 0)');
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table readings drop column resolution');
}
