import type { ResultOf } from '@/lib/evaluation';
import { Dec, plain } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { alike, fig, negative } from './figures';

interface Component {
  name: string;
  value: string;
  distribution: string;
  divisor?: string;
  sensitivity?: string;
}

const MOST_COMPONENTS = 12;
const divisors: Record<string, { text: string; square: number }> = {
  normal: { text: '1', square: 1 },
  rectangular: { text: '√3', square: 3 },
  triangular: { text: '√6', square: 6 },
  'u-shaped': { text: '√2', square: 2 },
};

export function uncertaintySteps(
  input: { coverage: number | string; components: Component[] },
  result: ResultOf<'uncertainty'>,
): ExplainedStep[] {
  const parts = input.components.map(contribution);
  const shown = input.components.slice(0, MOST_COMPONENTS);
  return [
    ...shown.map((component, k) => ({
      what: `${component.name}, ${component.distribution}: its standard uncertainty in the result`,
      formula: 'c · u = c · a / divisor',
      withNumbers: `${fig(component.sensitivity ?? '1')} · ${fig(component.value)} / ${divisorText(component)}`,
      value: fig(parts[k]!),
    })),
    ...alike(input.components.length - shown.length),
    {
      what: 'Combined standard uncertainty',
      formula: 'u = √Σ(c · u)²',
      withNumbers:
        parts.length <= MOST_COMPONENTS
          ? `√(${parts.map((part) => `${negative(part)}²`).join(' + ')})`
          : `${parts.length} components`,
      value: fig(result.standard),
    },
    {
      what: `Coverage factor for ${fig(new Dec(String(input.coverage)).times(100).toFixed())} %, two-sided Student t`,
      formula: 'k = t(ν), ν = u⁴ / Σ((c · u)⁴ / ν of each), cut down to a whole number',
      withNumbers: result.degreesOfFreedom === undefined ? 'ν is infinite' : `ν = ${fig(result.degreesOfFreedom)}`,
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

const divisorText = ({ divisor, distribution }: Component) =>
  divisor === undefined ? (divisors[distribution]?.text ?? '1') : fig(divisor);

function contribution({ value, sensitivity = '1', divisor, distribution }: Component): string {
  const by = divisor === undefined ? new Dec(divisors[distribution]?.square ?? 1).sqrt() : new Dec(divisor);
  return plain(new Dec(value).times(sensitivity).div(by));
}

export function roundingSteps(
  input: { value: string; resolution: string; rule?: string },
  result: ResultOf<'rounding'>,
): ExplainedStep[] {
  return [
    {
      what: 'Steps that the figure holds',
      formula: 'value / resolution',
      withNumbers: `${fig(input.value)} / ${fig(input.resolution)}`,
      value: fig(Fraction.from(input.value).dividedBy(Fraction.from(input.resolution)).toText()),
    },
    {
      what: 'Nearest whole number of steps',
      formula:
        input.rule === 'half-away-from-zero' ? 'a tie goes away from zero' : 'a tie goes to the even number of steps',
      withNumbers: '',
      value: result.rounded.replace('-', '−'),
    },
  ];
}

export function toleranceSteps(
  input: { base: string; baseLength: string; length: string; minimum?: string; maximum?: string },
  result: ResultOf<'tolerance'>,
): ExplainedStep[] {
  const { base, baseLength, length, minimum, maximum } = input;
  const scaled = `${fig(base)} · ${fig(length)} / ${fig(baseLength)}`;
  const raised = minimum === undefined ? scaled : `max(${scaled}; ${fig(minimum)})`;
  return [
    {
      what: 'In proportion to the length',
      formula: 'T0 · L / L0',
      withNumbers: scaled,
      value: `${fig(Fraction.from(base).times(Fraction.from(length)).dividedBy(Fraction.from(baseLength)).toText())} µm`,
    },
    {
      what: 'Never below the floor, never above the cap',
      formula: 'T = min(max(T0 · L/L0; Tmin); Tmax)',
      withNumbers: maximum === undefined ? raised : `min(${raised}; ${fig(maximum)})`,
      value: `${fig(result.tolerance)} µm`,
    },
  ];
}
