import type { EvaluationResult } from '@/lib/evaluation';
import { ruleSet } from '@/lib/evaluation';
import { verdictText } from '@/lib/reporting/result-text';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, SheetRules } from '@/lib/sheet/types';
import type { TestDefinition } from '@/standards/types';
import { explain } from './explain';
import type { Explanation } from './explanation';
import { type Judged, judgingSteps } from './judging-steps';

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
    steps: [...own.steps, ...judgingSteps(outcome, rules, definition)],
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
