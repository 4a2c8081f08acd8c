import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimalText, tooFew } from './decimal-text';
import { fitLine } from './line';
import { refuseRepeats, seriesFromTexts, smallestOf } from './series';

const point = z.strictObject({ minutes: decimalText, reading: decimalText, temperature: decimalText.optional() });

export const driftInput = z.strictObject({
  method: z.literal('drift'),
  points: z.array(point).min(2, tooFew(2, 'points')),
});

/**
 * Drift between tool and workpiece over time.
 *
 * firstHour = range of the readings within 60 min of the first; range over all (judged); rate = least-squares slope
 * over all · 60.
 *
 * @param points minutes (all different), reading µm, temperature °C; at least 2, any order
 * @returns firstHour, range = deviation µm; rate µm/h; temperatureRange °C where temperatures are given
 * @throws EvaluationError a time twice
 * @example 0 µm at 0 min, 2 at 60, 3 at 120 → firstHour 2, range 3, rate 1.5 µm/h
 * Source: common practice; tests after ISO 230-3 and ISO 13041-8:2004 (from memory).
 */
export function drift(input: z.output<typeof driftInput>) {
  const { points } = input;
  const minutes = seriesFromTexts(points.map((p) => p.minutes));
  refuseRepeats(minutes, (i) => ['points', i, 'minutes'], 'time');
  const hourEnd = smallestOf(minutes.values) + 60n * minutes.unit;
  const readings = points.map((p) => Fraction.from(p.reading));
  const range = Fraction.range(readings).toText();
  const line = fitLine(minutes, seriesFromTexts(points.map((p) => p.reading)), 'least-squares');
  const temperatures = points.flatMap((p) => (p.temperature === undefined ? [] : [Fraction.from(p.temperature)]));
  return {
    method: 'drift' as const,
    deviation: range,
    judgedBy: 'range over all readings',
    signed: false as const,
    firstHour: Fraction.range(readings.filter((_, i) => minutes.values[i]! <= hourEnd)).toText(),
    range,
    rate: line.slope.times(Fraction.of(60)).toText(),
    ...(temperatures.length > 0 && { temperatureRange: Fraction.range(temperatures).toText() }),
  };
}
