import type { Knex } from 'knex';
import { newId } from '@/lib/id';

export interface OutgoingMail {
  to: string;
  subject: string;
  text: string;
  html: string;
  /** Left out: made from the mail's own id. Given: a second mail of the same id is refused by the table. */
  messageId?: string;
}

/** After so many refusals the queue gives up (see `enqueue` in the migrations) and the mail counts as failed. */
const maxAttempts = 12;

/** Writes a mail and the order to send it in the transaction of what it tells about: both happen or neither. Answers the mail's id. */
export async function queueMail(trx: Knex.Transaction, mail: OutgoingMail): Promise<string> {
  const id = newId();
  await trx('outbox').insert({
    organisation_id: trx.raw('app_organisation()'),
    id,
    recipient: mail.to,
    subject: mail.subject,
    text_body: mail.text,
    html_body: mail.html,
    message_id: mail.messageId ?? `${id}@witnessmark`,
  });
  await trx.raw(
    `select enqueue('send-mail', jsonb_build_object('organisationId', app_organisation(), 'outboxId', ?::text), ?)`,
    [id, `send-mail:${id}`],
  );
  return id;
}

interface WaitingMail {
  recipient: string;
  subject: string;
  text: string;
  html: string;
  messageId: string;
}

/** The mail, held until the transaction ends; nothing when it has been sent already. */
export const lockUnsentMail = (trx: Knex.Transaction, outboxId: string): Promise<WaitingMail | undefined> =>
  trx('outbox').where({ id: outboxId }).whereNot({ state: 'sent' }).forUpdate().first({
    recipient: 'recipient',
    subject: 'subject',
    text: 'text_body',
    html: 'html_body',
    messageId: 'message_id',
  });

export async function noteMailSent(trx: Knex.Transaction, outboxId: string): Promise<void> {
  await trx('outbox')
    .where({ id: outboxId })
    .update({ state: 'sent', sent_at: trx.fn.now(), attempts: trx.raw('attempts + 1') });
}

export async function noteMailFailure(trx: Knex.Transaction, outboxId: string, errorId: string): Promise<void> {
  await trx('outbox')
    .where({ id: outboxId })
    .update({
      attempts: trx.raw('attempts + 1'),
      last_error_id: errorId,
      state: trx.raw(`case when attempts + 1 >= ? then 'failed' else 'waiting' end`, [maxAttempts]),
    });
}
