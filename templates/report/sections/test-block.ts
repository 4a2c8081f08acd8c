import { limitRule } from '@/components/plots/limit-rule-geometry';
import type { PassBlock, TestBlock } from '@/lib/reporting/report-model';
import { longDate, sentence } from '@/lib/reporting/report-text';
import { becauseOf, judgedFigureText, limitText, passResultText, ruleDeviation } from '@/lib/reporting/result-text';
import { REPORT_WORDS, VERDICT_WORDS } from '@/lib/reporting/words';
import { drawingSlab } from '@/templates/report/flow/drawing-slab';
import {
  asSlab,
  beside,
  type FlowItem,
  heightOf,
  keptWithNext,
  type Slab,
  slabItem,
  space,
  stack,
} from '@/templates/report/flow/ops';
import { flowingText, heading, type Kit, markedWords, pairs } from '@/templates/report/flow/parts';
import { type Column, table, tableWidth } from '@/templates/report/flow/table';
import { furtherLimits } from '@/templates/report/sections/further-limits';
import { passReadings } from '@/templates/report/sections/pass-readings';
import { testPhotos } from '@/templates/report/sections/test-photos';
import { plotsSlab, sketchSlab } from '@/templates/report/sections/test-pictures';
import { TYPE } from '@/templates/report/theme';

const SIDE_PT = 165;
const GUTTER_PT = 18;
/** Readings stand beside the sketch up to this height; longer ones go below, over the whole width, where they can be split. */
const READINGS_BESIDE_PT = 260;

/**
 * Everything about one test: at the left the set-up and what is judged by what, at the right plots and readings; below them the limit
 * rule of the final result over the whole width.
 */
export function testBlock(kit: Kit, block: TestBlock): FlowItem[] {
  const head = heading(kit, `${block.order} · ${block.title}`, { after: componentOf(block), right: block.reference });
  const items: FlowItem[] = [space(2)];
  if (block.leftOut) items.push(...leftOut(kit, block.leftOut));
  else items.push(...(block.check ? checked(kit, block) : measured(kit, block)));
  items.push(...testPhotos(kit, block.photos));
  if (block.remark) items.push(space(4), flowingText(kit, `${REPORT_WORDS.block.remark}: ${block.remark}`));
  const [gap, titled] = head as [FlowItem, FlowItem];
  return [gap, { kind: 'together', items: [titled, ...items, ...corrections(kit, block)] }];
}

/** What the test is bound to, unless the title names all of it. */
function componentOf({ title, component, componentWords }: TestBlock): string {
  const { spindle, axis, reference, turret, tailstock } = component;
  const ids = [spindle, axis, reference, turret, tailstock].filter((id) => id !== undefined);
  return ids.length && ids.every((id) => title.includes(id)) ? '' : componentWords;
}

/** A function check: its items, over the whole width; nothing is set up, drawn or held against a limit. */
function checked(kit: Kit, block: TestBlock): FlowItem[] {
  return passReadings(kit, block.passes);
}

function measured(kit: Kit, block: TestBlock): FlowItem[] {
  const side: Kit = { ...kit, widthPt: SIDE_PT };
  const main: Kit = { ...kit, widthPt: kit.widthPt - SIDE_PT - GUTTER_PT };
  const plots = plotsSlab(main, block);
  const readings = passReadings(main, block.passes);
  const narrow = heightOf(readings) <= READINGS_BESIDE_PT;
  const pictured = (left: readonly Slab[], right: readonly Slab[]) =>
    beside([
      { slab: stack(left, 4), x: 0 },
      { slab: stack(right, 6), x: SIDE_PT + GUTTER_PT },
    ]);
  const drawn = plots ? [plots] : [];
  if (narrow) {
    const judged = asSlab([pairs(side, details(block), { columns: 1, labelPt: 52, small: true })]);
    const all = pictured([sketchSlab(side, block), judged], [...drawn, asSlab(readings)]);
    return [slabItem(all, { keepWithNext: true }), ...finalResult(kit, block)];
  }
  const judged = pairs(kit, details(block), { columns: 2, labelPt: 52, small: true });
  return [
    slabItem(pictured([sketchSlab(side, block)], drawn), { keepWithNext: true }),
    space(4),
    judged,
    space(6),
    ...keptWithNext(passReadings(kit, block.passes)),
    ...finalResult(kit, block),
  ];
}

