import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, SheetOutcome, SheetRules } from '@/lib/sheet/types';
import type { Unit } from '@/lib/units/unit';
import type { Layout, PlannedTolerance, TestDefinition } from '@/standards/types';

const source = { kind: 'common-practice' as const, text: 'made up for a check of the sheet' };

export const limit = (baseUm: string, more: Partial<PlannedTolerance> = {}): PlannedTolerance => ({
  baseUm,
  foundBy: 'the check',
  provenance: source,
  ...more,
});

/** A definition made up for one layout; what does not bear on the sheet is left as short as it can be. */
export function ownDefinition(method: string, layout: Layout, more: Partial<TestDefinition> = {}): TestDefinition {
  return {
    id: 'OWN',
    code: 'checks',
    edition: '',
    version: 1,
    title: 'Check',
    boundTitle: 'Check',
    procedure: [],
    appliesTo: { kind: 'machine' },
    method,
    layout,
    tolerance: null,
    direction: 'either',
    resolution: { valueUm: '0.1', rule: 'half-even' },
    instruments: [],
    cautions: [],
    sketch: { scene: 'checklist' },
    dependsOn: { components: [], moved: [], positioned: [] },
    workingStep: 1,
    judgedFigure: 'deviation',
    source,
    ...more,
  };
}

/** `[text, unit]` where the unit was typed with the figure. */
export type Typed = Record<string, string | readonly [text: string, unit: Unit]>;

export const cellsOf = (typed: Typed): Cells =>
  Object.fromEntries(
    Object.entries(typed).map(([pointer, entry]) => [
      pointer,
      typeof entry === 'string' ? { text: entry, unit: null } : { text: entry[0], unit: entry[1] },
    ]),
  );

/** `/forward/0`, `['1', '2']` → `/forward/0/0`, `/forward/0/1`. */
export const list = (prefix: string, texts: readonly string[], suffix = ''): Record<string, string> =>
  Object.fromEntries(texts.map((text, k) => [`${prefix}/${k}${suffix}`, text]));

export const outcomeOf = (
  definition: TestDefinition,
  typed: Typed,
  tolerance: PlannedTolerance | null = null,
  rules: Partial<SheetRules> = {},
): SheetOutcome =>
  judgeSheet(
    { definition, tolerance, direction: definition.direction, decisionRule: 'simple', ...rules },
    definition,
    cellsOf(typed),
  );

export const orderOf = (definition: TestDefinition, typed: Typed): string[] =>
  sheetFields(definition, cellsOf(typed)).order;

/** The outcome of a sheet that has a result. */
export function judged(outcome: SheetOutcome) {
  if (outcome.state !== 'partial' && outcome.state !== 'complete') throw new Error(JSON.stringify(outcome));
  return outcome;
}

/** Why there is no result yet. */
export function reasonOf(outcome: SheetOutcome): string {
  if (outcome.state !== 'not-yet') throw new Error(outcome.state);
  return outcome.reason;
}
