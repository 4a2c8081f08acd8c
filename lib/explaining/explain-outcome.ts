import type { EvaluationResult } from '@/lib/evaluation';
import { ruleSet } from '@/lib/evaluation';
import { becauseOf, furtherFigures, verdictText } from '@/lib/reporting/result-text';
import { toleranceSource } from '@/lib/reporting/tolerance-source';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import { shownUnit, toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import type { Cells, SheetOutcome, SheetRules } from '@/lib/sheet/types';
import { formatDecimal } from '@/lib/units/format';
import type { TestDefinition } from '@/standards/types';
import { explain } from './explain';
import type { ExplainedStep, Explanation } from './explanation';
import { fig } from './figures';

type Judged = Extract<SheetOutcome, { state: 'partial' | 'complete' }>;

export interface ReadingUsed {
  label: string;
  /** As it was typed, with the unit of its column where none was typed with it. */
  figure: string;
  pointer: string;
}

export interface SheetExplanation extends Explanation {
  readings: ReadingUsed[];
}

/**
 * How the result of a sheet came about, from what was typed to the verdict: readings as typed, the method's own steps, then rounding,
 * tolerance and verdict.
 */
export function explainOutcome(
  outcome: Judged,
  rules: SheetRules,
  definition: TestDefinition,
  cells: Cells,
): SheetExplanation {
  const readings = readingsUsed(definition, cells);
  if (outcome.result.method === 'function-check' || outcome.input === null)
    return { ...checks(outcome, rules), readings };
  const own = explain(outcome.input, outcome.result as EvaluationResult);
  return {
    ...own,
    ruleSet: rules.ruleSet ?? ruleSet,
    readings,
    steps: [...own.steps, ...judging(outcome, rules, definition)],
  };
}

function readingsUsed(definition: TestDefinition, cells: Cells): ReadingUsed[] {
  return allFields(sheetFields(definition, cells)).flatMap(({ pointer, label, unit, options }) => {
    const cell = cells[pointer];
    const text = cell?.text.trim() ?? '';
    if (text === '') return [];
    const chosen = options?.find(({ value }) => value === text)?.label;
    const shown = cell?.unit ?? unit;
    return [{ label, figure: chosen ?? (shown ? `${text} ${shown}` : text), pointer }];
  });
}

function judging(outcome: Judged, rules: SheetRules, definition: TestDefinition): ExplainedStep[] {
  const { judgement, displayed, result } = outcome;
  const unit = shownUnit(displayed);
  const { valueUm, rule } = definition.resolution;
  const rounded: ExplainedStep = {
    what: `Rounded once for showing${displayed.extraDigits > 0 ? ', with more digits so that a passed limit is not hidden' : ''}`,
    formula: rule === 'half-even' ? 'a tie goes to the even multiple' : 'a tie goes away from zero',
    withNumbers: `${fig(result.deviation)} in steps of ${fig(valueUm)}`,
    value: withUnit(formatDecimal(displayed.textMm), unit),
  };
  const { toleranceUm, limitUm, marginUm } = judgement;
  if (toleranceUm === null || !rules.tolerance) {
    return [rounded, { what: 'Verdict', formula: 'no tolerance is given', withNumbers: '', value: 'for information' }];
  }
  const local = judgement.local;
  return [
    rounded,
    {
      what: `Tolerance: ${toleranceSource(rules.tolerance, definition.code)}`,
      formula: rules.tolerance.perLength ? 'T0 · L/L0, never below the floor' : 'T as it stands',
      withNumbers: judgement.toleranceArithmetic ?? fig(toleranceUm),
      value: withUnit(formatDecimal(toleranceShown(toleranceUm, unit)), unit),
    },
    ...(local
      ? [
          {
            what: `Local limit over any ${fig(local.lengthMm)} mm`,
            formula: 'local ≤ T local',
            withNumbers: `${fig(local.deviationUm)} against ${fig(local.toleranceUm)}`,
            value: verdictText(local.verdict, unit),
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
      what: `Verdict, ${rules.decisionRule === 'guarded' ? 'guarded acceptance' : 'simple acceptance'}, on the unrounded figure${becauseOf(judgement) ? ` (${becauseOf(judgement)})` : ''}`,
      formula: 'margin = limit − figure, 0 or more is within',
      withNumbers:
        limitUm === null || marginUm === null
          ? 'uncertainty not stated'
          : `limit ${fig(limitUm)}, margin ${fig(marginUm)}`,
      value: verdictText(judgement.verdict, unit),
    },
  ];
}

function checks({ result, judgement }: Judged, rules: SheetRules): Explanation {
  const items = result.method === 'function-check' ? result.items : [];
  const out = items.filter(({ inOrder }) => inOrder === false);
  return {
    method: 'function-check',
    title: 'Function check',
    ruleSet: rules.ruleSet ?? ruleSet,
    source: {
      kind: 'derived',
      text: 'an item is in order when it is answered yes and its figure lies within its limits',
    },
    steps: [
      {
        what: 'Items that are not in order',
        formula: 'count of “no” and of figures outside their limits',
        withNumbers: out.map(({ id }) => id).join(', ') || 'none',
        value: result.deviation,
      },
      {
        what: 'Verdict',
        formula: 'none is out of order',
        withNumbers: '',
        value: verdictText(judgement.verdict, 'items'),
      },
    ],
  };
}
