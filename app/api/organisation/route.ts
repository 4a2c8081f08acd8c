import { recordEvent } from '@/db/queries/audit';
import { ownOrganisation, updateOrganisation } from '@/db/queries/organisations';
import { changedMeanwhile } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { organisationChange } from '@/lib/schemas/organisation';

export const GET = route({
  action: 'member.list',
  async handle({ trx }) {
    const organisation = await ownOrganisation(trx);
    return { body: organisation, version: organisation.version };
  },
});

/** Letterhead and defaults. Reports that were issued keep the letterhead that they were issued with. */
export const PATCH = route({
  action: 'organisation.change',
  body: organisationChange,
  needsVersion: true,
  async handle({ trx, viewer, body, expectedVersion }) {
    if (!(await updateOrganisation(trx, expectedVersion, body))) throw changedMeanwhile();
    const organisation = await ownOrganisation(trx);
    await recordEvent(trx, viewer, {
      action: 'organisation.changed',
      subjectType: 'organisation',
      subjectId: organisation.id,
      detail: body,
    });
    return { body: organisation, version: organisation.version };
  },
});
