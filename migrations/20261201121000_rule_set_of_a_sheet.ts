import type { Knex } from 'knex';

/** A sheet keeps the rule set with which it was planned, as it keeps edition and definition. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`alter table sheets add column rule_set text not null default 'witnessmark-1'`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table sheets drop column rule_set');
}
