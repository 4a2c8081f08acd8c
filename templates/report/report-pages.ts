import type { ReportModel } from '@/lib/reporting/report-model';
import type { FlowItem, Op } from '@/templates/report/flow/ops';
import { moved } from '@/templates/report/flow/ops';
import { paginate } from '@/templates/report/flow/pager';
import type { Kit } from '@/templates/report/flow/parts';
import { Typesetter } from '@/templates/report/flow/typesetter';
import type { Fonts } from '@/templates/report/fonts';
import { annex } from '@/templates/report/sections/annex';
import { conditions } from '@/templates/report/sections/conditions';
import { headline } from '@/templates/report/sections/headline';
import { instruments } from '@/templates/report/sections/instruments';
import { letterhead } from '@/templates/report/sections/letterhead';
import { machineAndJob } from '@/templates/report/sections/machine-and-job';
import { nameplate } from '@/templates/report/sections/nameplate';
import { notInPlan } from '@/templates/report/sections/not-in-plan';
import { draftMark, footer } from '@/templates/report/sections/page-frame';
import { remarks } from '@/templates/report/sections/remarks';
import { signatures } from '@/templates/report/sections/signatures';
import { statement } from '@/templates/report/sections/statement';
import { summary } from '@/templates/report/sections/summary';
import { testBlock } from '@/templates/report/sections/test-block';
import { MARGIN_PT, PAPERS } from '@/templates/report/theme';

export interface ReportPages {
  paper: { widthPt: number; heightPt: number };
  type: Typesetter;
  pages: { ops: Op[]; bookmarks: { title: string; yPt: number }[] }[];
}

/**
 * The whole report as pages of things to paint, before anything is painted.
 * @throws MissingGlyphError where a word of the model has a character that no font has
 */
export function reportPages(model: ReportModel, fonts: Fonts): ReportPages {
  const paper = PAPERS[model.paper];
  const type = new Typesetter(fonts);
  const kit: Kit = { type, widthPt: paper.widthPt - MARGIN_PT.left - MARGIN_PT.right };
  const contents = paginate(sections(kit, model), paper.heightPt - MARGIN_PT.top - MARGIN_PT.bottom);
  const draft = model.document.state === 'draft';
  const pages = contents.map(({ slabs, bookmarks }, index) => {
    const body = slabs.map(({ slab, yPt }) => moved(slab, MARGIN_PT.left, MARGIN_PT.top + yPt));
    const foot = footer(kit, model, { no: index + 1, of: contents.length });
    const frame: Op = { op: 'group', x: MARGIN_PT.left, y: paper.heightPt - MARGIN_PT.bottom + 14, ops: foot };
    return {
      ops: [...(draft ? [draftMark(paper)] : []), ...body, frame],
      bookmarks: bookmarks.map(({ title, yPt }) => ({ title, yPt: yPt + MARGIN_PT.top })),
    };
  });
  type.assertComplete();
  return { paper, type, pages };
}

function sections(kit: Kit, model: ReportModel): FlowItem[] {
  return [
    ...letterhead(kit, model),
    ...nameplate(kit, model),
    ...headline(kit, model),
    ...machineAndJob(kit, model),
    ...conditions(kit, model),
    ...instruments(kit, model),
    ...summary(kit, model),
    ...notInPlan(kit, model),
    ...model.blocks.flatMap((block) => testBlock(kit, block)),
    ...remarks(kit, model),
    ...signatures(kit, model),
    ...statement(kit, model),
    ...annex(kit, model),
  ];
}
