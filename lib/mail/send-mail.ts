import nodemailer, { type Transporter } from 'nodemailer';
import { env } from '@/lib/env';

export type Mail = {
  /** Fixed when the mail is written into the outbox, so that a second delivery is recognised as the same mail. */
  messageId: string;
  to: string;
  subject: string;
  text: string;
  html?: string;
  replyTo?: string;
  attachments?: { filename: string; content: Buffer; contentType: string }[];
};

let transporter: Transporter | undefined;

/**
 * Hands one mail to the mail server of `SMTP_URL`; answers what the server said. Throws when it did not accept the
 * mail, also when it refused only some of the addresses. The time limits keep a dead server from holding the queue.
 */
export async function sendMail(mail: Mail): Promise<{ response: string }> {
  transporter ??= nodemailer.createTransport(env.SMTP_URL, {
    from: env.MAIL_FROM,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  const { messageId, ...rest } = mail;
  const sent = await transporter.sendMail({ ...rest, messageId: `<${messageId.replace(/^<|>$/g, '')}>` });
  if (sent.rejected.length > 0)
    throw new Error(`The mail server refused ${sent.rejected.join(', ')}: ${sent.response}`);
  return { response: sent.response };
}