function leftOut(kit: Kit, { reason, text }: NonNullable<TestBlock['leftOut']>): FlowItem[] {
  const line = markedWords(kit, 'left-out', `${REPORT_WORDS.block.leftOut}: ${reason}`, TYPE.strong, kit.widthPt);
  return [slabItem(line, { keepWithNext: text !== null }), ...(text ? [space(2), flowingText(kit, text)] : [])];
}

/** The pass that is judged in the end: as left, else as found. */
function finalPass(block: TestBlock): PassBlock | null {
  const judged = block.passes.filter((pass) => pass.kind !== 'adjusting' && pass.resultMm !== null);
  return judged.findLast((pass) => pass.kind === 'as-left') ?? judged.at(-1) ?? null;
}

function finalResult(kit: Kit, block: TestBlock): FlowItem[] {
  const pass = finalPass(block);
  if (!pass?.judgement || pass.resultMm === null) return [];
  const { verdict, toleranceUm, limitUm, marginUm, direction, local } = pass.judgement;
  // A figure without a sign never has words for its direction, and is never below zero.
  const signed = block.passes.some((each) => each.judgement?.signed);
  const rule = limitRule({
    deviationUm: ruleDeviation(pass),
    toleranceUm,
    limitUm,
    direction,
    signed,
    verdict,
    shown: pass.resultMm,
    unit: pass.resultUnit,
    widthPx: 880,
  });
  const words = REPORT_WORDS.block;
  const parts = [
    `${sentence(pass.kindWords)} ${passResultText(pass)}`,
    becauseOf(pass.judgement),
    pass.resultWords ?? '',
    marginUm === null ? '' : `${judgedFigureText(marginUm, pass)} ${words.margin}`,
    local
      ? `${words.local} ${judgedFigureText(local.deviationUm, pass)} ${words.over} ${local.lengthMm} mm, T ${limitText(local.toleranceUm, pass.resultUnit)}, ${VERDICT_WORDS[local.verdict]}`
      : '',
  ];
  const line = markedWords(
    kit,
    verdict,
    parts.filter((part) => part !== '').join(' · '),
    { ...TYPE.firm, sizePt: 9.5 },
    kit.widthPt,
  );
  return [
    space(6),
    slabItem(drawingSlab(kit.type, rule, kit.widthPt), { keepWithNext: true }),
    space(2),
    slabItem(line),
    ...furtherLimits(kit, pass),
  ];
}

/** Only what is known, each with its name. */
function details(block: TestBlock): { label: string; value: string }[] {
  const words = REPORT_WORDS.block;
  const arithmetic = finalPass(block)?.judgement?.toleranceArithmetic;
  const entries: [string, string | null][] = [
    [words.judged, block.judgedFigure],
    [words.tolerance, arithmetic ? `${block.toleranceWords}; ${arithmetic}` : block.toleranceWords],
    [words.source, block.toleranceSource],
    [words.direction, block.directionWords],
    [words.instruments, block.instruments.join(' · ')],
    [words.ruleSet, block.ruleSet ?? null],
  ];
  return entries.flatMap(([label, value]) => (value ? [{ label, value }] : []));
}

/** Readings that stood differently before: what was typed first, what stands now, who changed it and when. */
function corrections(kit: Kit, block: TestBlock): FlowItem[] {
  const changed = block.passes.flatMap((pass) =>
    pass.corrections.map((correction) => ({ ...correction, pass: pass.kindWords })),
  );
  if (!changed.length) return [];
  const words = REPORT_WORDS.block;
  const field: Column = { head: words.corrected, widthPt: 0 };
  const columns: Column[] = [
    field,
    { head: words.was, widthPt: 52, align: 'right', style: TYPE.figure },
    { head: words.now, widthPt: 52, align: 'right', style: TYPE.figure },
    { head: words.by, widthPt: 70 },
    { head: words.at, widthPt: 92 },
    { head: words.reason, widthPt: 80 },
  ];
  field.widthPt = kit.widthPt - tableWidth(columns);
  const rows = changed.map((c) => [
    `${c.pass}, ${c.field}`,
    c.was,
    c.now,
    c.by,
    longDate(c.at),
    c.reason ?? REPORT_WORDS.none,
  ]);
  return [space(4), table(kit.type, columns, rows)];
}
