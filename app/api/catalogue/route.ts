import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import { route } from '@/lib/http/route';
import { catalogueWithOwn } from '@/lib/planning/catalogue-with-own';

/** Codes and editions with their tests, the organisation's own beside them. */
export const GET = route({
  action: 'catalogue.read',
  async handle({ trx }) {
    const items = catalogueWithOwn(await currentOwnDefinitions(trx)).map(({ tests, ...code }) => ({
      ...code,
      tests: tests.map(({ id, version, title, direction, tolerance }) => ({
        id,
        version,
        title,
        direction,
        tolerance,
      })),
    }));
    return { body: { items, next: null } };
  },
});
