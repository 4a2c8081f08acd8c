import type { Db } from '@/db/client';
import { listRemarks } from '@/db/queries/remarks';
import { listSignatures, type ReportRow, type SignatureRow } from '@/db/queries/reports';
import { formatTime } from '@/lib/reporting/format-time';
import type { ReportModel } from '@/lib/reporting/report-model';
import { withSignature } from '@/lib/reporting/with-signature';
import type { Outcome } from '@/lib/schemas/signature';

const evidence = (signature: SignatureRow) =>
  signature.method === 'on-tablet' ? `on the inspector’s tablet, witnessed by ${signature.witness}` : 'signed in';

/** The frozen document, with the customer's answer once there is one. */
export async function signedModel(db: Db, report: ReportRow): Promise<ReportModel> {
  const customer = (await listSignatures(db, report.id)).find((signature) => signature.role === 'customer');
  if (!customer) return report.model;
  const { timeZone } = await db('organisations').first({ timeZone: 'time_zone' });
  const remarks = (await listRemarks(db, report.jobId)).filter((remark) => remark.reportId === report.id);
  return withSignature(report.model, {
    outcome: customer.outcome as Outcome,
    name: customer.name,
    functionTitle: customer.functionTitle,
    company: customer.company,
    signedAt: formatTime(customer.signedAt, timeZone),
    reason: customer.reason,
    typed: customer.typed,
    strokes: customer.strokes,
    evidence: evidence(customer),
    remarks: remarks.map((remark) => ({
      no: remark.number,
      sheetOrder: remark.sheetPosition,
      text: remark.text,
      owner: remark.owner,
      due: remark.dueOn,
      closed: null,
    })),
  });
}
