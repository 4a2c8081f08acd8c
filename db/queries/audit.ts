import type { Db } from '@/db/client';
import { newId } from '@/lib/id';

/** Everything that is noted. The list is closed, so that a typing error cannot hide an event. */
export const auditActions = [
  'organisation.founded',
  'organisation.changed',
  'member.invited',
  'member.invitation-revoked',
  'member.joined',
  'member.changed',
  'member.disabled',
  'member.enabled',
  'customer.added',
  'customer.changed',
  'machine.registered',
  'machine.changed',
  'machine.transferred',
  'instrument.added',
  'instrument.changed',
  'instrument.calibrated',
  'instrument.overridden',
  'tolerance.confirmed',
  'tolerance.agreed',
  'tolerance.imported',
  'own-test.composed',
  'own-test.withdrawn',
  'job.opened',
  'job.changed',
  'plan.made',
  'plan-template.kept',
  'plan-template.removed',
  'sheet.left-out',
  'sheet.photo-added',
  'sheet.photo-removed',
  'sheet.taken-in',
  'sheet.linked',
  'sheet.changed',
  'remark.added',
  'remark.closed',
  'report.issued',
  'report.signed',
  'report.refused',
  'report.superseded',
] as const;
export type AuditAction = (typeof auditActions)[number];

export type AuditSubject =
  | 'organisation'
  | 'member'
  | 'invitation'
  | 'customer'
  | 'machine'
  | 'instrument'
  | 'tolerance'
  | 'own-test'
  | 'plan-template'
  | 'job'
  | 'sheet'
  | 'report'
  | 'remark';

/** Who did it; a whole Viewer fits. The accounts of the first start and of an invitation have no session yet. */
export interface AuditActor {
  accountId: string;
  name: string;
}

/** Notes who did what to which thing, in the same transaction as the deed. Only ever added. */
export async function recordEvent(
  trx: Db,
  actor: AuditActor,
  event: {
    action: AuditAction;
    subjectType: AuditSubject;
    subjectId: string;
    detail?: object /** Left out: now. */;
    at?: Date;
  },
): Promise<void> {
  await trx('audit_events').insert({
    organisation_id: trx.raw('app_organisation()'),
    id: newId(),
    action: event.action,
    subject_type: event.subjectType,
    subject_id: event.subjectId,
    account_id: actor.accountId,
    account_name: actor.name,
    detail: JSON.stringify(event.detail ?? {}),
    ...(event.at ? { happened_at: event.at } : {}),
  });
}
