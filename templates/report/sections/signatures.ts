import type { ReportModel, SignatureBlock } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { beside, type FlowItem, moved, type Op, type Slab, slabItem, space, stack } from '@/templates/report/flow/ops';
import { flowingText, heading, type Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

/** Box of a drawn signature's strokes. */
const STROKES = { width: 600, height: 200 };
const FIELD_PT = 62;

/** Signatures two in a row: drawn strokes or the typed name above the line; who, when and with what outcome below. */
export function signatures(kit: Kit, model: ReportModel): FlowItem[] {
  if (!model.signatures.length) return [];
  const widthPt = (kit.widthPt - 30) / 2;
  const slabs = model.signatures.map((signature) => signatureSlab(kit, signature, widthPt));
  const items = [...heading(kit, REPORT_WORDS.signatures.heading)];
  const rows: Slab[] = [];
  for (let at = 0; at < slabs.length; at += 2) {
    rows.push(beside(slabs.slice(at, at + 2).map((slab, index) => ({ slab, x: index * (widthPt + 30) }))));
  }
  // One piece: nobody's signature stands on a page without the others.
  items.push(slabItem(stack(rows, 14)));
  for (const { roleWords, reason } of model.signatures) {
    if (reason) items.push(space(6), flowingText(kit, `${roleWords}, ${REPORT_WORDS.signatures.reason}: ${reason}`));
  }
  return items;
}

function signatureSlab(kit: Kit, signature: SignatureBlock, widthPt: number): Slab {
  const { type } = kit;
  const line: Op = { op: 'line', x1: 0, y1: FIELD_PT, x2: widthPt, y2: FIELD_PT, ink: 'ink', widthPt: 1 };
  const field: Slab = { heightPt: FIELD_PT + 4, ops: [...mark(kit, signature), line] };
  const name = [signature.name, signature.function, signature.company].filter((part) => part).join(', ');
  const when = signature.signedAt ? longDate(signature.signedAt) : REPORT_WORDS.signatures.unsigned;
  const below = [
    type.paragraph(name, TYPE.strong, widthPt),
    type.paragraph([when, signature.outcome].filter((part) => part).join(' · '), TYPE.quiet, widthPt),
  ];
  return stack([type.line(signature.roleWords, TYPE.columnHead), field, ...below]);
}

function mark(kit: Kit, signature: SignatureBlock): Op[] {
  if (signature.strokes?.length) {
    const scale = (FIELD_PT - 4) / STROKES.height;
    const items = signature.strokes.map((d) => ({ kind: 'path' as const, d, stroke: 'ink' as const, widthPx: 4 }));
    return [{ op: 'drawing', x: 4, y: 2, scale, items }];
  }
  if (!signature.typed) return [];
  return [moved(kit.type.line(signature.typed, { ...TYPE.title, face: 'sans' }), 4, FIELD_PT - 26)];
}
