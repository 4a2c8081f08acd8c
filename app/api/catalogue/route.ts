import { route } from '@/lib/http/route';
import { catalogue } from '@/lib/planning/catalogue';

/** Codes and editions with their tests. */
export const GET = route({
  action: 'catalogue.read',
  async handle() {
    const items = catalogue().map(({ tests, ...code }) => ({
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
