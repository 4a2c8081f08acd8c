import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { fig, listed, negative, um, umPerM } from './figures';
import { harmonic } from './harmonic';
import { maximum } from './run-outs';

/** Above this the rest at each angle is not worked out again for the reader. */
const MOST_ANGLES = 400;
const ways = ['counterclockwise', 'clockwise'] as const;

interface Circular {
  nominalRadius: string;
  judge?: string;
  clockwise?: { angle: string; radius: string }[];
  counterclockwise?: { angle: string; radius: string }[];
}

export function circularSteps(input: Circular, result: ResultOf<'circular'>): ExplainedStep[] {
  const taken = ways.flatMap((way) => (result[way] ? [{ way, figures: result[way] }] : []));
  const both = result.Gb !== undefined && input.judge !== 'G';
  const perWay = taken.flatMap(({ way, figures }): ExplainedStep[] => [
    {
      what: `Range about the centre as set, ${way}`,
      formula: 'Fmax − Fmin',
      withNumbers: `${fig(figures.Fmax)} − ${negative(figures.Fmin)}`,
      value: um(difference(figures.Fmax, figures.Fmin)),
    },
    {
      what: `Range about the least-squares centre, ${way}`,
      formula: 'max r − min r, r from the centre of the least-squares circle',
      withNumbers: `${input[way]?.length ?? 0} points`,
      value: um(figures.GLeastSquares),
    },
    {
      what: `G ${way}: the centre moved until both circles that hold the path stand closest`,
      formula: 'G = least of (max r − min r) over all centres',
      withNumbers: `${input[way]?.length ?? 0} points`,
      value: um(figures.G),
    },
  ]);
  const last: ExplainedStep = both
    ? {
        what: 'Gb: the same over both paths together',
        formula: 'Gb = least of (max r − min r) over all centres',
        withNumbers: `${taken.map(({ way }) => input[way]?.length ?? 0).join(' + ')} points about R = ${fig(input.nominalRadius)} mm`,
        value: um(result.deviation),
      }
    : {
        what: taken.length > 1 ? 'The larger of the two' : 'The path that was run',
        formula: 'max G',
        withNumbers: maximum(taken.map(({ figures }) => figures.G)),
        value: um(result.deviation),
      };
  return [...perWay, ...shapeSteps(result), last];
}

const difference = (a: string, b: string) => Fraction.from(a).minus(Fraction.from(b)).toText();

/** What the second harmonic says of the axes; for information. */
function shapeSteps({ centre, squareness, scaleDifference, lagDifference }: ResultOf<'circular'>): ExplainedStep[] {
  const part = (what: string, formula: string, figure: string | undefined): ExplainedStep[] =>
    figure === undefined ? [] : [{ what: `${what}, for information`, formula, withNumbers: '', value: umPerM(figure) }];
  return [
    {
      what: 'Centre of the least-squares circle through all points',
      formula: 'x, y',
      withNumbers: '',
      value: `x ${um(centre.x)}, y ${um(centre.y)}`,
    },
    ...part('Squareness of the axes', '−2q / R · 1000, q of sin 2θ', squareness),
    ...part('Scale of the first axis against the second', '2p / R · 1000, p of cos 2θ', scaleDifference),
    ...part('What turns over with the direction', '(q counterclockwise − q clockwise) / R · 1000', lagDifference),
  ];
}

export function roundnessSteps(
  input: { reference?: string; surface?: string; points: { angle: string; reading: string }[] },
  result: ResultOf<'roundness'>,
): ExplainedStep[] {
  const values = input.points.map(({ reading }) => reading);
  const angles = input.points.map(({ angle }) => angle);
  const squares = input.reference === 'least-squares';
  const centre = squares ? result.centre : result.centreMinimumZone;
  // In a bore the centre lies the other way; a and b belong to the readings.
  const turn = (text: string) => (input.surface === 'bore' ? Fraction.from(text).negated().toText() : text);
  const [a, b] = [turn(centre.x), turn(centre.y)];
  const other: ExplainedStep = {
    what: `About the ${squares ? 'centre of the minimum zone' : 'least-squares centre'}, for information`,
    formula: 'max − min of (r − a · cos θ − b · sin θ)',
    withNumbers: `${values.length} readings: ${listed(values)}`,
    value: um(squares ? result.minimumZone : result.leastSquares),
  };
  const words = squares ? 'least squares' : 'the least width that any a and b give';
  const found: ExplainedStep = {
    what: `a and b by ${words}`,
    formula: 'r ≈ c + a · cos θ + b · sin θ',
    withNumbers: `over ${values.length} angles`,
    value: `a = ${um(a)}, b = ${um(b)}`,
  };
  const what = `Roundness about that centre`;
  if (values.length > MOST_ANGLES) {
    const plain = {
      what,
      formula: 'max q − min q',
      withNumbers: `${values.length} readings`,
      value: um(result.deviation),
    };
    return [other, found, plain];
  }
  const where = (k: number) => `${fig(angles[k]!)}°`;
  return [other, found, ...harmonic({ values, angles, a, b, name: 'r', where, unit: um })(what, result.deviation)];
}
