import type { ReportModel } from '@/lib/reporting/report-model';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { moved, type Op } from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { TYPE } from '@/templates/report/theme';

/** Foot of every page: document number and revision, serial number, page x of y. Takes a second line where they do not fit side by side. */
export function footer(kit: Kit, model: ReportModel, page: { no: number; of: number }): Op[] {
  const { type, widthPt } = kit;
  const { number, revision, state } = model.document;
  const style = { ...TYPE.code, sizePt: 8 };
  const draft = state === 'draft' ? ` · ${REPORT_WORDS.draft}` : '';
  const document = `${number} ${REPORT_WORDS.revisionShort}${revision}${draft}`;
  const pages = `${REPORT_WORDS.page} ${page.no} ${REPORT_WORDS.of} ${page.of}`;
  const serial = model.machine.serialNumber;
  const side = Math.max(type.width(document, style), type.width(pages, style)) + 12;
  const fits = type.width(serial, style) <= widthPt - 2 * side;
  const serialOps = fits
    ? [moved(type.line(serial, style, widthPt / 2, 'middle'), 0, 0)]
    : [moved(type.paragraph(serial, style, widthPt), 0, style.leadPt)];
  return [moved(type.line(document, style), 0, 0), ...serialOps, moved(type.line(pages, style, widthPt, 'end'), 0, 0)];
}

/** Behind everything on a page of a draft. */
export function draftMark(paper: { widthPt: number; heightPt: number }): Op {
  const style = { ...TYPE.title, sizePt: 120, ink: 'hair' as const };
  return { op: 'turned', x: paper.widthPt / 2, y: paper.heightPt / 2, deg: -52, text: REPORT_WORDS.draftMark, style };
}
