import { z } from 'zod';
import { type Dec, plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { decimalText, nonNegativeDecimal, positiveDecimal, tooFew } from './decimal-text';
import { refuse } from './evaluation-error';
import { surfaceSign, sweepReadings, sweptCentre, sweptSurface } from './sweep';

export const centreHeightInput = z.strictObject({
  method: z.literal('centre-height'),
  sweep: sweepReadings.optional(),
  top: decimalText.optional(),
  bottom: decimalText.optional(),
  toolHeight: decimalText.optional(),
  spindleHeight: decimalText.optional(),
  surface: sweptSurface.optional(),
  sag: nonNegativeDecimal.optional(),
  up: decimalText.optional(),
  radii: z.array(positiveDecimal).min(1, tooFew(1, 'radius')).optional(),
});

type Input = z.output<typeof centreHeightInput>;
type Field = 'sweep' | 'top' | 'bottom' | 'toolHeight' | 'spindleHeight' | 'surface' | 'sag' | 'up';

/** The three ways to measure: the fields that name the way, and the others it takes. */
const FORMS: { needs: Field[]; takes: Field[] }[] = [
  { needs: ['sweep', 'surface'], takes: ['sag', 'up'] },
  { needs: ['top', 'bottom', 'surface'], takes: ['sag'] },
  { needs: ['toolHeight', 'spindleHeight'], takes: [] },
];
const FIELDS: Field[] = ['sweep', 'top', 'bottom', 'toolHeight', 'spindleHeight', 'surface', 'sag', 'up'];

/**
 * Height of a tool hole or tool against the spindle axis, tool above the axis positive.
 *
 * By sweep: ey, ex as `sweptCentre`. By top and bottom: ey = q(top − bottom)/2 − sag, q = +1 outside, −1 bore. By two
 * heights: ey = toolHeight − spindleHeight. Error of a diameter turned at radius r: 2(√(r² + ey²) − r) ≈ ey²/r.
 *
 * @param sweep µm at 0, 90, 180, 270° (0 = first axis, 90 = height) | top, bottom µm | toolHeight, spindleHeight µm
 * @param radii mm > 0: radii at which the effect on the diameter is wanted
 * @returns ey µm, ex µm (sweep only), diameterEffects µm in the order of `radii`; deviation = ey, signed
 * @throws EvaluationError no form, or fields of two forms
 * @example height error 100 µm: diameter error about 10 µm at r = 1 mm, 2 µm at 5, 0.4 µm at 25
 * Source: common practice; diameter effect derived (Pythagoras).
 */
export function centreHeight(input: Input) {
  const { ex, ey } = heights(input);
  return {
    method: 'centre-height' as const,
    deviation: ey.toText(),
    judgedBy: 'height of the tool against the spindle axis, above positive',
    signed: true as const,
    ey: ey.toText(),
    ...(ex && { ex: ex.toText() }),
    ...(input.radii && { diameterEffects: input.radii.map((radius) => plain(diameterEffect(radius, ey))) }),
  };
}

function heights(input: Input): { ex?: Fraction; ey: Fraction } {
  const form = FORMS.find(({ needs }) => needs.some((field) => field !== 'surface' && input[field] !== undefined));
  if (!form) return refuse([], 'sweep, or top and bottom, or toolHeight and spindleHeight, is needed');
  for (const field of form.needs) if (input[field] === undefined) refuse([field], 'is needed with the fields given');
  for (const field of FIELDS) {
    if (input[field] !== undefined && ![...form.needs, ...form.takes].includes(field)) {
      refuse([field], `does not belong with ${form.needs[0]!}`);
    }
  }
  const { sweep, surface, sag = '0', up = '90' } = input;
  if (sweep) return sweptCentre(sweep, surface!, sag, up);
  if (form.needs.includes('top')) {
    const half = surfaceSign(surface!).times(Fraction.of(1, 2));
    return { ey: Fraction.from(input.top!).minus(Fraction.from(input.bottom!)).times(half).minus(Fraction.from(sag)) };
  }
  return { ey: Fraction.from(input.toolHeight!).minus(Fraction.from(input.spindleHeight!)) };
}

/** 2(√(r² + h²) − r) written as 2h²/(√(r² + h²) + r), which loses no digits where h is small against r. */
function diameterEffect(radiusMm: string, heightUm: Fraction): Dec {
  const radius = Fraction.from(radiusMm).times(Fraction.of(1000));
  const square = heightUm.squared();
  const root = radius.squared().plus(square).squareRoot();
  return square.times(Fraction.of(2)).toDec().div(root.plus(radius.toDec()));
}
