import type { Knex } from 'knex';
import { inScope, systemScope } from '@/db/client';
import { newId } from '@/lib/id';
import { sendMail } from '@/lib/mail/send-mail';

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

/**
 * Sends one mail of the outbox, for the worker. Repeating it is safe: a mail that was sent is not sent again, and if the process dies
 * between the mail server's yes and our note of it, the second copy carries the same message id, by which it is recognised.
 * @throws what the mail server said, so that the queue tries again later
 */
export async function deliverOutboxMail(organisationId: string, outboxId: string): Promise<void> {
  try {
    await inScope(systemScope(organisationId), async (trx) => {
      const mail: WaitingMail | undefined = await trx('outbox')
        .where({ id: outboxId })
        .whereNot({ state: 'sent' })
        .forUpdate()
        .first({
          recipient: 'recipient',
          subject: 'subject',
          text: 'text_body',
          html: 'html_body',
          messageId: 'message_id',
        });
      if (!mail) return;
      const { recipient: to, ...content } = mail;
      await sendMail({ to, ...content });
      await trx('outbox')
        .where({ id: outboxId })
        .update({ state: 'sent', sent_at: trx.fn.now(), attempts: trx.raw('attempts + 1') });
    });
  } catch (error) {
    await noteFailure(organisationId, outboxId, error);
    throw error;
  }
}

async function noteFailure(organisationId: string, outboxId: string, error: unknown): Promise<void> {
  const errorId = newId();
  console.error(JSON.stringify({ errorId, outboxId, message: String(error) }));
  await inScope(systemScope(organisationId), (trx) =>
    trx('outbox')
      .where({ id: outboxId })
      .update({
        attempts: trx.raw('attempts + 1'),
        last_error_id: errorId,
        state: trx.raw(`case when attempts + 1 >= ? then 'failed' else 'waiting' end`, [maxAttempts]),
      }),
  );
}
