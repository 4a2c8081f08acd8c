import type { ResultOf } from '@/lib/evaluation';
import { type Figure, shown, slope, um } from './figure-text';

export const twoCollarFigures = (result: ResultOf<'two-collar'>): Figure[] => [
  { label: 'slope', value: slope(result.slope) },
  { label: 'difference of the diameters', value: um(result.diameterDifference) },
];

export const roundnessFigures = (result: ResultOf<'roundness'>): Figure[] => [
  { label: 'about the minimum-zone centre', value: um(result.minimumZone) },
  { label: 'about the least-squares centre', value: um(result.leastSquares) },
];

export const diameterFigures = (result: ResultOf<'diameter-consistency'>): Figure[] => [
  { label: 'taper, near the headstock less far end', value: um(result.taper) },
  { label: 'slope of the radius', value: slope(result.slope) },
];

export const driftFigures = (result: ResultOf<'drift'>): Figure[] => [
  { label: 'range in the first hour', value: um(result.firstHour) },
  { label: 'rate', value: `${shown(result.rate, '0.01')} µm/h` },
  ...(result.temperatureRange === undefined
    ? []
    : [{ label: 'range of the temperature', value: `${shown(result.temperatureRange, '0.1')} °C` }]),
];
