import { inScope, systemScope } from '@/db/client';
import { lockUnsentMail, noteMailFailure, noteMailSent } from '@/db/queries/outbox';
import { newId } from '@/lib/id';
import { sendMail } from '@/lib/mail/send-mail';

/**
 * Sends one mail of the outbox, for the worker. Repeating it is safe: a mail that was sent is not sent again, and if the process dies
 * between the mail server's yes and our note of it, the second copy carries the same message id, by which it is recognised.
 * @throws what the mail server said, so that the queue tries again later
 */
export async function deliverOutboxMail(organisationId: string, outboxId: string): Promise<void> {
  try {
    await inScope(systemScope(organisationId), async (trx) => {
      const mail = await lockUnsentMail(trx, outboxId);
      if (!mail) return;
      const { recipient: to, ...content } = mail;
      await sendMail({ to, ...content });
      await noteMailSent(trx, outboxId);
    });
  } catch (error) {
    const errorId = newId();
    console.error(JSON.stringify({ errorId, outboxId, message: String(error) }));
    await inScope(systemScope(organisationId), (trx) => noteMailFailure(trx, outboxId, errorId));
    throw error;
  }
}
