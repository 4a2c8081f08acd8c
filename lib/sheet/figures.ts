import type { MeasuredResult, ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { CheckResult } from './check-result';
import { shown, slope, um } from './figure-text';
import { circularFigures, indexingFigures, positioningFigures, rotationFigures } from './further-figures';
import type { Judgement, SheetOutcome } from './types';

export interface Figure {
  label: string;
  value: string;
}

/** Further figures of the method for sheet and report, rounded once for the reader, in words. Empty while there is no result. */
export function figures(outcome: SheetOutcome): Figure[] {
  if (outcome.state !== 'partial' && outcome.state !== 'complete') return [];
  const { result, judgement, input } = outcome;
  if (result.method === 'function-check') return checkFigures(result);
  const own = figuresOf(result, judgement, input);
  const local = judgement.local;
  if (!local) return own;
  return [
    ...own,
    {
      label: `largest over any ${local.lengthMm} mm`,
      value: `${um(local.deviationUm)} (limit ${um(local.toleranceUm, '0.1')})`,
    },
  ];
}

function figuresOf(result: MeasuredResult, judgement: Judgement, input: unknown): Figure[] {
  switch (result.method) {
    case 'run-out':
      return runOutFigures(result, judgement);
    case 'parallelism':
      return [
        { label: 'slope', value: slope(result.fitSlope) },
        { label: 'last less first mean', value: um(result.difference) },
        { label: 'range of the means', value: um(result.range) },
      ];
    case 'squareness-to-axis':
      return [{ label: 'slope of the means', value: slope(result.fitSlope) }];
    case 'squareness':
      return [
        { label: 'squareness', value: slope(result.squareness) },
        ...(result.squareError === undefined
          ? []
          : [{ label: "the square's own error", value: slope(result.squareError) }]),
      ];
    case 'straightness':
      return [{ label: 'slope of the reference line', value: slope(result.slope) }];
    case 'coaxiality':
      return coaxialityFigures(result, sectionPositions(input));
    case 'centre-height':
      return centreHeightFigures(result, radiiOf(input));
    case 'lost-motion':
      return lostMotionFigures(result);
    case 'two-collar':
      return [
        { label: 'slope', value: slope(result.slope) },
        { label: 'difference of the diameters', value: um(result.diameterDifference) },
      ];
    case 'positioning':
      return positioningFigures(result);
    case 'circular':
      return circularFigures(result);
    case 'axis-of-rotation':
      return rotationFigures(result, (input as { direction: string }).direction === 'tilt');
    case 'indexing':
      return indexingFigures(result, stationNames(input));
    case 'straightness-from-angles':
      return [
        { label: 'slope of the reference line', value: slope(result.slope) },
        ...(result.closure === undefined ? [] : [{ label: 'closure of the two runs', value: um(result.closure) }]),
      ];
    case 'straightness-reversal':
      return [
        { label: 'straightness of the motion', value: um(result.machineStraightness) },
        { label: 'straightness of the straightedge', value: um(result.straightedgeStraightness) },
      ];
    case 'flatness':
      return [{ label: 'slope of the plane', value: `x ${slope(result.b)}, y ${slope(result.c)}` }];
    case 'angular-deviation':
      return result.hysteresis === undefined
        ? [{ label: 'largest less smallest', value: slope(result.deviation) }]
        : [
            {
              label: 'largest difference out and back',
              value: `${slope(result.hysteresis)} at ${result.hysteresisAt} mm`,
            },
          ];
    case 'roundness':
      return [
        { label: 'about the minimum-zone centre', value: um(result.minimumZone) },
        { label: 'about the least-squares centre', value: um(result.leastSquares) },
      ];
    case 'diameter-consistency':
      return [
        { label: 'taper, near the headstock less far end', value: um(result.taper) },
        { label: 'slope of the radius', value: slope(result.slope) },
      ];
    case 'drift':
      return [
        { label: 'range in the first hour', value: um(result.firstHour) },
        { label: 'rate', value: `${shown(result.rate, '0.01')} µm/h` },
        ...(result.temperatureRange === undefined
          ? []
          : [{ label: 'range of the temperature', value: `${shown(result.temperatureRange, '0.1')} °C` }]),
      ];
    case 'reference-shift':
      return [
        { label: 'way that the slide lacks in +', value: um(result.shift) },
        { label: 'shift as the control counts it', value: um(result.controlShift) },
      ];
    case 'axial-run-out':
      return circleNames(input).map((label, k) => ({ label, value: um(result.perCircle[k]!) }));
    default:
      return [];
  }
}

const stationNames = (input: unknown): string[] =>
  (input as { stations: { name: string }[] }).stations.map(({ name }) => name);

const circleNames = (input: unknown): string[] =>
  (input as { circles: { name?: string }[] }).circles.map(({ name }, k) => name ?? `circle ${k + 1}`);

function runOutFigures(result: ResultOf<'run-out'>, judgement: Judgement): Figure[] {
  const { perInsertion, eccentricity, phase, spread } = result;
  const list: Figure[] = [];
  if (eccentricity !== undefined && phase !== undefined)
    list.push({ label: 'eccentricity', value: `${um(eccentricity)} at ${shown(phase, '1')}°` });
  if (perInsertion.length === 1) return list;
  const totals = perInsertion.map(({ totalIndicatorReading }) => shown(totalIndicatorReading, '0.1')).join(', ');
  const wide = judgement.toleranceUm !== null && times(spread, 4).compare(Fraction.from(judgement.toleranceUm)) > 0;
  return [
    { label: 'total readings', value: `${totals} µm` },
    {
      label: 'spread of the insertions',
      value: `${um(spread)}${wide ? ', more than a quarter of the tolerance' : ''}`,
    },
    ...list,
  ];
}

function coaxialityFigures(result: ResultOf<'coaxiality'>, positions: string[]): Figure[] {
  const sections = result.sections.map(({ ex, ey, offset, closure }, k) => ({
    label: `section at ${positions[k]} mm`,
    value: `offset ${um(offset)}, ex ${um(ex)}, ey ${um(ey)}, closure ${um(closure)}`,
  }));
  if (result.tilt === undefined || result.tiltX === undefined || result.tiltY === undefined) return sections;
  const tilt = `${slope(result.tilt)} (x ${slope(result.tiltX)}, y ${slope(result.tiltY)})`;
  return [...sections, { label: 'tilt between the sections', value: tilt }];
}

function centreHeightFigures(result: ResultOf<'centre-height'>, radii: string[]): Figure[] {
  const effects = (result.diameterEffects ?? []).map((effect, k) => ({
    label: `effect on the diameter at r ${radii[k]} mm`,
    value: um(effect, '0.01'),
  }));
  return [
    ...(result.ex === undefined ? [] : [{ label: 'offset in X (for information)', value: um(result.ex) }]),
    ...effects,
  ];
}

function lostMotionFigures(result: ResultOf<'lost-motion'>): Figure[] {
  const feeds = [
    ['cutting feed', result.cuttingFeed],
    ['rapid', result.rapid],
  ] as const;
  const summary = feeds.flatMap(([label, feed]) =>
    feed ? [{ label: `lost motion, ${label}`, value: lostMotionWords(feed.lostMotion) }] : [],
  );
  const places = result.places.map(({ feed, place, mean, spread }) => ({
    label: `${feed === 'rapid' ? 'rapid' : 'cutting feed'}, ${place ?? ''}`,
    value: `mean difference ${um(mean)}, spread ${um(spread)}`,
  }));
  return [...summary, ...places];
}

function lostMotionWords(lostMotion: string): string {
  const amount = um(lostMotion);
  if (!/[1-9]/.test(amount)) return amount;
  return `${amount}, ${Fraction.from(lostMotion).sign() > 0 ? 'play not compensated' : 'compensated too much'}`;
}

function sectionPositions(input: unknown): string[] {
  const { sections } = input as { sections: { position: string }[] };
  return sections.map(({ position }) => position);
}

function radiiOf(input: unknown): string[] {
  return (input as { radii?: string[] }).radii ?? [];
}

function times(value: string, factor: number): Fraction {
  return Fraction.from(value).times(Fraction.of(factor));
}

function checkFigures({ items, notFitted }: CheckResult): Figure[] {
  const inOrder = items.filter((item) => item.inOrder).length;
  return [
    { label: 'items in order', value: `${inOrder} of ${items.length - notFitted}` },
    ...(notFitted > 0 ? [{ label: 'not fitted', value: String(notFitted) }] : []),
  ];
}
