import { directionSign } from '@/lib/evaluation';
import { becauseOf, furtherFigures, verdictText } from '@/lib/reporting/result-text';
import { toleranceSource } from '@/lib/reporting/tolerance-source';
import { shownUnit, toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import type { SheetOutcome, SheetRules } from '@/lib/sheet/types';
import { convert } from '@/lib/units/convert';
import { formatDecimal } from '@/lib/units/format';
import { Fraction } from '@/lib/units/fraction';
import type { TestDefinition } from '@/standards/types';
import type { ExplainedStep } from './explanation';
import { fig, negative } from './figures';

export type Judged = Extract<SheetOutcome, { state: 'partial' | 'complete' }>;

/** After the method's own steps: rounding, tolerance, distance, further limits, verdict. */
export function judgingSteps(outcome: Judged, rules: SheetRules, definition: TestDefinition): ExplainedStep[] {
  const { judgement, displayed } = outcome;
  const unit = shownUnit(displayed);
  const rounded = roundingSteps(outcome, definition);
  const { toleranceUm } = judgement;
  if (toleranceUm === null || !rules.tolerance) {
    return [
      ...rounded,
      { what: 'Verdict', formula: 'no tolerance is given', withNumbers: '', value: 'for information' },
    ];
  }
  const kept = keptUnit(definition);
  const local = judgement.local;
  return [
    ...rounded,
    {
      what: `Tolerance: ${toleranceSource(rules.tolerance, definition.code)}`,
      formula: rules.tolerance.perLength ? 'T0 · L/L0, never below the floor' : 'T as it stands',
      withNumbers: judgement.toleranceArithmetic ?? `${fig(toleranceUm)} ${kept}`,
      value: withUnit(formatDecimal(toleranceShown(toleranceUm, unit)), unit),
    },
    ...distanceSteps(outcome, rules, kept),
    ...(local
      ? [
          {
            what: `Local limit over any ${fig(local.lengthMm)} mm: ${verdictText(local.verdict, unit)}`,
            formula: 'T local − local figure',
            withNumbers: `${fig(local.toleranceUm)} − ${fig(local.deviationUm)}`,
            value: `${difference(local.toleranceUm, local.deviationUm)} ${kept}`,
          },
        ]
      : []),
    ...furtherFigures(judgement, { text: displayed.textMm, unit }).map(({ label, value, limit, words }) => ({
      what: label,
      formula: 'figure ≤ its own limit',
      withNumbers: `${value} against ${limit}`,
      value: words,
    })),
    {
      what: `Verdict, ${rules.decisionRule === 'guarded' ? 'guarded acceptance' : 'simple acceptance'}, on the unrounded figure`,
      formula: 'within while the distance is 0 or more',
      withNumbers: becauseOf(judgement),
      value: verdictText(judgement.verdict, unit),
    },
  ];
}

/** Angles are kept in µm/m, everything else in µm. */
const keptUnit = ({ shownIn }: TestDefinition) => (shownIn === 'mm/m' || shownIn === '″' ? 'µm/m' : 'µm');

const difference = (a: string, b: string) => fig(Fraction.from(a).minus(Fraction.from(b)).toText());

function roundingSteps({ result, displayed, input }: Judged, definition: TestDefinition): ExplainedStep[] {
  const { valueUm, byForm, rule } = definition.resolution;
  const step = (input && 'toolHeight' in input && byForm?.heights) || valueUm;
  const arcsec = definition.shownIn === '″';
  const inSeconds = arcsec ? convert(result.deviation, 'µm/m', 'arcsec') : result.deviation;
  const more = displayed.extraDigits > 0 ? ', with more digits so that a passed limit is not hidden' : '';
  return [
    ...(arcsec
      ? [
          {
            what: 'In seconds of arc',
            formula: 'figure · 648000 / (1000000 · π)',
            withNumbers: `${fig(result.deviation)} · 648000 / (1000000 · 3.14159265)`,
            value: `${fig(inSeconds)} ″`,
          },
        ]
      : []),
    {
      what: `Rounded once for showing${more}`,
      formula: rule === 'half-even' ? 'a tie goes to the even multiple' : 'a tie goes away from zero',
      withNumbers: `${fig(inSeconds)} in steps of ${fig(step)} ${arcsec ? '″' : keptUnit(definition)}`,
      value: withUnit(formatDecimal(displayed.textMm), shownUnit(displayed)),
    },
  ];
}

/** From the figure to its limit; of one-sided figures to zero too. */
function distanceSteps({ judgement, result }: Judged, rules: SheetRules, kept: string): ExplainedStep[] {
  const { limitUm, marginUm, direction, toleranceUm } = judgement;
  if (limitUm === null || marginUm === null || toleranceUm === null) {
    const what = 'Distance to the limit: guarded acceptance needs an uncertainty, and none is stated';
    return [{ what, formula: '', withNumbers: '', value: 'cannot be said' }];
  }
  const u = rules.standardUncertaintyUm;
  const guard: ExplainedStep[] =
    rules.decisionRule === 'guarded' && u
      ? [
          {
            what: 'Limit: tolerance less the guard band',
            formula: 'T − 1.65 · u',
            withNumbers: `${fig(toleranceUm)} − 1.65 · ${fig(u)}`,
            value: `${fig(limitUm)} ${kept}`,
          },
        ]
      : [];
  const side = directionSign(direction);
  const y = side === 0 ? `|${fig(result.deviation)}|` : side > 0 ? negative(result.deviation) : minus(result.deviation);
  return [
    ...guard,
    {
      what: side === 0 ? 'Distance to the limit' : 'Distance to the nearer end, the limit or zero',
      formula: side === 0 ? 'limit − |figure|' : 'the smaller of limit − y and y, y positive on the permitted side',
      withNumbers: side === 0 ? `${fig(limitUm)} − ${y}` : `min(${fig(limitUm)} − ${y}; ${y})`,
      value: `${fig(marginUm)} ${kept}`,
    },
  ];
}

const minus = (text: string) => `(−${negative(text)})`;
