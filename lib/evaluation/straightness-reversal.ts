import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimals, decimalText } from './decimal-text';
import { refuse } from './evaluation-error';
import { fitLine, LINE_TYPES } from './line';
import { refuseRepeats, seriesFromFractions, seriesFromTexts } from './series';
import { STRAIGHTNESS_JUDGED_BY } from './straightness';

export const straightnessReversalInput = z.strictObject({
  method: z.literal('straightness-reversal'),
  positions: decimals(3, 'positions'),
  first: z.array(decimalText),
  second: z.array(decimalText),
  reference: z.enum(LINE_TYPES).optional(),
});

/**
 * Straightness of a motion and of the straightedge, told apart by turning the straightedge by 180° about its length,
 * the sensor on its other side, push-in positive in both runs.
 *
 * machine = (second − first)/2, + = away from the edge in the first run; straightedge = (first + second)/2, + = the
 * edge stands out; the straightness of each about its own line.
 *
 * @param positions mm, all different, at least 3; @param first, second µm, one a position
 * @param reference line of both, default minimum-zone
 * @returns machine, straightedge µm; machineStraightness (= deviation), straightedgeStraightness µm
 * @throws EvaluationError lists of different length, a position twice
 * @example first 0, 1, 0; second 0, 3, 0 → machine 0, 1, 0; straightedge 0, 2, 0
 * Source: common practice (reversal of a straightedge).
 */
export function straightnessReversal(input: z.output<typeof straightnessReversalInput>) {
  const { positions, reference = 'minimum-zone' } = input;
  for (const name of ['first', 'second'] as const) {
    if (input[name].length !== positions.length) {
      refuse([name], `${input[name].length} readings for ${positions.length} positions: one a position is needed`);
    }
  }
  const x = seriesFromTexts(positions);
  refuseRepeats(x, (i) => ['positions', i], 'position');
  const first = input.first.map(Fraction.from);
  const second = input.second.map(Fraction.from);
  const half = Fraction.of(1, 2);
  const machine = first.map((reading, i) => second[i]!.minus(reading).times(half));
  const straightedge = first.map((reading, i) => second[i]!.plus(reading).times(half));
  const widthOf = (profile: Fraction[]) => fitLine(x, seriesFromFractions(profile), reference).deviation.toText();
  const machineStraightness = widthOf(machine);
  return {
    method: 'straightness-reversal' as const,
    deviation: machineStraightness,
    judgedBy: `${STRAIGHTNESS_JUDGED_BY[reference]}, of the motion`,
    signed: false as const,
    machine: machine.map((figure) => figure.toText()),
    straightedge: straightedge.map((figure) => figure.toText()),
    machineStraightness,
    straightedgeStraightness: widthOf(straightedge),
  };
}
