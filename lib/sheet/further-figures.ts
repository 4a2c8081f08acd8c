import type { ResultOf } from '@/lib/evaluation';
import { slope, um } from './figure-text';
import type { Figure } from './figures';

/** ISO 230-2: every parameter that was evaluated, with the place where it occurs. */
export function positioningFigures(result: ResultOf<'positioning'>): Figure[] {
  const names: [key: keyof typeof result & string, label: string][] = [
    ['A', 'A, bidirectional accuracy'],
    ['Aforward', 'A in the + direction'],
    ['Abackward', 'A in the − direction'],
    ['E', 'E, bidirectional systematic error'],
    ['Eforward', 'E in the + direction'],
    ['Ebackward', 'E in the − direction'],
    ['M', 'M, range of the mean bidirectional errors'],
    ['R', 'R, bidirectional repeatability'],
    ['Rforward', 'R in the + direction'],
    ['Rbackward', 'R in the − direction'],
    ['B', 'B, largest reversal'],
    ['meanB', 'mean reversal'],
  ];
  const at = result.at as Record<string, string | { max: string; min: string } | undefined>;
  const place = (key: string): string => {
    const where = at[key];
    if (where === undefined) return '';
    return typeof where === 'string' ? `, at ${where}` : `, between ${where.min} and ${where.max}`;
  };
  const figures = names.flatMap(([key, label]) => {
    const value = result[key];
    return typeof value === 'string' ? [{ label, value: `${um(value)}${place(key)}` }] : [];
  });
  return [...figures, { label: 'runs in each direction', value: String(result.cycles) }];
}

export function circularFigures(result: ResultOf<'circular'>): Figure[] {
  const ways = (['counterclockwise', 'clockwise'] as const).flatMap((way) => {
    const one = result[way];
    if (!one) return [];
    return [
      { label: `G, ${way}`, value: `${um(one.G)} (about the least-squares centre ${um(one.GLeastSquares)})` },
      { label: `F, ${way}`, value: `${um(one.Fmin)} to ${um(one.Fmax)}` },
    ];
  });
  const optional: [label: string, value: string | undefined, text: (value: string) => string][] = [
    ['Gb, both directions together', result.Gb, um],
    ['D, mean radius less nominal', result.D, um],
    ['squareness, from sin 2θ', result.squareness, slope],
    ['difference of the scales, from cos 2θ', result.scaleDifference, slope],
    ['difference of the lags', result.lagDifference, slope],
  ];
  return [
    ...ways,
    ...optional.flatMap(([label, value, text]) => (value === undefined ? [] : [{ label, value: text(value) }])),
    { label: 'centre', value: `x ${um(result.centre.x)}, y ${um(result.centre.y)}` },
    ...(result.partialArc ? [{ label: 'arc', value: 'partial: its centre is less certain' }] : []),
  ];
}

export function rotationFigures(result: ResultOf<'axis-of-rotation'>, tilt: boolean): Figure[] {
  const text = (value: string) => (tilt ? slope(value) : um(value, '0.01'));
  const names: [label: string, value: string | undefined][] = [
    ['total', result.total],
    ['synchronous', result.synchronous],
    ['asynchronous', result.asynchronous],
    ['once per turn', 'fundamental' in result ? result.fundamental : undefined],
    ['synchronous without once per turn', 'residualSynchronous' in result ? result.residualSynchronous : undefined],
    ['eccentricity, taken out', 'eccentricity' in result ? result.eccentricity : undefined],
  ];
  return names.flatMap(([label, value]) => (value === undefined ? [] : [{ label, value: text(value) }]));
}

export function indexingFigures(result: ResultOf<'indexing'>, names: string[]): Figure[] {
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
