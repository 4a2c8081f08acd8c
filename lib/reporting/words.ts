import type { PlotSeries, Verdict } from '@/lib/sheet/types';
import type { Direction } from '@/standards/types';

/**
 * The one dictionary of the report's words, English. Templates and drawings take every word from here, so that another language is
 * another file of the same shape.
 */

export const VERDICT_WORDS: Record<Verdict | 'disturbed' | 'not-measured' | 'left-out', string> = {
  'within-tolerance': 'within tolerance',
  'out-of-tolerance': 'out of tolerance',
  undecided: 'undecided',
  'for-information': 'for information',
  disturbed: 'disturbed',
  'not-measured': 'not measured',
  'left-out': 'left out',
};

/** For narrow columns: the mark beside it has the same shape as beside the long word. */
export const SHORT_VERDICT_WORDS: Record<keyof typeof VERDICT_WORDS, string> = {
  ...VERDICT_WORDS,
  'within-tolerance': 'within',
  'out-of-tolerance': 'out',
};

export const DIRECTION_WORDS: Record<Direction, string> = {
  either: 'either way',
  'concave-only': 'concave only',
  'convex-only': 'convex only',
  'rising-to-free-end': 'rising to the free end only',
  'toward-tool': 'toward the tool only',
  'tailstock-high': 'tailstock higher only',
};

/** What a limit rule says, for somebody who cannot see it. */
export function limitRuleWords(rule: {
  shown: string | null;
  toleranceUm: string | null;
  direction: Direction;
  verdict: Verdict | null;
  expandedUncertaintyUm?: string | null;
  guardUm?: string | null;
}): string {
  const parts = [
    rule.shown === null ? 'Limit rule, nothing measured yet' : `Deviation ${rule.shown} mm`,
    rule.toleranceUm === null
      ? 'no tolerance given'
      : `tolerance ${rule.toleranceUm} µm, ${DIRECTION_WORDS[rule.direction]}`,
  ];
  if (rule.expandedUncertaintyUm) parts.push(`expanded uncertainty ${rule.expandedUncertaintyUm} µm`);
  if (rule.guardUm) parts.push(`guard ${rule.guardUm} µm`);
  if (rule.verdict) parts.push(VERDICT_WORDS[rule.verdict]);
  return parts.join(', ');
}

const PLOT_KINDS: Record<PlotSeries['kind'], string> = {
  line: 'Readings along a length',
  polar: 'Readings round a turn',
  pairs: 'Readings of pairs of approaches',
};

/** What a plot shows, for somebody who cannot see it. */
export function plotWords(series: PlotSeries, toleranceUm: string | null): string {
  const names = [...new Set(series.points.flatMap((point) => (point.series ? [point.series] : [])))];
  const parts = [
    `${PLOT_KINDS[series.kind]}: ${series.points.length} readings, ${series.yLabel} over ${series.xLabel}`,
  ];
  if (names.length) parts.push(names.join(', '));
  if (series.fit) parts.push('fitted line dashed');
  if (toleranceUm !== null) parts.push(`tolerance ${toleranceUm} µm`);
  return parts.join('; ');
}
