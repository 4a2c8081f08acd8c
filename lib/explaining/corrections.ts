import type { EvaluationInput, ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import { referenceShiftSteps } from './axes';
import type { ExplainedStep } from './explanation';
import { fig, negative, um, umPerM } from './figures';
import { pitchSteps } from './pitch-points';

type Input = Extract<EvaluationInput, { method: 'correction' }>;
type Result = ResultOf<'correction'>;
type Of<T, K> = Extract<T, { kind: K }>;

/** Amounts of a correction with the figures put in; what is to be done afterwards comes last. */
export function correctionSteps(input: Input, result: Result): ExplainedStep[] {
  const after = { what: 'Then', formula: '', withNumbers: '', value: result.verify };
  return [...amounts(input, result), after];
}

function amounts(input: Input, result: Result): ExplainedStep[] {
  switch (input.kind) {
    case 'lost-motion':
      return lostMotion(input, result as Of<Result, 'lost-motion'>);
    case 'reference-shift':
      return referenceShiftSteps(input, result as Of<Result, 'reference-shift'>);
    case 'pitch-table':
      return pitchSteps(input, result as Of<Result, 'pitch-table'>);
    case 'two-jack-points': {
      const { raise, point } = result as Of<Result, 'two-jack-points'>;
      const what = point === 'none' ? 'Nothing is to be raised' : `Raise point ${point} by`;
      return [one(what, result, `|${fig(input.slopeChange)}| · ${fig(input.span)} / 1000`, um(raise))];
    }
    case 'pivot-and-push-screw': {
      const { movement } = result as Of<Result, 'pivot-and-push-screw'>;
      return [
        one('Movement at the screw', result, `−${negative(input.slope)} · ${fig(input.distance)} / 1000`, um(movement)),
      ];
    }
    case 'shim': {
      const { thickness, action } = result as Of<Result, 'shim'>;
      const what = action === 'none' ? 'Nothing is to be changed' : `Thickness to ${action}`;
      return [one(what, result, `−${negative(input.heightError)}`, um(thickness))];
    }
    case 'turret-parallel-and-centre': {
      const { raiseA, raiseB } = result as Of<Result, 'turret-parallel-and-centre'>;
      const numbers = (jack: string) =>
        `−${negative(input.height)} + ${negative(input.slope)} · (${fig(input.heightPosition)} − ${negative(jack)}) / 1000`;
      return [
        one('Raise at jack point A', result, numbers(input.jackA), um(raiseA)),
        one('Raise at jack point B', result, numbers(input.jackB), um(raiseB)),
      ];
    }
    case 'headstock-for-taper':
      return taper(input, result as Of<Result, 'headstock-for-taper'>);
    case 'mandrel-sag': {
      const { sag } = result as Of<Result, 'mandrel-sag'>;
      return [{ ...one('Sag', result, sagNumbers(input), um(sag)), what: 'Sag of the mandrel by its own weight' }];
    }
  }
}

const one = (what: string, { formula }: Result, withNumbers: string, value: string): ExplainedStep => ({
  what,
  formula,
  withNumbers,
  value,
});

function lostMotion(input: Of<Input, 'lost-motion'>, result: Of<Result, 'lost-motion'>): ExplainedStep[] {
  const twice = input.basis === 'diameter' ? ' · 2' : '';
  const feeds = [
    ['cutting feed', input.cuttingFeed, result.cuttingFeed],
    ['rapid', input.rapid, result.rapid],
  ] as const;
  const steps = feeds.flatMap(([name, given, found]): ExplainedStep[] =>
    given && found
      ? [
          {
            what: `New value at ${name}, unrounded`,
            formula: result.formula,
            withNumbers: `${fig(given.present)} + ${negative(given.lostMotion)}${twice} / ${fig(input.unit)}`,
            value: `${fig(found.newValue)} counts`,
          },
          {
            what: `To enter at ${name}: the nearest whole count, a tie to the even one`,
            formula: '',
            withNumbers: fig(found.newValue),
            value: `${fig(found.newCount)} counts`,
          },
        ]
      : [],
  );
  const limit = input.limit;
  if (limit === undefined) return steps;
  const words = result.mechanicsFirst ? 'above it: look at the mechanics first' : 'not above it';
  return [
    ...steps,
    {
      what: 'Against your own limit',
      formula: '|lost motion| ≤ limit',
      withNumbers: `limit ${um(limit)}`,
      value: words,
    },
  ];
}

function taper(input: Of<Input, 'headstock-for-taper'>, result: Of<Result, 'headstock-for-taper'>): ExplainedStep[] {
  return [
    {
      what: 'Slope of the axis',
      formula: '1000000 · (D1 − D2) / (2 · length)',
      withNumbers: `1000000 · (${fig(input.D1)} − ${fig(input.D2)}) / (2 · ${fig(input.length)})`,
      value: umPerM(result.slope),
    },
    {
      what: `Movement at the screw; the free end goes: ${result.direction.replaceAll('-', ' ')}`,
      formula: '−slope · distance / 1000',
      withNumbers: `−${negative(result.slope)} · ${fig(input.distance)} / 1000`,
      value: um(result.movement),
    },
  ];
}

/** Millimetres, kg/m³ and GPa: a thousandth of a millionth brings them to µm. */
function sagNumbers({ length, diameter, density = '7850', modulus = '206', at = length }: Of<Input, 'mandrel-sag'>) {
  const [L, d, x] = [length, diameter, at].map((text) => Fraction.from(text).toText());
  const shape = `(${fig(x!)}⁴ − 4 · ${fig(L!)} · ${fig(x!)}³ + 6 · ${fig(L!)}² · ${fig(x!)}²)`;
  return `2 · ${fig(density)} · 9.80665 / (3 · ${fig(modulus)} · ${fig(d!)}²) · ${shape} / 1000000000`;
}
