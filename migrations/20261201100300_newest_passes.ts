import type { Knex } from 'knex';

/** How long a test takes is learned from the newest sets of readings: they are found without looking through the older ones. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`create index passes_newest on passes (organisation_id, taken_at desc)
    where taken_at is not null and linked_to is null`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('drop index passes_newest');
}
