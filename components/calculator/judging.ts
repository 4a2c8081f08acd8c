import { PERMISSIBLE_DIRECTIONS, type PermissibleDirection } from '@/lib/evaluation';
import { read } from '@/lib/sheet/read-cell';
import type { SheetRules } from '@/lib/sheet/types';
import { convert } from '@/lib/units/convert';
import { Dec } from '@/lib/units/decimal';
import type { Unit } from '@/lib/units/unit';
import type { PlannedTolerance, ShownIn } from '@/standards/types';

/** What a visitor wrote about tolerance and verdict, as typed. */
export interface JudgingTexts {
  tolerance: string;
  direction: string;
  rule: string;
  uncertainty: string;
  basis: string;
}

export const noJudging: JudgingTexts = {
  tolerance: '',
  direction: 'either',
  rule: 'simple',
  uncertainty: '',
  basis: 'offset',
};

/** Unit in which tolerance and uncertainty are typed where none stands behind them, and the one that they are judged in. */
export const judgingUnits: Record<Exclude<ShownIn, 'items'>, { typed: Unit; words: string; judged: Unit }> = {
  mm: { typed: 'mm', words: 'mm', judged: 'µm' },
  'mm/m': { typed: 'mm/m', words: 'mm/m', judged: 'µm/m' },
  '″': { typed: 'arcsec', words: '″', judged: 'µm/m' },
};

export interface ReadJudging {
  rules: SheetRules;
  problems: { tolerance: string; uncertainty: string };
}

/** Rules by which the calculator judges; without a tolerance a result is for information. */
export function readJudging(texts: JudgingTexts, shownIn: ShownIn): ReadJudging {
  const { typed, judged } = judgingUnits[shownIn === 'items' ? 'mm' : shownIn];
  const figure = (text: string) => {
    const outcome = read({ text, unit: null }, typed);
    if (outcome.state === 'empty') return { value: null, problem: '' };
    if (outcome.state === 'bad') return { value: null, problem: outcome.problem };
    if (new Dec(outcome.value).lte(0)) return { value: null, problem: 'It must be above zero.' };
    return { value: convert(outcome.value, typed, judged), problem: '' };
  };
  const tolerance = figure(texts.tolerance);
  const uncertainty = figure(texts.uncertainty);
  const planned: PlannedTolerance | null =
    tolerance.value === null
      ? null
      : {
          baseUm: tolerance.value,
          basis: texts.basis === 'total-indicator-reading' ? 'total-indicator-reading' : 'offset',
          foundBy: '',
          provenance: { kind: 'contract', text: 'as it was typed here' },
        };
  const guarded = texts.rule === 'guarded';
  return {
    rules: {
      definition: { id: 'calculator', code: 'calculator', edition: '', version: 1 },
      tolerance: planned,
      direction: directionOf(texts.direction),
      decisionRule: guarded ? 'guarded' : 'simple',
      standardUncertaintyUm: uncertainty.value,
    },
    problems: {
      tolerance: tolerance.problem,
      uncertainty:
        uncertainty.problem ||
        (guarded && uncertainty.value === null && planned ? 'Guarded acceptance needs the standard uncertainty.' : ''),
    },
  };
}

const directionOf = (text: string): PermissibleDirection =>
  PERMISSIBLE_DIRECTIONS.find((direction) => direction === text) ?? 'either';
