import { renderToBuffer } from '@react-pdf/renderer';
import { plotDrawing } from '@/components/plots/plot-geometry';
import { drawingSlab } from '@/templates/report/flow/drawing-slab';
import { type FlowItem, moved, slabItem, space } from '@/templates/report/flow/ops';
import { paginate } from '@/templates/report/flow/pager';
import { heading, type Kit } from '@/templates/report/flow/parts';
import { naturalWidth, table } from '@/templates/report/flow/table';
import { Typesetter } from '@/templates/report/flow/typesetter';
import { loadFonts } from '@/templates/report/fonts';
import { ReportDocument } from '@/templates/report/report-document';
import { footer } from '@/templates/report/sections/page-frame';
import { MARGIN_PT, PAPERS, TYPE } from '@/templates/report/theme';
import { sampleReportModel } from '../helpers/sample-report-model';
import { type SamplePage, seriesOf } from './report-sample';

/** The comparison's pages with the report's own parts: table, plot, foot, paginating, and the document around them. */
export async function ours(samples: readonly SamplePage[]): Promise<Buffer> {
  const type = new Typesetter(await loadFonts());
  const paper = PAPERS.A4;
  const kit: Kit = { type, widthPt: paper.widthPt - MARGIN_PT.left - MARGIN_PT.right };
  const model = sampleReportModel();
  const contents = samples.flatMap((sample) =>
    paginate(onePage(kit, sample), paper.heightPt - MARGIN_PT.top - MARGIN_PT.bottom),
  );
  const pages = contents.map(({ slabs, bookmarks }, index) => ({
    ops: [
      ...slabs.map(({ slab, yPt }) => moved(slab, MARGIN_PT.left, MARGIN_PT.top + yPt)),
      {
        op: 'group' as const,
        x: MARGIN_PT.left,
        y: paper.heightPt - 40,
        ops: footer(kit, model, { no: index + 1, of: contents.length }),
      },
    ],
    bookmarks,
  }));
  type.assertComplete();
  return renderToBuffer(<ReportDocument model={model} made={{ paper, type, pages }} date={new Date(0)} photos={{}} />);
}

function onePage(kit: Kit, sample: SamplePage): FlowItem[] {
  const columns = sample.columns.map((head, index) => ({
    head,
    widthPt: naturalWidth(
      kit.type,
      { head, style: TYPE.figure },
      sample.rows.map((row) => row[index] ?? ''),
    ),
    align: 'decimal' as const,
    style: TYPE.figure,
  }));
  const plot = plotDrawing(seriesOf(sample), { widthPx: 680, heightPx: 260, toleranceUm: '15' });
  return [
    ...heading(kit, sample.title),
    table(kit.type, columns, sample.rows, 'close'),
    space(12),
    slabItem(drawingSlab(kit.type, plot, kit.widthPt)),
  ];
}
