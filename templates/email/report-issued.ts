import type { ReportModel } from '@/lib/reporting/report-model';
import { type MailText, mailLayout } from './layout';

/** To the customer: a report is out and waits for an answer. */
export function reportIssuedMail(model: ReportModel, url: string): MailText {
  const { document, machine, letterhead } = model;
  return mailLayout({
    subject: `Acceptance report ${document.number} for ${machine.manufacturer} ${machine.model} ${machine.serialNumber}`,
    paragraphs: [
      `${letterhead.name} has issued acceptance report ${document.number}, revision ${document.revision}, for ${machine.manufacturer} ${machine.model}, serial number ${machine.serialNumber}.`,
      model.headline,
      'Please read it and accept it, accept it with remarks, or refuse it with a reason.',
    ],
    link: { label: 'Read the report', url },
    foot: `Sent for ${letterhead.name}. You get this because you are named for this machine.`,
  });
}
