import type { PassBlock } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { REPORT_WORDS, VERDICT_WORDS } from '@/lib/reporting/words';
import { type FlowItem, heightOf, moved, type Op, type Slab, slabItem, space } from '@/templates/report/flow/ops';
import { type Kit, markedWords } from '@/templates/report/flow/parts';
import { passTables, passWidth } from '@/templates/report/sections/pass-tables';
import { TYPE } from '@/templates/report/theme';

const GAP_PT = 24;
/** Two passes stand beside each other up to this height; higher ones below each other, where they can be split. */
const BESIDE_PT = 320;

/** As found and as left beside each other where they fit, adjusting ones in a line each. */
export function passReadings(kit: Kit, passes: readonly PassBlock[]): FlowItem[] {
  const full = passes.filter((pass) => pass.kind !== 'adjusting');
  const half = (kit.widthPt - GAP_PT) / 2;
  const narrow = full.every((pass) => passWidth(kit, pass) <= half);
  const columns = full.map((pass) => onePass(kit, pass, half));
  const beside = full.length === 2 && narrow && Math.max(...columns.map(heightOf)) <= BESIDE_PT;
  const readings = beside
    ? [slabItem(besideEachOther(columns, half))]
    : full.flatMap((pass, index) => [...(index ? [space(8)] : []), ...onePass(kit, pass, kit.widthPt)]);
  const adjusting = passes.filter((pass) => pass.kind === 'adjusting');
  const short = adjusting.flatMap((pass) => [space(2), slabItem(adjustingLine(kit, pass))]);
  return [...readings, ...(short.length ? [space(3), ...short] : [])];
}

function onePass(kit: Kit, pass: PassBlock, widthPt: number): FlowItem[] {
  const { type } = kit;
  const head = type.line(pass.kindWords, TYPE.strong);
  const after = type.width(pass.kindWords, TYPE.strong) + 8;
  const taken = [pass.takenAt ? longDate(pass.takenAt) : '', pass.by ?? '', pass.temperature ?? ''].filter(
    (part) => part !== '',
  );
  const details = type.paragraph(taken.join(' · '), { ...TYPE.small, leadPt: 11.5 }, widthPt - after);
  const title: Slab = {
    heightPt: Math.max(head.heightPt, details.heightPt) + 1,
    ops: [...head.ops, moved(details, after, 0)],
  };
  const items: FlowItem[] = [slabItem(title, { keepWithNext: true })];
  if (pass.linkedWords) items.push(slabItem(type.paragraph(pass.linkedWords, TYPE.body, widthPt)));
  if (pass.setUp.length) {
    const setUp = pass.setUp.map(({ label, value }) => `${label} ${value}`).join(' · ');
    items.push(
      slabItem(type.paragraph(`${REPORT_WORDS.block.setUp}: ${setUp}`, TYPE.small, widthPt), { keepWithNext: true }),
    );
  }
  return [...items, ...passTables(kit, pass, widthPt), space(4), slabItem(resultLine(kit, pass, widthPt))];
}

/** Mark, verdict and figure of one pass; its further figures below. */
function resultLine(kit: Kit, pass: PassBlock, widthPt: number): Slab {
  const verdict = pass.judgement?.verdict ?? 'not-measured';
  const words = pass.resultMm === null ? REPORT_WORDS.block.noResult : `${pass.resultMm} mm, ${VERDICT_WORDS[verdict]}`;
  const line = markedWords(kit, verdict, words, TYPE.strong, widthPt);
  if (!pass.figures.length) return line;
  const figures = pass.figures.map(({ label, value }) => `${label} ${value}`).join(' · ');
  const below = kit.type.paragraph(figures, TYPE.small, widthPt);
  return { heightPt: line.heightPt + below.heightPt + 1, ops: [...line.ops, moved(below, 0, line.heightPt + 1)] };
}

function adjustingLine(kit: Kit, pass: PassBlock): Slab {
  const verdict = pass.judgement?.verdict ?? 'not-measured';
  const result =
    pass.resultMm === null ? REPORT_WORDS.block.noResult : `${pass.resultMm} mm, ${VERDICT_WORDS[verdict]}`;
  const details = [pass.takenAt ? longDate(pass.takenAt) : '', pass.by ?? ''].filter((part) => part !== '');
  const name = kit.type.line(pass.kindWords, TYPE.quiet);
  const left = Math.max(92, kit.type.width(pass.kindWords, TYPE.quiet) + 10);
  const words = markedWords(
    kit,
    verdict,
    [result, ...details].join(' · '),
    { ...TYPE.body, face: 'sansMedium' },
    kit.widthPt - left,
  );
  return { heightPt: words.heightPt, ops: [...name.ops, moved(words, left, 0)] };
}

/** Both columns in one piece, heads and results on the same lines. */
function besideEachOther(columns: readonly FlowItem[][], widthPt: number): Slab {
  const ops: Op[] = columns.map((items, index) => {
    const own: Op[] = [];
    let y = 0;
    for (const item of items) {
      for (const slab of slabsOf(item)) {
        own.push(moved(slab, 0, y));
        y += slab.heightPt;
      }
      if (item.kind === 'space') y += item.heightPt;
    }
    return { op: 'group', x: index * (widthPt + GAP_PT), y: 0, ops: own };
  });
  return { heightPt: Math.max(...columns.map(heightOf)), ops };
}

function slabsOf(item: FlowItem): readonly Slab[] {
  if (item.kind === 'slab') return [item.slab];
  if (item.kind === 'rows') return item.header ? [item.header, ...item.rows] : item.rows;
  return item.kind === 'together' ? item.items.flatMap(slabsOf) : [];
}
