import type { ReportModel } from '@/lib/reporting/report-model';
import { standingWords } from '@/lib/reporting/report-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { beside, type FlowItem, slabItem, space, stack } from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

/** Who made the report at the left; what it is, its number, revision and state at the right. */
export function letterhead(kit: Kit, model: ReportModel): FlowItem[] {
  const { type, widthPt } = kit;
  const half = widthPt / 2 - 10;
  const { letterhead: head, document } = model;
  const address = [head.addressLines.join(' · '), head.contact ?? ''].filter((line) => line !== '');
  const left = stack([
    type.paragraph(head.name, TYPE.firm, half),
    ...address.map((line) => type.paragraph(line, TYPE.small, half)),
  ]);
  const right = stack([
    type.line(REPORT_WORDS.title, TYPE.title, half, 'end'),
    type.line(`${document.number} · ${REPORT_WORDS.revision} ${document.revision}`, TYPE.code, half, 'end'),
    type.line(standingWords(document), TYPE.small, half, 'end'),
  ]);
  return [
    slabItem(
      beside([
        { slab: left, x: 0 },
        { slab: right, x: widthPt - half },
      ]),
    ),
    space(12),
  ];
}
