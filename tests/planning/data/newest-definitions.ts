import { newestEditions } from '@/lib/planning/newest-editions';
import { sameCode } from '@/lib/schemas/test-codes';
import { codes, currentDefinitions } from '@/standards/registry';

const newest = newestEditions(codes());

/** What a new job is planned from while nobody has chosen: the newest edition of each code. */
export const newestDefinitions = currentDefinitions().filter((one) => newest.some((code) => sameCode(code, one)));
