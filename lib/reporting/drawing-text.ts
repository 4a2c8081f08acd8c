import { DIRECTION_WORDS, PLOT_WORDS, SCENE_WORDS, SKETCH_WORDS, VERDICT_WORDS } from '@/lib/reporting/words';
import { toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import type { PlotSeries, Verdict } from '@/lib/sheet/types';
import type { BoundComponent, Direction, ShownIn, SketchSpec } from '@/standards/types';

/** `0° 180°`; more than four: the first, the last and how many. */
export function angleWords(anglesDeg: readonly string[] | undefined): string {
  if (!anglesDeg?.length) return SKETCH_WORDS.slowTurn;
  if (anglesDeg.length <= 4) return anglesDeg.map((deg) => `${deg}°`).join(' ');
  return `${anglesDeg[0]}° to ${anglesDeg.at(-1)}°, ${anglesDeg.length} places`;
}

/** Set-ups with no indicator in them: nothing has a plunger that could be pushed in. */
const WITHOUT_PLUNGER: ReadonlySet<SketchSpec['scene']> = new Set([
  'level-on-carriage',
  'level-steps',
  'angle-instrument',
  'laser-along-motion',
  'circular-gauge',
  'spindle-sensors',
  'rotary-axis',
  'two-collar-piece',
  'test-piece-cylinder',
  'test-piece-face',
  'test-piece-pattern',
  'drift-at-tool',
  'target-and-found',
  'checklist',
]);

/** What a set-up sketch shows, for somebody who cannot see it. */
export function sketchWords(spec: SketchSpec, component: BoundComponent): string {
  const parts = [`${SKETCH_WORDS.setUp}: ${SCENE_WORDS[spec.scene]}`];
  const ids = { ...component, plane: spec.plane ?? component.plane };
  for (const part of Object.keys(SKETCH_WORDS.parts) as (keyof typeof SKETCH_WORDS.parts)[]) {
    if (ids[part]) parts.push(`${SKETCH_WORDS.parts[part]} ${ids[part]}`);
  }
  if (spec.anglesDeg?.length) parts.push(angleWords(spec.anglesDeg));
  if (!WITHOUT_PLUNGER.has(spec.scene)) parts.push(SKETCH_WORDS.plungerInCounts);
  if (spec.positiveMeans) parts.push(`positive: ${spec.positiveMeans}`);
  return parts.join(', ');
}

/** The meaning of the sign as it stands under the sketch. */
export const signWords = (positiveMeans: string) =>
  positiveMeans.startsWith('+') ? positiveMeans : `+ ${positiveMeans}`;

const ruleTolerance = (toleranceUm: string, unit: ShownIn) =>
  unit === 'mm' ? `${toleranceUm} µm` : withUnit(toleranceShown(toleranceUm, unit), unit);

/** What a limit rule says, for somebody who cannot see it. */
export function limitRuleWords(rule: {
  shown: string | null;
  toleranceUm: string | null;
  direction: Direction;
  verdict: Verdict | null;
  unit?: ShownIn;
  expandedUncertaintyUm?: string | null;
  guardUm?: string | null;
}): string {
  const unit = rule.unit ?? 'mm';
  const tolerance = rule.toleranceUm === null ? '' : ruleTolerance(rule.toleranceUm, unit);
  const parts = [
    rule.shown === null ? 'Limit rule, nothing measured yet' : `Deviation ${withUnit(rule.shown, unit)}`,
    tolerance ? `tolerance ${tolerance}, ${DIRECTION_WORDS[rule.direction]}` : 'no tolerance given',
  ];
  if (rule.expandedUncertaintyUm) parts.push(`expanded uncertainty ${rule.expandedUncertaintyUm} µm`);
  if (rule.guardUm) parts.push(`guard ${rule.guardUm} µm`);
  if (rule.verdict) parts.push(VERDICT_WORDS[rule.verdict]);
  return parts.join(', ');
}

/** Unit at the end of an axis's name: `deviation, ″`. */
export const axisUnit = (label: string): string => label.match(/, ([^,]+)$/)?.[1]?.trim() ?? 'µm';

/** `20 traces, turn 1 to turn 20`. */
export const seriesWords = (count: number, first: string, last: string): string =>
  `${count} traces, ${first} to ${last}`;

/** What a plot shows, for somebody who cannot see it. */
export function plotWords(series: PlotSeries, toleranceUm: string | null): string {
  const names = [...new Set(series.points.flatMap((point) => (point.series ? [point.series] : [])))];
  const parts = [
    `${PLOT_WORDS[series.kind]}: ${series.points.length} readings, ${series.yLabel} over ${series.xLabel}`,
  ];
  if (names.length) parts.push(names.join(', '));
  if (series.fit) parts.push('fitted line dashed');
  if (toleranceUm !== null) parts.push(`tolerance ${toleranceUm} ${axisUnit(series.yLabel)}`);
  return parts.join('; ');
}
