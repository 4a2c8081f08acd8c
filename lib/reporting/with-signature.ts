import { signedOutcomeWords } from './record-words';
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
  return {
    ...model,
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
