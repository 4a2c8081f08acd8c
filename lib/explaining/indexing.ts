import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { alike, atLargestAmount, extremes, fig, meanOf, meanText, negative, rangeOf, um, umPerM } from './figures';
import { maximum } from './run-outs';

export function indexingSteps(
  input: { judge?: string; radius?: string; stations: { name: string; readings: string[] }[] },
  result: ResultOf<'indexing'>,
): ExplainedStep[] {
  const accuracy = input.judge === 'accuracy';
  const { stations, radius } = input;
  const angle = accuracy ? result.largestDepartureAngle : result.worstAngle;
  const asAngle: ExplainedStep[] =
    radius === undefined || angle === undefined
      ? []
      : [
          {
            what: `The same as an angle at radius ${fig(radius)} mm, for information`,
            formula: 'figure / radius · 1000',
            withNumbers: `${fig(result.deviation)} / ${fig(radius)} · 1000`,
            value: umPerM(angle),
          },
        ];
  if (!accuracy) {
    const { atLargest } = extremes(result.ranges);
    const shown = [...new Set([0, 1, 2, atLargest])].filter((k) => k < stations.length);
    return [
      ...shown.map((k) => ({
        what: `Range of station ${stations[k]!.name}`,
        formula: 'max r − min r',
        withNumbers: rangeOf(stations[k]!.readings),
        value: um(result.ranges[k]!),
      })),
      ...alike(stations.length - shown.length),
      ...asAngle,
      {
        what: `Worst station: ${result.worstStation}`,
        formula: 'max of the ranges',
        withNumbers: maximum(result.ranges),
        value: um(result.deviation),
      },
    ];
  }
  const means = stations.map(({ readings }) => meanOf(readings));
  const worst = atLargestAmount(result.departures);
  const centre = meanOf(means);
  return [
    {
      what: 'Mean of the means of all stations',
      formula: 'Σ means / number of stations',
      withNumbers: meanText(means),
      value: um(centre),
    },
    {
      what: `Mean of station ${stations[worst]!.name}, which departs most`,
      formula: 'Σ r / n',
      withNumbers: meanText(stations[worst]!.readings),
      value: um(means[worst]!),
    },
    {
      what: 'Its departure',
      formula: 'd = mean of the station − mean of the means',
      withNumbers: `${fig(means[worst]!)} − ${negative(centre)}`,
      value: um(result.departures[worst]!),
    },
    ...asAngle,
    {
      what: 'Largest amount',
      formula: 'max |d|',
      withNumbers: `|${fig(result.departures[worst]!)}|`,
      value: um(result.deviation),
    },
  ];
}
