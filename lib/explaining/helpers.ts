import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { fig, listed, negative } from './figures';

const divisors: Record<string, string> = { normal: '1', rectangular: '√3', triangular: '√6', 'u-shaped': '√2' };

export function uncertaintySteps(
  input: {
    coverage: number | string;
    components: { name: string; value: string; distribution: string; divisor?: string; sensitivity?: string }[];
  },
  result: ResultOf<'uncertainty'>,
): ExplainedStep[] {
  const parts = input.components.slice(0, 8).map(({ name, value, distribution, divisor, sensitivity = '1' }) => ({
    what: `${name}, ${distribution}`,
    formula: 'c · a / divisor',
    withNumbers: `${fig(sensitivity)} · ${fig(value)} / ${divisor === undefined ? divisors[distribution] : fig(divisor)}`,
    value: 'its standard uncertainty',
  }));
  return [
    ...parts,
    {
      what: 'Combined standard uncertainty',
      formula: 'u = √Σ(c·u)²',
      withNumbers: `${input.components.length} components`,
      value: fig(result.standard),
    },
    {
      what: 'Coverage factor, two-sided Student t',
      formula: 'k = t(ν)',
      withNumbers:
        result.degreesOfFreedom === undefined ? 'ν infinite' : `ν = ${fig(result.degreesOfFreedom)}, cut down`,
      value: fig(result.coverageFactor),
    },
    {
      what: 'Expanded uncertainty',
      formula: 'U = k · u',
      withNumbers: `${fig(result.coverageFactor)} · ${fig(result.standard)}`,
      value: fig(result.expanded),
    },
  ];
}

export function conformitySteps(
  input: {
    deviation: string;
    tolerance: string;
    direction: string;
    rule: string;
    guard?: string;
    standardUncertainty?: string;
  },
  result: ResultOf<'conformity'>,
): ExplainedStep[] {
  const guarded = input.rule === 'guarded';
  return [
    {
      what: guarded ? 'Limit, tolerance less guard band' : 'Limit, the tolerance itself',
      formula: guarded ? `T − g, g = ${input.guard === 'U' ? '2·u' : '1.65·u'}` : 'T',
      withNumbers: guarded
        ? `${fig(input.tolerance)} − ${input.guard === 'U' ? '2' : '1.65'} · ${fig(input.standardUncertainty ?? '0')}`
        : fig(input.tolerance),
      value: fig(result.limit),
    },
    {
      what: `Distance to the limit, direction ${input.direction}`,
      formula: input.direction === 'either' ? 'limit − |e|' : 'the smaller of limit − s·e and s·e',
      withNumbers: `e = ${fig(input.deviation)}`,
      value: fig(result.margin),
    },
    ...(result.probability === undefined
      ? []
      : [
          {
            what: 'Probability that the true value conforms',
            formula: 'Φ((T − y)/u)',
            withNumbers: `u = ${fig(input.standardUncertainty ?? '0')}`,
            value: fig(result.probability),
          },
        ]),
    {
      what: 'Verdict',
      formula: 'margin ≥ 0',
      withNumbers: fig(result.margin),
      value: result.verdict.replaceAll('-', ' '),
    },
  ];
}

export function roundingSteps(
  input: { value: string; resolution: string; rule?: string },
  result: ResultOf<'rounding'>,
): ExplainedStep[] {
  return [
    {
      what: 'Nearest multiple of the resolution',
      formula: input.rule === 'half-away-from-zero' ? 'a tie goes away from zero' : 'a tie goes to the even multiple',
      withNumbers: `${fig(input.value)} in steps of ${fig(input.resolution)}`,
      value: result.rounded.replace('-', '−'),
    },
  ];
}

export function toleranceSteps(
  input: { base: string; baseLength: string; length: string; minimum?: string; maximum?: string },
  result: ResultOf<'tolerance'>,
): ExplainedStep[] {
  const floor = fig(input.minimum ?? '0');
  const cap = input.maximum === undefined ? '' : `, at most ${fig(input.maximum)}`;
  return [
    {
      what: 'In proportion to the length, never below the floor',
      formula: 'T = min(max(T0 · L/L0, Tmin), Tmax)',
      withNumbers: `${fig(input.base)} · ${fig(input.length)} / ${fig(input.baseLength)}, at least ${floor}${cap}`,
      value: fig(result.tolerance),
    },
  ];
}

/** The advice says its own formula; the figures that went in and the amounts that came out stand beside it. */
export function correctionSteps(input: Record<string, unknown>, result: Record<string, unknown>): ExplainedStep[] {
  const given = Object.entries(input).flatMap(([name, value]) => {
    if (name === 'method' || name === 'kind') return [];
    if (typeof value === 'string' || typeof value === 'number') return [`${name} = ${numeric(String(value))}`];
    if (Array.isArray(value)) return [`${name}: ${listed(value.map(String))}`];
    if (typeof value !== 'object' || value === null) return [];
    return [
      `${name}: ${Object.entries(value)
        .map(([key, part]) => `${key} ${numeric(String(part))}`)
        .join(', ')}`,
    ];
  });
  const amounts = Object.entries(result).flatMap(([name, value]) => {
    if (['method', 'kind', 'formula', 'verify', 'judgedBy', 'signed', 'deviation'].includes(name)) return [];
    if (Array.isArray(value)) return [`${name}: ${listed(value.map(String))}`];
    if (typeof value === 'string' || typeof value === 'boolean') return [`${name} ${numeric(String(value))}`];
    if (typeof value !== 'object' || value === null) return [];
    return [
      `${name}: ${Object.entries(value)
        .map(([key, part]) => `${key} ${numeric(String(part))}`)
        .join(', ')}`,
    ];
  });
  return [
    {
      what: 'Amount to set',
      formula: String(result.formula ?? ''),
      withNumbers: given.join('; '),
      value: amounts.join('; '),
    },
    { what: 'Then', formula: 'measure again', withNumbers: '', value: String(result.verify ?? '') },
  ];
}

const numeric = (text: string): string =>
  /^[+-]?\d*\.?\d+$/.test(text) ? negative(text).replace(/^\((.*)\)$/, '$1') : text;
