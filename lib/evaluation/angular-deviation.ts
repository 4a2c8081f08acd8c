import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimals, decimalText } from './decimal-text';
import { refuse } from './evaluation-error';
import { refuseRepeats, risingOrder, seriesFromTexts } from './series';

export const angularDeviationInput = z.strictObject({
  method: z.literal('angular-deviation'),
  positions: decimals(2, 'positions'),
  forward: z.array(decimalText),
  backward: z.array(decimalText).optional(),
  kind: z.enum(['pitch', 'yaw', 'roll']).optional(),
});

/**
 * Angular deviation of a linear motion (pitch, yaw, roll): max − min over both directions together; hysteresis =
 * largest |forward − backward| at one position.
 * @param positions mm, all different, at least 2; @param forward, backward µm/m, one a position
 * @returns deviation µm/m; hysteresis µm/m and its position mm (the smallest on ties) with `backward`
 * @throws EvaluationError lists of different length, a position twice
 * @example forward 0, 4, 6; backward 1, 5, 8 → deviation 8, hysteresis 2 at the last position
 * Source: ISO 230-1:2012 (from memory).
 */
export function angularDeviation(input: z.output<typeof angularDeviationInput>) {
  const { positions, kind } = input;
  for (const name of ['forward', 'backward'] as const) {
    const list = input[name];
    if (list && list.length !== positions.length) {
      refuse([name], `${list.length} readings for ${positions.length} positions: one a position is needed`);
    }
  }
  const x = seriesFromTexts(positions);
  refuseRepeats(x, (i) => ['positions', i], 'position');
  const forward = input.forward.map(Fraction.from);
  const backward = input.backward?.map(Fraction.from);
  return {
    method: 'angular-deviation' as const,
    deviation: Fraction.range([...forward, ...(backward ?? [])]).toText(),
    judgedBy: `largest minus smallest ${kind ?? 'angle'} over the travel`,
    signed: false as const,
    ...(backward && hysteresis(risingOrder(x.values), positions, forward, backward)),
  };
}

function hysteresis(order: number[], positions: string[], forward: Fraction[], backward: Fraction[]) {
  const gap = (i: number) => forward[i]!.minus(backward[i]!).abs();
  const worst = order.reduce((best, i) => (gap(i).compare(gap(best)) > 0 ? i : best), order[0]!);
  return { hysteresis: gap(worst).toText(), hysteresisAt: Fraction.from(positions[worst]!).toText() };
}
