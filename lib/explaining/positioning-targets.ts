import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { fig, meanText, negative, um, umPerM } from './figures';

export type Result = ResultOf<'positioning'>;
type Position = Result['positions'][number];
export type Way = 'forward' | 'backward';
export interface PositioningInput {
  kind: string;
  judge?: string;
  targets: string[];
  forward: string[][];
  backward?: string[][];
  temperature?: { celsius: string; alpha: string; zero?: string };
}

export const arrows: Record<Way, string> = { forward: '↑', backward: '↓' };

/** What is worked out at one target: means, standard deviations, reversal. */
export class AtTargets {
  readonly unit: (text: string) => string;

  constructor(
    readonly input: PositioningInput,
    readonly result: Result,
  ) {
    this.unit = input.kind === 'rotary' ? umPerM : um;
  }

  reversalAt(target: string): ExplainedStep[] {
    return [
      ...this.corrected(target),
      this.meanStep(target, 'forward'),
      this.meanStep(target, 'backward'),
      this.reversalStep(target),
    ];
  }

  reversalStep(target: string): ExplainedStep {
    return {
      what: `Reversal at ${this.place(target)}`,
      formula: 'B = x̄↑ − x̄↓',
      withNumbers: `${fig(this.mean(target, 'forward'))} − ${negative(this.mean(target, 'backward'))}`,
      value: this.unit(this.at(target).B ?? '0'),
    };
  }

  meanStep(target: string, way: Way): ExplainedStep {
    const row = this.row(target);
    return {
      what: `Mean at ${this.place(target)}, ${way === 'forward' ? '+' : '−'} direction${this.input.temperature ? ', corrected to 20 °C' : ''}`,
      formula: `x̄${arrows[way]} = Σx / n`,
      withNumbers: meanText(this.readings(target, way)),
      value: this.unit(this.mean(target, way)),
      readings: this.readings(target, way).map((_, cycle) => `/${way}/${row}/${cycle}`),
    };
  }

  deviationStep(target: string, way: Way): ExplainedStep {
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
  corrected(target: string): ExplainedStep[] {
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

  row(target: string): number {
    return this.result.positions.findIndex((position) => position.target === target);
  }

  at(target: string): Position {
    return this.result.positions[this.row(target)]!;
  }

  mean(target: string, way: Way): string {
    const { meanForward, meanBackward = '0' } = this.at(target);
    return way === 'forward' ? meanForward : meanBackward;
  }

  s(target: string, way: Way): string {
    const { sForward = '0', sBackward = '0' } = this.at(target);
    return way === 'forward' ? sForward : sBackward;
  }

  places(figure: string): { max: string; min: string } {
    const found = (this.result.at as Record<string, { max: string; min: string } | undefined>)[figure];
    return found ?? { max: this.result.positions[0]!.target, min: this.result.positions[0]!.target };
  }

  place(target: string): string {
    return `${fig(target)}${this.input.kind === 'rotary' ? '°' : ' mm'}`;
  }

  /** Readings at a target, brought to 20 °C where the input asks for it. */
  readings(target: string, way: Way): string[] {
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
