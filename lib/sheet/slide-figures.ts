import type { ResultOf } from '@/lib/evaluation';
import { type Figure, slope, um } from './figure-text';

export const parallelismFigures = (result: ResultOf<'parallelism'>): Figure[] => [
  { label: 'slope', value: slope(result.fitSlope) },
  { label: 'last less first mean', value: um(result.difference) },
  { label: 'range of the means', value: um(result.range) },
];

export const squarenessFigures = (result: ResultOf<'squareness'>): Figure[] => [
  { label: 'squareness', value: slope(result.squareness) },
  ...(result.squareError === undefined ? [] : [{ label: "the square's own error", value: slope(result.squareError) }]),
];

export const fromAnglesFigures = (result: ResultOf<'straightness-from-angles'>): Figure[] => [
  { label: 'slope of the reference line', value: slope(result.slope) },
  ...(result.closure === undefined ? [] : [{ label: 'closure of the two runs', value: um(result.closure) }]),
];

export const reversalFigures = (result: ResultOf<'straightness-reversal'>): Figure[] => [
  { label: 'straightness of the motion', value: um(result.machineStraightness) },
  { label: 'straightness of the straightedge', value: um(result.straightedgeStraightness) },
];

export const angularFigures = (result: ResultOf<'angular-deviation'>): Figure[] =>
  result.hysteresis === undefined
    ? [{ label: 'largest less smallest', value: slope(result.deviation) }]
    : [
        {
          label: 'largest difference out and back',
          value: `${slope(result.hysteresis)} at ${result.hysteresisAt} mm`,
        },
      ];
