import { evaluate, type ResultOf } from '@/lib/evaluation';
import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { fig, meanOf, meanText, negative, rangeOf, um, umPerM } from './figures';
import { harmonic } from './harmonic';

/** Above this the fit is not worked out again for the reader. */
const MOST_ANGLES = 120;

export function rotationSteps(
  input: { direction: string; judge?: string; turns: string[][]; angles?: string[] },
  result: ResultOf<'axis-of-rotation'>,
): ExplainedStep[] {
  const unit = input.direction === 'tilt' ? umPerM : um;
  const { turns } = input;
  const count = turns[0]!.length;
  const angles = input.angles ?? turns[0]!.map((_, k) => Fraction.of(360 * k, count).toText());
  const columns = angles.map((_, k) => turns.map((turn) => turn[k]!));
  const means = columns.map(meanOf);
  const spreads = columns.map((column) => ({ column, spread: Fraction.range(column.map(Fraction.from)) }));
  const wildest = spreads.reduce((best, one) => (one.spread.compare(best.spread) > 0 ? one : best), spreads[0]!);
  const at = spreads.indexOf(wildest);
  const mean: ExplainedStep = {
    what: `Mean over the turns at ${fig(angles[0]!)}°, as at every angle`,
    formula: 'm(θ) = Σ r / turns',
    withNumbers: meanText(columns[0]!),
    value: unit(means[0]!),
  };
  const asynchronous: ExplainedStep = {
    what: `Asynchronous: largest spread over the turns at one angle, at ${fig(angles[at]!)}°`,
    formula: 'max over θ of (max r − min r)',
    withNumbers: rangeOf(wildest.column),
    value: unit(result.asynchronous),
  };
  const parts =
    input.direction === 'axial'
      ? axialParts(turns, means, result, unit)
      : radialParts(turns, means, angles, result, unit);
  const judged = { total: parts.total, synchronous: parts.synchronous, asynchronous: [asynchronous] };
  const judge = (input.judge ?? 'total') as keyof typeof judged;
  const others = (Object.keys(judged) as (keyof typeof judged)[]).filter((name) => name !== judge);
  return [mean, ...parts.before, ...others.flatMap((name) => judged[name].slice(-1)), ...judged[judge]];
}

interface Parts {
  before: ExplainedStep[];
  synchronous: ExplainedStep[];
  total: ExplainedStep[];
}
type Unit = (text: string) => string;

function axialParts(
  turns: string[][],
  means: readonly string[],
  result: ResultOf<'axis-of-rotation'>,
  unit: Unit,
): Parts {
  const once: ExplainedStep = {
    what: 'What comes once a turn, which is real along the axis; for information',
    formula: '2 · √(a² + b²) of the fit c + a · cos θ + b · sin θ',
    withNumbers: `over ${means.length} angles`,
    value: unit('fundamental' in result ? (result.fundamental ?? '0') : '0'),
  };
  return {
    before: [once],
    synchronous: [
      {
        what: 'Synchronous: range of the mean trace',
        formula: 'max m − min m',
        withNumbers: rangeOf(means),
        value: unit(result.synchronous),
      },
    ],
    total: [
      {
        what: 'Total: range over all turns',
        formula: 'max r − min r',
        withNumbers: rangeOf(turns.flat()),
        value: unit(result.total),
      },
    ],
  };
}

function radialParts(
  turns: string[][],
  means: readonly string[],
  angles: readonly string[],
  result: ResultOf<'axis-of-rotation'>,
  unit: Unit,
): Parts {
  const eccentricity = 'eccentricity' in result ? (result.eccentricity ?? '0') : '0';
  const plain = (what: string, value: string): ExplainedStep => ({
    what,
    formula: 'max − min after the fit is taken off',
    withNumbers: `${turns.length} turns of ${angles.length} angles`,
    value: unit(value),
  });
  if (angles.length > MOST_ANGLES) {
    return {
      before: [plain('Eccentricity, the once-per-turn part that is taken off', eccentricity)],
      synchronous: [plain('Synchronous: what comes back every turn', result.synchronous)],
      total: [plain('Total over all turns', result.total)],
    };
  }
  // The mean trace about its least-squares centre: a and b of the same fit, by the method's own door.
  const { centre } = evaluate({
    method: 'roundness',
    reference: 'least-squares',
    points: means.map((reading, k) => ({ angle: angles[k]!, reading })),
  });
  const once = new Dec(centre.x).pow(2).plus(new Dec(centre.y).pow(2));
  const of = (values: readonly string[], name: string, where: (k: number) => string) =>
    harmonic({
      values,
      angles: values.map((_, k) => angles[k % angles.length]!),
      a: centre.x,
      b: centre.y,
      name,
      where,
      unit,
    });
  const degrees = (k: number) => `${fig(angles[k % angles.length]!)}°`;
  return {
    before: [
      {
        what: `Eccentricity of the fit a · cos θ + b · sin θ, a = ${fig(centre.x)}, b = ${fig(centre.y)}: taken off`,
        formula: '√(a² + b²)',
        withNumbers: once.isZero() ? '0' : `√(${negative(centre.x)}² + ${negative(centre.y)}²)`,
        value: unit(eccentricity),
      },
    ],
    synchronous: of(means, 'm', degrees)('Synchronous: what comes back every turn', result.synchronous),
    total: of(
      turns.flat(),
      'r',
      (k) => `${degrees(k)}, turn ${Math.floor(k / angles.length) + 1}`,
    )('Total over all turns', result.total),
  };
}
