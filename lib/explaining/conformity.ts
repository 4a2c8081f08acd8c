import { directionSign, type PermissibleDirection, type ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { fig, negative } from './figures';

export function conformitySteps(
  input: {
    deviation: string;
    signed: boolean;
    tolerance: string;
    direction: PermissibleDirection;
    rule: string;
    guard?: string;
    standardUncertainty?: string;
  },
  result: ResultOf<'conformity'>,
): ExplainedStep[] {
  const { deviation: e, tolerance: T, standardUncertainty: u = '0' } = input;
  const guarded = input.rule === 'guarded';
  const factor = input.guard === 'U' ? '2' : '1.65';
  const side = directionSign(input.direction);
  const y = side === 0 ? Fraction.from(e).abs() : side > 0 ? Fraction.from(e) : Fraction.from(e).negated();
  const compared = side === 0 ? `|${fig(e)}|` : side > 0 ? fig(e) : `−${negative(e)}`;
  return [
    {
      what: guarded ? 'Limit: tolerance less the guard band' : 'Limit: the tolerance itself',
      formula: guarded ? `T − ${factor} · u` : 'T',
      withNumbers: guarded ? `${fig(T)} − ${factor} · ${fig(u)}` : fig(T),
      value: fig(result.limit),
    },
    {
      what: `Figure that is compared, permitted: ${input.direction.replaceAll('-', ' ')}`,
      formula: side === 0 ? 'y = |e|' : side > 0 ? 'y = e' : 'y = −e',
      withNumbers: compared,
      value: fig(y.toText()),
    },
    {
      what: 'Distance to the limit',
      formula: side === 0 ? 'limit − y' : 'the smaller of limit − y and y',
      withNumbers:
        side === 0
          ? `${fig(result.limit)} − ${negative(y.toText())}`
          : `min(${fig(result.limit)} − ${negative(y.toText())}; ${fig(y.toText())})`,
      value: fig(result.margin),
    },
    ...(result.probability === undefined ? [] : [probability(input.signed, side, e, T, y.toText(), u, result)]),
    {
      what: 'Verdict, on the unrounded figure',
      formula: guarded ? 'within: y ≤ T − g; out: y > T + g; between: undecided' : 'within: y ≤ T; out: y > T',
      withNumbers: side === 0 ? '' : 'on the side that is not permitted: out',
      value: result.verdict.replaceAll('-', ' '),
    },
  ];
}

function probability(
  signed: boolean,
  side: number,
  e: string,
  T: string,
  y: string,
  u: string,
  result: ResultOf<'conformity'>,
): ExplainedStep {
  const upper = `Φ((${fig(T)} − ${negative(side === 0 && signed ? e : y)}) / ${fig(u)})`;
  const other = !signed
    ? ''
    : side === 0
      ? ` − Φ((−${fig(T)} − ${negative(e)}) / ${fig(u)})`
      : ` − Φ(−${negative(y)} / ${fig(u)})`;
  return {
    what: 'Probability that the true value conforms',
    formula: !signed ? 'Φ((T − y)/u)' : side === 0 ? 'Φ((T − e)/u) − Φ((−T − e)/u)' : 'Φ((T − y)/u) − Φ(−y/u)',
    withNumbers: `${upper}${other}`,
    value: fig(result.probability ?? '0'),
  };
}
