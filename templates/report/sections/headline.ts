import { checkCountWords } from '@/lib/reporting/record-words';
import type { Counts, ReportModel } from '@/lib/reporting/report-model';
import { dateSpan, sentence } from '@/lib/reporting/report-text';
import { toleranceSourceWords } from '@/lib/reporting/tolerance-source';
import { REPORT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, slabItem, space } from '@/templates/report/flow/ops';
import type { Kit } from '@/templates/report/flow/parts';
import { type Column, table, tableWidth } from '@/templates/report/flow/table';
import { TYPE } from '@/templates/report/theme';

/** The outcome in one sentence, what it rests on in the next, and the counts as found and as left. */
export function headline(kit: Kit, model: ReportModel): FlowItem[] {
  const { job, conditions } = model;
  const rests = [
    `${sentence(job.purpose)}, ${dateSpan(job.from, job.to)}.`,
    job.codes.length ? `${job.codes.join(', ')}.` : '',
    `${REPORT_WORDS.decisionRule}: ${job.decisionRule}.`,
    conditions.airRange ? `${sentence(conditions.airRange)}.` : '',
    toleranceSourceWords(model.toleranceSources),
  ];
  const checks = checkCountWords(model.checks);
  const restsOn = rests
    .filter((part) => part !== '')
    .join(' ')
    .replaceAll('..', '.');
  return [
    slabItem(kit.type.paragraph(model.headline, TYPE.headline, kit.widthPt), {
      keepWithNext: true,
      bookmark: model.headline,
    }),
    space(3),
    slabItem(kit.type.paragraph(restsOn, TYPE.quiet, kit.widthPt)),
    space(10),
    counts(kit, model),
    ...(checks ? [space(5), slabItem(kit.type.paragraph(checks, TYPE.strong, kit.widthPt))] : []),
  ];
}

const COUNTED = [
  'planned',
  'judged',
  'within',
  'out',
  'undecided',
  'forInformation',
  'leftOut',
  'notMeasured',
] as const;

function counts(kit: Kit, model: ReportModel): FlowItem {
  const words = REPORT_WORDS.counts;
  const first: Column = { head: '', widthPt: 66, style: TYPE.strong };
  const widthPt =
    (kit.widthPt - tableWidth([first, ...COUNTED.map(() => ({ head: '', widthPt: 0 }))])) / COUNTED.length;
  const columns = [
    first,
    ...COUNTED.map((key): Column => ({ head: words[key], widthPt, align: 'right', style: TYPE.figure })),
  ];
  const row = (name: string, count: Counts) => [name, ...COUNTED.map((key) => String(count[key]))];
  const { asFound, asLeft } = REPORT_WORDS.summary;
  return table(kit.type, columns, [row(asFound, model.counts.asFound), row(asLeft, model.counts.asLeft)]);
}
