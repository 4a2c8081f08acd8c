import { EvaluationError, type EvaluationInput, evaluateUnknown, type MeasuredResult } from '@/lib/evaluation';
import type { TestDefinition } from '@/standards/types';
import { directionWords, displayResult, judgeResult } from './judge-result';
import { engineOf } from './layouts/engine-of';
import type { Assembled } from './layouts/layout-engine';
import { isFilled } from './layouts/parts';
import { readCells } from './read-cells';
import { scaleTolerance } from './scale-tolerance';
import { allFields, sheetFields } from './sheet-fields';
import type { CellProblem, Cells, SheetFields, SheetOutcome, SheetRules } from './types';

/**
 * One pass of a sheet, from what was typed to the verdict. Pure; quick enough to run at every keystroke, and the same in browser and
 * server. Stations that are not complete are left out and said so; what is missing is never read as 0.
 */
export function judgeSheet(rules: SheetRules, definition: TestDefinition, cells: Cells): SheetOutcome {
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

function labelOf(fields: SheetFields, problem: CellProblem): string {
  return allFields(fields).find(({ pointer }) => pointer === problem.pointer)?.label ?? problem.pointer;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
