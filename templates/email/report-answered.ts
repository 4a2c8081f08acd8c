import type { ReportModel } from '@/lib/reporting/report-model';
import { type MailText, mailLayout } from './layout';

/** To the engineer and the office: the customer has answered. */
export function reportAnsweredMail(model: ReportModel, url: string): MailText {
  const { document, machine, letterhead, signatures } = model;
  const customer = signatures.find((block) => block.role === 'customer');
  return mailLayout({
    subject: `${document.number}: ${customer?.outcome ?? 'answered'} (${machine.serialNumber})`,
    paragraphs: [
      `${customer?.name ?? 'The customer'} has answered acceptance report ${document.number}, revision ${document.revision}, for ${machine.manufacturer} ${machine.model}, serial number ${machine.serialNumber}: ${customer?.outcome ?? ''}.`,
      ...(customer?.reason ? [`Reason: ${customer.reason}`] : []),
      ...model.remarks.map((remark) => `Remark ${remark.no}: ${remark.text}`),
    ],
    link: { label: 'Open the report', url },
    foot: `Sent for ${letterhead.name}.`,
  });
}
