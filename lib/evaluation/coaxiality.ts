import { z } from 'zod';
import { type Dec, plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import { decimalText, nonNegativeDecimal, tooFew } from './decimal-text';
import { fitLine, slopeUmPerM } from './line';
import { refuseRepeats, type Series, seriesFromFractions, seriesFromTexts } from './series';
import { type SweptCentre, sweepReadings, sweptCentre, sweptSurface } from './sweep';

const section = z.strictObject({ position: decimalText, readings: sweepReadings });

export const coaxialityInput = z.strictObject({
  method: z.literal('coaxiality'),
  sections: z.array(section).min(1, tooFew(1, 'section')),
  surface: sweptSurface,
  sag: nonNegativeDecimal.optional(),
  up: decimalText.optional(),
  basis: z.enum(['offset', 'total-indicator-reading']).optional(),
  plane: z.enum(['both', 'x', 'y']).optional(),
});

/**
 * Coaxiality of two axes, one carrying the indicator and sweeping a mandrel, ring or bore of the other.
 *
 * Per section ex, ey (see `sweptCentre`), offset = √(ex² + ey²), closure. Tilt: least-squares slopes of ex and ey over
 * the sections, tilt = √(tiltX² + tiltY²). Judged: the largest offset (in one plane the largest |ex| or |ey|), twice
 * that for a total indicator reading.
 *
 * @param sections position mm (all different), readings µm at 0, 90, 180, 270°
 * @param sag µm ≥ 0 (0), up ° (90): see `sweptCentre`
 * @returns sections; tiltX, tiltY, tilt µm/m with two or more sections
 * @throws EvaluationError a position twice
 * @example 0/90/180/270 = 10, 4, 2, 8 on an outside → ex 4, ey −2, offset 4.472…, closure 0
 * Source: common practice; ISO 230-1:2012 for the terms (from memory).
 */
export function coaxiality(input: z.output<typeof coaxialityInput>) {
  const { sections, surface, sag = '0', up = '90', basis = 'offset', plane = 'both' } = input;
  const x = seriesFromTexts(sections.map((s) => s.position));
  refuseRepeats(x, (i) => ['sections', i, 'position'], 'position');
  const centres = sections.map((s) => sweptCentre(s.readings, surface, sag, up));
  const factor = Fraction.of(basis === 'offset' ? 1 : 2);
  return {
    method: 'coaxiality' as const,
    deviation: judged(centres, plane, factor),
    judgedBy: `${basis === 'offset' ? 'largest offset' : 'largest total indicator reading'} of the axes${plane === 'both' ? '' : ` in ${plane}`}`,
    signed: false as const,
    sections: centres.map(({ ex, ey, closure }) => ({
      ex: ex.toText(),
      ey: ey.toText(),
      offset: plain(squaredOffset({ ex, ey }).squareRoot()),
      closure: closure.toText(),
    })),
    ...(sections.length > 1 && tilts(x, centres)),
  };
}

function squaredOffset({ ex, ey }: Pick<SweptCentre, 'ex' | 'ey'>): Fraction {
  return ex.squared().plus(ey.squared());
}

function judged(centres: readonly SweptCentre[], plane: 'both' | 'x' | 'y', factor: Fraction): string {
  if (plane === 'both') return plain(Fraction.max(centres.map(squaredOffset)).times(factor.squared()).squareRoot());
  const amounts = centres.map(({ ex, ey }) => (plane === 'x' ? ex : ey).abs());
  return Fraction.max(amounts).times(factor).toText();
}

function tilts(positions: Series, centres: readonly SweptCentre[]) {
  const slope = (figures: Fraction[]) => slopeUmPerM(fitLine(positions, seriesFromFractions(figures), 'least-squares'));
  const tiltX = slope(centres.map((c) => c.ex));
  const tiltY = slope(centres.map((c) => c.ey));
  const tilt: Dec = tiltX.squared().plus(tiltY.squared()).squareRoot();
  return { tiltX: tiltX.toText(), tiltY: tiltY.toText(), tilt: plain(tilt) };
}
