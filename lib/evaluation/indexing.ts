import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimals, label, positiveDecimal, tooFew } from './decimal-text';

export const indexingInput = z.strictObject({
  method: z.literal('indexing'),
  stations: z.array(z.strictObject({ name: label, readings: decimals(2, 'readings') })).min(1, tooFew(1, 'station')),
  radius: positiveDecimal.optional(),
  judge: z.enum(['repeatability', 'accuracy']).optional(),
});

/**
 * Repeatability and accuracy of indexing a turret or rotary table.
 *
 * Per station max − min (worst = repeatability); departures = station mean − mean of the station means, largest amount
 * = accuracy. With a radius also as angles: µm/radius·1000.
 *
 * @param stations name, readings µm (at least 2); @param radius mm of the readings from the axis
 * @returns ranges, worst, worstStation, departures, largestDeparture µm; worstAngle, largestDepartureAngle µm/m
 * @throws EvaluationError no station, fewer than 2 readings of one, a radius not above zero
 * @example stations 0, 2 and 5, 6 → ranges 2, 1; departures −2.25, 2.25
 * Source: common practice; tests after ISO 13041-1:2020 (from memory).
 */
export function indexing(input: z.output<typeof indexingInput>) {
  const { stations, judge = 'repeatability' } = input;
  const readings = stations.map((station) => station.readings.map(Fraction.from));
  const ranges = readings.map(Fraction.range);
  const means = readings.map(Fraction.mean);
  const centre = Fraction.mean(means);
  const departures = means.map((mean) => mean.minus(centre));
  const worst = Fraction.max(ranges);
  const largestDeparture = Fraction.max(departures.map((departure) => departure.abs()));
  const radius = input.radius ? Fraction.from(input.radius) : null;
  const angle = (figure: Fraction, mm: Fraction) => figure.times(Fraction.of(1000)).dividedBy(mm).toText();
  return {
    method: 'indexing' as const,
    deviation: (judge === 'repeatability' ? worst : largestDeparture).toText(),
    judgedBy:
      judge === 'repeatability' ? 'largest range of a station' : 'largest departure of a station from their mean',
    signed: false as const,
    ranges: ranges.map((range) => range.toText()),
    worst: worst.toText(),
    worstStation: stations[ranges.findIndex((range) => range.equals(worst))]!.name,
    departures: departures.map((departure) => departure.toText()),
    largestDeparture: largestDeparture.toText(),
    ...(radius && { worstAngle: angle(worst, radius), largestDepartureAngle: angle(largestDeparture, radius) }),
  };
}
