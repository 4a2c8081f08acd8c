import type { EvaluationMethod } from '.';

/** Where a method's figures stand that somebody read or found; lists on the way are passed through. */
const places: Record<EvaluationMethod, readonly string[]> = {
  straightness: ['points.reading'],
  'straightness-from-angles': ['angles', 'returnAngles'],
  'straightness-reversal': ['first', 'second'],
  flatness: ['points.reading'],
  parallelism: ['readings'],
  'squareness-to-axis': ['readings'],
  squareness: ['first', 'second'].flatMap((run) =>
    ['referenceArm', 'measuredArm'].flatMap((arm) => [`${run}.${arm}.slope`, `${run}.${arm}.points.reading`]),
  ),
  'run-out': ['insertions.readings'],
  'axial-run-out': ['circles.readings'],
  coaxiality: ['sections.readings'],
  'centre-height': ['sweep', 'top', 'bottom', 'toolHeight', 'spindleHeight'],
  'angular-deviation': ['forward', 'backward'],
  positioning: ['forward', 'backward'],
  circular: ['clockwise.radius', 'counterclockwise.radius'],
  'axis-of-rotation': ['turns'],
  indexing: ['stations.readings'],
  'lost-motion': ['places.pairs.forward', 'places.pairs.backward'],
  'reference-shift': ['found'],
  roundness: ['points.reading'],
  'diameter-consistency': ['sections.diameter'],
  drift: ['points.reading'],
  'two-collar': ['D1', 'D2'],
  uncertainty: ['components.value'],
  conformity: ['deviation'],
  rounding: ['value'],
  tolerance: ['base'],
  correction: ['means', 'D1', 'D2', 'found', 'slope', 'slopeChange', 'height', 'heightError'].concat(
    ['cuttingFeed', 'rapid'].map((feed) => `${feed}.lostMotion`),
  ),
};

/** No input nests its readings deeper: turns of angles, runs of targets. */
const DEEPEST = 3;

/**
 * How many figures of readings an evaluation's input holds: a positioning test of 11 targets, 5 cycles, both ways has
 * 110. Helpers count the figures that they start from. The input need not be valid; what is missing counts nothing.
 *
 * @param input as given to `evaluate`, before it is checked
 * @example countReadings({ method: 'two-collar', D1: '30.012', D2: '30.007', distance: '100' }) === 2
 */
export function countReadings(input: unknown): number {
  if (!isObject(input) || typeof input.method !== 'string' || !Object.hasOwn(places, input.method)) return 0;
  const here = places[input.method as EvaluationMethod];
  return here.reduce((sum, place) => sum + countAt(input, place.split('.')), 0);
}

function countAt(value: unknown, path: readonly string[]): number {
  if (path.length === 0) return figuresIn(value, DEEPEST);
  if (Array.isArray(value)) return value.reduce((sum: number, item) => sum + countAt(item, path), 0);
  if (!isObject(value)) return 0;
  return countAt(value[path[0]!], path.slice(1));
}

function figuresIn(value: unknown, depth: number): number {
  if (typeof value === 'string' || typeof value === 'number') return 1;
  if (depth === 0 || typeof value !== 'object' || value === null) return 0;
  return Object.values(value).reduce((sum: number, item) => sum + figuresIn(item, depth - 1), 0);
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
