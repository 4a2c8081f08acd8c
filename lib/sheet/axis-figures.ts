import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import { type Figure, seconds, slope, um } from './figure-text';

/** ISO 230-2: every parameter that was evaluated, with the place where it occurs. Rotary axes are read in seconds of arc. */
export function positioningFigures(result: ResultOf<'positioning'>, rotary: boolean): Figure[] {
  const amount = rotary ? seconds : (value: string) => um(value);
  const unit = rotary ? '°' : ' mm';
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
    return typeof where === 'string' ? `, at ${where}${unit}` : `, between ${where.min}${unit} and ${where.max}${unit}`;
  };
  const figures = names.flatMap(([key, label]) => {
    const value = result[key];
    return typeof value === 'string' ? [{ label, value: `${amount(value)}${place(key)}` }] : [];
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

export function lostMotionFigures(result: ResultOf<'lost-motion'>): Figure[] {
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

export const referenceShiftFigures = (result: ResultOf<'reference-shift'>): Figure[] => [
  { label: 'way that the slide lacks in +', value: um(result.shift) },
  { label: 'shift as the control counts it', value: um(result.controlShift) },
];
