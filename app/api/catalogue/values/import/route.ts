import { route } from '@/lib/http/route';
import { valuesImportForm } from '@/lib/schemas/tolerance-value';
import { importValues } from '@/lib/services/values-import';

/** A table of values: with `preview` says what would change and what is wrong, line by line; without, takes it over. */
export const POST = route({
  action: 'catalogue.confirm',
  body: valuesImportForm,
  async handle({ trx, viewer, body }) {
    return { body: await importValues(trx, viewer, body.csv, body.preview) };
  },
});
