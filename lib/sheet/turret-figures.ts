import type { ResultOf } from '@/lib/evaluation';
import { type Figure, slope, um } from './figure-text';

export function indexingFigures(result: ResultOf<'indexing'>, input: unknown): Figure[] {
  const names = stationNames(input);
  const stations = result.ranges.map((range, k) => ({
    label: `station ${names[k]}`,
    value: `range ${um(range)}, departure ${um(result.departures[k]!)}`,
  }));
  const angle = (value: string | undefined) => (value === undefined ? '' : `, ${slope(value)}`);
  return [
    { label: 'largest range', value: `${um(result.worst)} at ${result.worstStation}${angle(result.worstAngle)}` },
    { label: 'largest departure', value: `${um(result.largestDeparture)}${angle(result.largestDepartureAngle)}` },
    ...stations,
  ];
}

export function centreHeightFigures(result: ResultOf<'centre-height'>, input: unknown): Figure[] {
  const radii = radiiOf(input);
  const effects = (result.diameterEffects ?? []).map((effect, k) => ({
    label: `effect on the diameter at r ${radii[k]} mm`,
    value: um(effect, '0.01'),
  }));
  return [
    ...(result.ex === undefined ? [] : [{ label: 'offset in X (for information)', value: um(result.ex) }]),
    ...effects,
  ];
}

const stationNames = (input: unknown): string[] =>
  (input as { stations: { name: string }[] }).stations.map(({ name }) => name);

function radiiOf(input: unknown): string[] {
  return (input as { radii?: string[] }).radii ?? [];
}
