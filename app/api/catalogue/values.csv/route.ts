import { route } from '@/lib/http/route';
import { valuesAsCsv } from '@/lib/services/values-table';

/** The organisation's values of all tolerances as CSV (RFC 4180, UTF-8, decimal point). */
export const GET = route({
  action: 'catalogue.read',
  async handle({ trx }) {
    return {
      raw: {
        bytes: new TextEncoder().encode(await valuesAsCsv(trx)),
        contentType: 'text/csv; charset=utf-8; header=present',
      },
      headers: { 'content-disposition': 'attachment; filename="tolerance-values.csv"' },
    };
  },
});
