import type { ValuesViewer } from '@/components/catalogue/values-section';
import { inScope } from '@/db/client';
import { ownOrganisation } from '@/db/queries/organisations';
import { currentOwnDefinitions } from '@/db/queries/own-definitions';
import { can } from '@/lib/auth/permissions';
import { scopeOf } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import { findTestWithOwn } from '@/lib/planning/catalogue-with-own';
import { toleranceValuesOf } from '@/lib/services/tolerance-values';

/** A test with what the organisation says of its tolerances; null: there is none. */
export const loadTest = (viewer: Viewer, code: string, test: string) =>
  inScope(scopeOf(viewer), async (trx) => {
    const found = findTestWithOwn(code, test, await currentOwnDefinitions(trx));
    if (!found) return null;
    const { fourEyes } = await ownOrganisation(trx);
    return { ...found, fourEyes, ...(await toleranceValuesOf(trx, found.test)) };
  });

export const valuesViewer = ({ accountId, roles, timeZone }: Viewer): ValuesViewer => ({
  accountId,
  mayConfirm: can(roles, 'catalogue.confirm'),
  mayAgree: can(roles, 'catalogue.agree'),
  timeZone,
});
