import type { ResultOf } from '@/lib/evaluation';
import { Dec } from '@/lib/units/decimal';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { fig, meanText, negative, um, umPerM } from './figures';

type Result = ResultOf<'positioning'>;
type Position = Result['positions'][number];
type Way = 'forward' | 'backward';
interface Input {
  kind: string;
  judge?: string;
  targets: string[];
  forward: string[][];
  backward?: string[][];
  temperature?: { celsius: string; alpha: string; zero?: string };
}

const arrows: Record<Way, string> = { forward: '↑', backward: '↓' };

/** A, E, R, B or M, from the readings at the targets that decide. */
export function positioningSteps(input: Input, result: Result): ExplainedStep[] {
  const figure = judgedFigure(input, result);
  const steps = new Steps(input, result);
  const ways: Way[] = figure.endsWith('forward')
    ? ['forward']
    : figure.endsWith('backward')
      ? ['backward']
      : both(input);
  switch (figure[0]) {
    case 'A':
      return steps.band(figure, ways);
    case 'E':
      return steps.spread(figure, ways);
    case 'M':
      return steps.middle();
    case 'm':
      return steps.meanReversal();
    case 'B':
      return steps.reversal();
    default:
      return steps.repeatability(figure, ways);
  }
}

const both = ({ backward }: Input): Way[] => (backward ? ['forward', 'backward'] : ['forward']);

function judgedFigure({ judge, backward }: Input, { cycles }: Result): string {
  return judge ?? `${cycles === '1' ? 'E' : 'A'}${backward ? '' : 'forward'}`;
}

class Steps {
  private readonly unit: (text: string) => string;

  constructor(
    private readonly input: Input,
    private readonly result: Result,
  ) {
    this.unit = input.kind === 'rotary' ? umPerM : um;
  }

  /** A: upper edge at one target less lower edge at another. */
  band(figure: string, ways: Way[]): ExplainedStep[] {
    const { max, min } = this.places(figure);
    const upper = this.edge(max, ways, 1);
    const lower = this.edge(min, ways, -1);
    return [
      ...upper.steps,
      ...lower.steps,
      this.last(figure, 'largest (x̄ + 2s) − smallest (x̄ − 2s)', `${fig(upper.value)} − ${negative(lower.value)}`),
    ];
  }

  /** E: largest mean less smallest mean. */
  spread(figure: string, ways: Way[]): ExplainedStep[] {
    const { max, min } = this.places(figure);
    const pick = (target: string, sign: 1 | -1) => {
      const way = best(ways, (candidate) => this.mean(target, candidate), sign);
      return { step: this.meanStep(target, way), value: this.mean(target, way) };
    };
    const [upper, lower] = [pick(max, 1), pick(min, -1)];
    return [
      ...this.corrected(max),
      upper.step,
      lower.step,
      this.last(figure, 'largest x̄ − smallest x̄', `${fig(upper.value)} − ${negative(lower.value)}`),
    ];
  }

  middle(): ExplainedStep[] {
    const { max, min } = this.places('M');
    const of = (target: string): ExplainedStep => ({
      what: `Mean of both directions at ${this.place(target)}`,
      formula: 'x̄ = (x̄↑ + x̄↓) / 2',
      withNumbers: `(${fig(this.mean(target, 'forward'))} + ${negative(this.mean(target, 'backward'))}) / 2`,
      value: this.unit(this.at(target).mean ?? '0'),
    });
    const numbers = `${fig(this.at(max).mean ?? '0')} − ${negative(this.at(min).mean ?? '0')}`;
    return [...this.corrected(max), of(max), of(min), this.last('M', 'largest x̄ − smallest x̄', numbers)];
  }

  reversal(): ExplainedStep[] {
    const target = this.result.at.B ?? this.input.targets[0]!;
    return [
      ...this.reversalAt(target),
      this.last('B', 'largest |x̄↑ − x̄↓|, over all targets', `|${fig(this.at(target).B ?? '0')}|`),
    ];
  }

  meanReversal(): ExplainedStep[] {
    const all = this.result.positions.map(({ B }) => B ?? '0');
    const mean = this.result.meanB ?? '0';
    return [
      ...this.reversalAt(this.result.positions[0]!.target),
      {
        what: 'Mean reversal over all targets',
        formula: 'B̄ = ΣB / number of targets',
        withNumbers: meanText(all),
        value: this.unit(mean),
      },
      this.last('meanB', '|B̄|', `|${fig(mean)}|`),
    ];
  }

  repeatability(figure: string, ways: Way[]): ExplainedStep[] {
    const target = (this.result.at as Record<string, string>)[figure] ?? this.input.targets[0]!;
    const spreads = ways.flatMap((way) => [this.meanStep(target, way), this.deviationStep(target, way)]);
    if (ways.length === 1) {
      return [
        ...this.corrected(target),
        ...spreads,
        this.last(figure, `4s${arrows[ways[0]!]}`, `4 · ${fig(this.s(target, ways[0]!))}`),
      ];
    }
    const [up, down] = [fig(this.s(target, 'forward')), fig(this.s(target, 'backward'))];
    const B = this.at(target).B ?? '0';
    return [
      ...this.corrected(target),
      ...spreads,
      this.reversalStep(target),
      this.last(
        figure,
        'max(2s↑ + 2s↓ + |B|; 4s↑; 4s↓)',
        `max(2 · ${up} + 2 · ${down} + |${fig(B)}|; 4 · ${up}; 4 · ${down})`,
      ),
    ];
  }

