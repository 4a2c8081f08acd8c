import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimals, decimalText, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { POSITIONING_FIGURES, positioningFigures } from './positioning-figures';
import { refuseRepeats, risingOrder, seriesFromTexts } from './series';

const runs = z.array(z.array(decimalText).min(1, tooFew(1, 'cycle')));

export const positioningInput = z.strictObject({
  method: z.literal('positioning'),
  kind: z.enum(['linear', 'rotary']),
  targets: decimals(2, 'targets'),
  forward: runs,
  backward: runs.optional(),
  judge: z.enum(POSITIONING_FIGURES).optional(),
  temperature: z.strictObject({ celsius: decimalText, alpha: decimalText, zero: decimalText.optional() }).optional(),
});

type Input = z.output<typeof positioningInput>;

const NAMES: Record<(typeof POSITIONING_FIGURES)[number], string> = {
  A: 'A, bidirectional accuracy of positioning',
  Aforward: 'A forward, unidirectional accuracy of positioning',
  Abackward: 'A backward, unidirectional accuracy of positioning',
  E: 'E, bidirectional systematic deviation of positioning',
  Eforward: 'E forward, unidirectional systematic deviation of positioning',
  Ebackward: 'E backward, unidirectional systematic deviation of positioning',
  R: 'R, bidirectional repeatability of positioning',
  Rforward: 'R forward, unidirectional repeatability of positioning',
  Rbackward: 'R backward, unidirectional repeatability of positioning',
  B: 'B, reversal value',
  meanB: 'amount of the mean reversal value',
  M: 'M, mean bidirectional positioning deviation',
};

/**
 * Accuracy and repeatability of positioning of a linear or rotary axis.
 *
 * x = actual − target; the formulas stand with `positioningFigures`. To 20 °C before everything else:
 * x20 = x − (P − zero)·alpha·(celsius − 20)/1000. Deviation: the figure named by `judge`, default A (without backward
 * runs A forward), with one cycle E (E forward).
 *
 * @param targets mm (rotary °), any order, all different, at least 2
 * @param forward, backward µm (rotary µm/m) [target][cycle], the same number of cycles everywhere
 * @param temperature celsius, alpha µm/(m·K), zero mm (0); linear only, never for readings already brought to 20 °C
 * @returns A, E, R each also forward and backward, B ≥ 0, meanB (signed), M; `at`: target of each; positions; cycles.
 *   With one cycle s, R and A are left out; without backward runs only the forward figures are given.
 * @throws EvaluationError lists of different length, unequal cycles, a target twice, a figure to judge not evaluated
 * @example see the reference vector of five targets in the tests: A 6.8634, E 6.1, R 2.8472, B 2.1, M 4.05 µm
 * Source: ISO 230-2:2014 (formulas from memory, checked against published reports).
 */
export function positioning(input: Input) {
  checkShape(input);
  const x = seriesFromTexts(input.targets);
  refuseRepeats(x, (i) => ['targets', i], 'target');
  const targets = input.targets.map(Fraction.from);
  const deviations = (list: string[][]) =>
    list.map((row, i) => row.map((text) => Fraction.from(text).minus(expansion(input, targets[i]!))));
  const { figures, positions, at, judgeable } = positioningFigures(
    targets,
    deviations(input.forward),
    input.backward ? deviations(input.backward) : null,
    risingOrder(x.values),
  );
  const cycles = input.forward[0]!.length;
  const usual = `${cycles > 1 ? 'A' : 'E'}${input.backward ? '' : 'forward'}` as keyof typeof figures;
  const judge = input.judge ?? usual;
  const deviation = judgeable[judge];
  if (deviation === undefined) return refuse(['judge'], 'is not evaluated from these runs');
  return {
    method: 'positioning' as const,
    deviation,
    judgedBy: NAMES[judge],
    signed: false as const,
    ...figures,
    at,
    positions,
    cycles: String(cycles),
  };
}

/** Growth of the scale at the target against 20 °C, µm. */
function expansion({ temperature }: Input, target: Fraction): Fraction {
  if (!temperature) return Fraction.zero;
  const { celsius, alpha, zero = '0' } = temperature;
  const over = Fraction.from(celsius).minus(Fraction.of(20));
  return target.minus(Fraction.from(zero)).times(Fraction.from(alpha)).times(over).dividedBy(Fraction.of(1000));
}

function checkShape({ kind, targets, forward, backward, temperature }: Input): void {
  if (temperature && kind === 'rotary') refuse(['temperature'], 'is for linear axes only');
  const cycles = forward[0]?.length;
  for (const [name, list] of Object.entries({ forward, backward })) {
    if (!list) continue;
    if (list.length !== targets.length)
      refuse([name], `${list.length} lists for ${targets.length} targets: one a target`);
    list.forEach((row, i) => {
      if (row.length !== cycles) refuse([name, i], `${row.length} cycles where the first target has ${cycles}`);
    });
  }
}
