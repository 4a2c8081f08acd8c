import { headlineWords, signedOutcomeWords } from './record-words';
import type { ReportModel } from './report-model';

export interface CustomerSignature {
  outcome: 'accept' | 'accept-with-remarks' | 'refuse';
  name: string;
  functionTitle: string | null;
  company: string | null;
  signedAt: string;
  reason: string | null;
  typed: string | null;
  strokes: string[] | null;
  /** `on the inspector's tablet, witnessed by …` and the like. */
  evidence: string;
  remarks: ReportModel['remarks'];
}

const states = { accept: 'signed', 'accept-with-remarks': 'signed-with-remarks', refuse: 'refused' } as const;

/** The issued document with the customer's answer on it; nothing else differs from what was shown. */
export function withSignature(model: ReportModel, signature: CustomerSignature): ReportModel {
  const remarkNo = (order: number) => signature.remarks.find((remark) => remark.sheetOrder === order)?.no ?? null;
  const accepted = model.summary.filter(
    (row) => row.unit !== 'items' && row.asLeftVerdict === 'out-of-tolerance' && remarkNo(row.order) !== null,
  ).length;
  return {
    ...model,
    headline:
      accepted > 0 && signature.outcome !== 'refuse' ? headlineWords(model.counts.asLeft, 0, accepted) : model.headline,
    summary: model.summary.map((row) => ({ ...row, remarkNo: row.remarkNo ?? remarkNo(row.order) })),
    document: { ...model.document, state: states[signature.outcome] },
    remarks: [...model.remarks, ...signature.remarks],
    signatures: model.signatures.map((block) =>
      block.role === 'customer'
        ? {
            ...block,
            name: signature.name,
            function: signature.functionTitle,
            company: signature.company,
            signedAt: signature.signedAt,
            outcome: `${signedOutcomeWords[signature.outcome]} (${signature.evidence})`,
            reason: signature.reason,
            typed: signature.typed,
            strokes: signature.strokes,
          }
        : block,
    ),
  };
}
