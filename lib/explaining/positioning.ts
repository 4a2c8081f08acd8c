import { Dec } from '@/lib/units/decimal';
import type { ExplainedStep } from './explanation';
import { fig, meanText, negative } from './figures';
import { AtTargets, arrows, type PositioningInput, type Result, type Way } from './positioning-targets';

/** A, E, R, B or M, from the readings at the targets that decide. */
export function positioningSteps(input: PositioningInput, result: Result): ExplainedStep[] {
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

const both = ({ backward }: PositioningInput): Way[] => (backward ? ['forward', 'backward'] : ['forward']);

function judgedFigure({ judge, backward }: PositioningInput, { cycles }: Result): string {
  return judge ?? `${cycles === '1' ? 'E' : 'A'}${backward ? '' : 'forward'}`;
}

class Steps extends AtTargets {
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

  private last(figure: string, formula: string, withNumbers: string): ExplainedStep {
    const words = figure === 'meanB' ? 'B̄' : figure.replace('forward', '↑').replace('backward', '↓');
    return {
      what: `${words}, the figure that is judged`,
      formula: `${words} = ${formula}`,
      withNumbers,
      value: this.unit(this.result.deviation),
    };
  }
}

/** The direction whose figure is largest (sign 1) or smallest (−1). */
function best(ways: Way[], of: (way: Way) => string, sign: 1 | -1): Way {
  return ways.reduce((found, way) => (new Dec(of(way)).minus(of(found)).times(sign).gt(0) ? way : found), ways[0]!);
}
