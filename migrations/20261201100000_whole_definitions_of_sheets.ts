import type { Knex } from 'knex';

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    -- An organisation's own definition, whole, as it stood when the plan was made; those of the catalogue are found by their identity.
    alter table sheets add column own_definition jsonb;
    -- What stands set up while it is measured, in words; sheets with the same words are done one after another.
    alter table sheets add column set_up_together text;
    alter table sheets add column minutes integer check (minutes > 0);
    -- Place in the working order: heading of the plan. Plans from before have none of the three.
    alter table sheets add column working_step integer`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table sheets drop column working_step;
    alter table sheets drop column minutes;
    alter table sheets drop column set_up_together;
    alter table sheets drop column own_definition`);
}
