import type { Knex } from 'knex';
import { asOwnerOfAllRows } from '@/db/tenant-table';

export async function up(knex: Knex): Promise<void> {
  await asOwnerOfAllRows(knex, ['machines', 'files'], () =>
    knex.raw(`
      alter table machines add column nameplate_file_id uuid,
        add foreign key (organisation_id, nameplate_file_id) references files (organisation_id, id)`),
  );
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw('alter table machines drop column nameplate_file_id');
}