  private edge(target: string, ways: Way[], sign: 1 | -1): { steps: ExplainedStep[]; value: string } {
    const edgeOf = (way: Way) =>
      new Dec(this.mean(target, way)).plus(new Dec(this.s(target, way)).times(2 * sign)).toFixed();
    const way = best(ways, edgeOf, sign);
    const operator = sign > 0 ? '+' : '−';
    const step: ExplainedStep = {
      what: `${sign > 0 ? 'Upper' : 'Lower'} edge at ${this.place(target)}, the ${sign > 0 ? 'largest' : 'smallest'} of all`,
      formula: `x̄${arrows[way]} ${operator} 2s${arrows[way]}`,
      withNumbers: `${fig(this.mean(target, way))} ${operator} 2 · ${fig(this.s(target, way))}`,
      value: this.unit(edgeOf(way)),
    };
    const steps = [...this.corrected(target), this.meanStep(target, way), this.deviationStep(target, way), step];
    return { steps, value: edgeOf(way) };
  }

  private reversalAt(target: string): ExplainedStep[] {
    return [
      ...this.corrected(target),
      this.meanStep(target, 'forward'),
      this.meanStep(target, 'backward'),
      this.reversalStep(target),
    ];
  }

  private reversalStep(target: string): ExplainedStep {
    return {
      what: `Reversal at ${this.place(target)}`,
      formula: 'B = x̄↑ − x̄↓',
      withNumbers: `${fig(this.mean(target, 'forward'))} − ${negative(this.mean(target, 'backward'))}`,
      value: this.unit(this.at(target).B ?? '0'),
    };
  }

  private meanStep(target: string, way: Way): ExplainedStep {
    const row = this.row(target);
    return {
      what: `Mean at ${this.place(target)}, ${way === 'forward' ? '+' : '−'} direction${this.input.temperature ? ', corrected to 20 °C' : ''}`,
      formula: `x̄${arrows[way]} = Σx / n`,
      withNumbers: meanText(this.readings(target, way)),
      value: this.unit(this.mean(target, way)),
      readings: this.readings(target, way).map((_, cycle) => `/${way}/${row}/${cycle}`),
    };
  }

  private deviationStep(target: string, way: Way): ExplainedStep {
    const mean = this.mean(target, way);
    const readings = this.readings(target, way);
    const squares = readings.map((value) => `(${fig(value)} − ${negative(mean)})²`).join(' + ');
    return {
      what: `Standard deviation there, ${way === 'forward' ? '+' : '−'} direction`,
      formula: `s${arrows[way]} = √(Σ(x − x̄)² / (n − 1))`,
      withNumbers: readings.length <= 8 ? `√((${squares}) / ${readings.length - 1})` : `n = ${readings.length}`,
      value: this.unit(this.s(target, way)),
    };
  }

  /** The correction of one reading; every other one is corrected alike. */
  private corrected(target: string): ExplainedStep[] {
    const { temperature, forward } = this.input;
    if (!temperature) return [];
    const { celsius, alpha, zero = '0' } = temperature;
    const raw = forward[this.row(target)]![0]!;
    return [
      {
        what: `To 20 °C first, here the first reading at ${this.place(target)}`,
        formula: 'x20 = x − (P − zero) · α · (T − 20) / 1000',
        withNumbers: `${fig(raw)} − (${fig(target)} − ${negative(zero)}) · ${negative(alpha)} · (${fig(celsius)} − 20) / 1000`,
        value: this.unit(this.readings(target, 'forward')[0]!),
      },
    ];
  }

  private last(figure: string, formula: string, withNumbers: string): ExplainedStep {
    const words = figure === 'meanB' ? 'B̄' : figure.replace('forward', '↑').replace('backward', '↓');
    return {
      what: `${words}, the figure that is judged`,
      formula: `${words} = ${formula}`,
      withNumbers,
      value: this.unit(this.result.deviation),
    };
  }

  private row(target: string): number {
    return this.result.positions.findIndex((position) => position.target === target);
  }

  private at(target: string): Position {
    return this.result.positions[this.row(target)]!;
  }

  private mean(target: string, way: Way): string {
    const { meanForward, meanBackward = '0' } = this.at(target);
    return way === 'forward' ? meanForward : meanBackward;
  }

  private s(target: string, way: Way): string {
    const { sForward = '0', sBackward = '0' } = this.at(target);
    return way === 'forward' ? sForward : sBackward;
  }

  private places(figure: string): { max: string; min: string } {
    const found = (this.result.at as Record<string, { max: string; min: string } | undefined>)[figure];
    return found ?? { max: this.result.positions[0]!.target, min: this.result.positions[0]!.target };
  }

  private place(target: string): string {
    return `${fig(target)}${this.input.kind === 'rotary' ? '°' : ' mm'}`;
  }

  /** Readings at a target, brought to 20 °C where the input asks for it. */
  private readings(target: string, way: Way): string[] {
    const raw = this.input[way]?.[this.row(target)] ?? [];
    const { temperature } = this.input;
    if (!temperature) return raw;
    const { celsius, alpha, zero = '0' } = temperature;
    const growth = Fraction.from(target)
      .minus(Fraction.from(zero))
      .times(Fraction.from(alpha))
      .times(Fraction.from(celsius).minus(Fraction.of(20)))
      .dividedBy(Fraction.of(1000));
    return raw.map((text) => Fraction.from(text).minus(growth).toText());
  }
}

/** The direction whose figure is largest (sign 1) or smallest (−1). */
function best(ways: Way[], of: (way: Way) => string, sign: 1 | -1): Way {
  return ways.reduce((found, way) => (new Dec(of(way)).minus(of(found)).times(sign).gt(0) ? way : found), ways[0]!);
}
