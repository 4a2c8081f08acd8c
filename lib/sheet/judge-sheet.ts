import {
  assertKnownRuleSet,
  EvaluationError,
  type EvaluationInput,
  evaluateUnknown,
  type MeasuredResult,
  ruleSet,
} from '@/lib/evaluation';
import type { TestDefinition } from '@/standards/types';
import { directionWords, displayResult, judgeResult } from './judge-result';
import { checkResult, unreadableValues } from './layouts/check-list';
import { engineOf } from './layouts/engine-of';
import type { Assembled, SheetValues } from './layouts/layout-engine';
import { counted, isFilled } from './layouts/parts';
import { readCells } from './read-cells';
import { scaleTolerance } from './scale-tolerance';
import { allFields, sheetFields } from './sheet-fields';
import type { CellProblem, Cells, Judgement, SheetFields, SheetOutcome, SheetRules } from './types';

/**
 * One pass of a sheet, from what was typed to the verdict. Pure; quick enough to run at every keystroke, and the same in browser and
 * server. Stations that are not complete are left out and said so; what is missing is never read as 0.
 */
export function judgeSheet(rules: SheetRules, definition: TestDefinition, cells: Cells): SheetOutcome {
  assertKnownRuleSet(rules.ruleSet ?? ruleSet);
  const fields = sheetFields(definition, cells);
  const engine = engineOf(definition.layout);
  const toleranceUm = rules.tolerance?.baseUm ?? null;
  const { values, problems } = readCells(fields, cells, toleranceUm);
  const total = fields.order.length;
  const filled = fields.order.filter((pointer) => isFilled(cells, pointer)).length;
  if (filled === 0) return { state: 'empty', filled: 0, total, problems };

  const notYet = (reason: string): SheetOutcome => {
    return { state: 'not-yet', filled, total, reason, problems, plot: engine.plot(definition.layout, values, null) };
  };
  const unreadable = problems.find(({ severity }) => severity === 'cannot-read');
  if (unreadable) return notYet(`${capital(labelOf(fields, unreadable))}: ${unreadable.message}`);

  if (definition.layout.kind === 'check-list')
    return judgeChecks(definition, definition.layout, values, cells, { filled, total, problems });

  const assembled = engine.assemble(definition.layout, values, {
    definition,
    localLengthMm: rules.tolerance?.local?.lengthMm ?? null,
    basis: rules.tolerance?.basis ?? 'offset',
    toleranceUm,
  });
  if (assembled.input === null) return notYet(assembled.reason);
  const evaluated = tryEvaluate(assembled.input);
  if ('reason' in evaluated) return notYet(evaluated.reason);
  const { input, result } = evaluated;

  const scaled = rules.tolerance && scaleTolerance(rules.tolerance, assembled.lengthMm);
  const judgement = judgeResult(rules, result, scaled);
  const displayed = displayResult(definition, result, judgement, assembled.form);
  return {
    state: assembled.basedOn === null ? 'complete' : 'partial',
    filled,
    total,
    problems: [...problems, ...assembled.notes],
    basedOn: assembled.basedOn,
    input,
    result,
    judgement,
    displayed,
    directionWords: directionWords(definition, result, displayed),
    plot: engine.plot(definition.layout, values, result),
  };
}

type Evaluated = { input: EvaluationInput; result: MeasuredResult } | { reason: string };

function tryEvaluate(input: NonNullable<Assembled['input']>): Evaluated {
  try {
    const result = evaluateUnknown(input);
    if (!('deviation' in result) || !('signed' in result)) throw new Error(`${input.method} gives no deviation`);
    return { input: input as EvaluationInput, result };
  } catch (error) {
    if (!(error instanceof EvaluationError)) throw error;
    return { reason: error.issues.map(({ detail }) => `${capital(detail)}.`).join(' ') };
  }
}

/** A function check: in order when every item that is fitted is; what is not answered yet is said so. */
function judgeChecks(
  definition: TestDefinition,
  layout: Extract<TestDefinition['layout'], { kind: 'check-list' }>,
  values: SheetValues,
  cells: Cells,
  counts: { filled: number; total: number; problems: CellProblem[] },
): SheetOutcome {
  const unreadable = unreadableValues(layout, cells).map((each) => ({ ...each, severity: 'cannot-read' as const }));
  const problems = [...counts.problems, ...unreadable];
  if (unreadable[0]) return { ...counts, state: 'not-yet', reason: unreadable[0].message, problems, plot: null };
  const result = checkResult(layout, values);
  const answered = result.items.length;
  if (answered === 0)
    return { ...counts, state: 'not-yet', reason: 'A figure that has limits is asked for.', problems, plot: null };
  const judgement: Judgement = {
    verdict: result.deviation === '0' ? 'within-tolerance' : 'out-of-tolerance',
    signed: false,
    toleranceUm: null,
    toleranceArithmetic: null,
    limitUm: null,
    marginUm: null,
    direction: 'either',
    local: null,
  };
  return {
    ...counts,
    state: answered === layout.items.length ? 'complete' : 'partial',
    problems,
    basedOn: counted(answered, layout.items.length, 'items'),
    input: null,
    result,
    judgement,
    displayed: {
      textUm: result.deviation,
      textMm: result.deviation,
      extraDigits: 0,
      unit: definition.shownIn ?? 'items',
    },
    directionWords: null,
    plot: null,
  };
}

function labelOf(fields: SheetFields, problem: CellProblem): string {
  return allFields(fields).find(({ pointer }) => pointer === problem.pointer)?.label ?? problem.pointer;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
