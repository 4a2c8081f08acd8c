import type { PassBlock } from '@/lib/reporting/report-model';
import { longDate } from '@/lib/reporting/report-text';
import { passResultText } from '@/lib/reporting/result-text';
import { REPORT_WORDS } from '@/lib/reporting/words';
import {
  asSlab,
  beside,
  type FlowItem,
  heightOf,
  moved,
  type Slab,
  slabItem,
  space,
} from '@/templates/report/flow/ops';
import { type Kit, markedWords } from '@/templates/report/flow/parts';
import { checkItems } from '@/templates/report/sections/check-items';
import { passTables, passWidth } from '@/templates/report/sections/pass-tables';
import { TYPE } from '@/templates/report/theme';

const GAP_PT = 14;
/** Two passes stand beside each other up to this height; higher ones below each other, where they can be split. */
const BESIDE_PT = 320;

/** As found and as left beside each other where they fit; adjusting ones, and an as left that is as found, in a line each. */
export function passReadings(kit: Kit, passes: readonly PassBlock[]): FlowItem[] {
  const full = passes.filter((pass) => pass.kind !== 'adjusting' && !pass.linkedWords);
  const half = (kit.widthPt - GAP_PT) / 2;
  const narrow = full.every((pass) => !pass.items && passWidth(kit, pass) <= half);
  const columns = full.map((pass) => onePass(kit, pass, half));
  const sideBySide = full.length === 2 && narrow && Math.max(...columns.map(heightOf)) <= BESIDE_PT;
  const readings = sideBySide
    ? [slabItem(beside(columns.map((items, index) => ({ slab: asSlab(items), x: index * (half + GAP_PT) }))))]
    : full.flatMap((pass, index) => [...(index ? [space(8)] : []), ...onePass(kit, pass, kit.widthPt)]);
  const short = passes.filter((pass) => !full.includes(pass));
  return [...readings, ...short.flatMap((pass) => [space(4), slabItem(shortPass(kit, pass))])];
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
  if (pass.setUp.length) {
    const setUp = pass.setUp.map(({ label, value }) => `${label} ${value}`).join(' · ');
    items.push(
      slabItem(type.paragraph(`${REPORT_WORDS.block.setUp}: ${setUp}`, TYPE.small, widthPt), { keepWithNext: true }),
    );
  }
  return [
    ...items,
    ...passTables(kit, pass, widthPt),
    ...checkItems(kit, pass, widthPt),
    space(4),
    slabItem(resultLine(kit, pass, widthPt)),
  ];
}

/** Mark, verdict and figure of one pass; its further figures below. */
function resultLine(kit: Kit, pass: PassBlock, widthPt: number): Slab {
  const verdict = pass.judgement?.verdict ?? 'not-measured';
  const line = markedWords(kit, verdict, passResultText(pass), TYPE.strong, widthPt);
  if (!pass.figures.length) return line;
  const figures = pass.figures.map(({ label, value }) => `${label} ${value}`).join(' · ');
  const below = kit.type.paragraph(figures, TYPE.small, widthPt);
  return { heightPt: line.heightPt + below.heightPt + 1, ops: [...line.ops, moved(below, 0, line.heightPt + 1)] };
}

/** What was done in a line: result, when, by whom. */
function shortPass(kit: Kit, pass: PassBlock): Slab {
  const verdict = pass.judgement?.verdict ?? 'not-measured';
  const result = passResultText(pass);
  const taken = [pass.takenAt ? longDate(pass.takenAt) : '', pass.by ?? ''];
  const details = pass.linkedWords ? [pass.linkedWords] : taken.filter((part) => part !== '');
  const name = kit.type.line(pass.kindWords, TYPE.strong);
  const left = kit.type.width(pass.kindWords, TYPE.strong) + 10;
  const style = { ...TYPE.body, face: 'sansMedium' as const };
  const words = markedWords(kit, verdict, [result, ...details].join(' · '), style, kit.widthPt - left);
  return { heightPt: words.heightPt, ops: [...name.ops, moved(words, left, 0)] };
}
