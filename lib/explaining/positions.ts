import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { extremes, fig, listed, negative, rangeOf, um, umPerM } from './figures';

const formulas: Record<string, string> = {
  A: 'max(x̄↑ + 2s↑; x̄↓ + 2s↓) − min(x̄↑ − 2s↑; x̄↓ − 2s↓)',
  Aforward: 'max(x̄↑ + 2s↑) − min(x̄↑ − 2s↑)',
  Abackward: 'max(x̄↓ + 2s↓) − min(x̄↓ − 2s↓)',
  E: 'max(x̄↑; x̄↓) − min(x̄↑; x̄↓)',
  Eforward: 'max x̄↑ − min x̄↑',
  Ebackward: 'max x̄↓ − min x̄↓',
  M: 'max x̄ − min x̄',
  R: 'max over targets of max(2s↑ + 2s↓ + |B|; 4s↑; 4s↓)',
  Rforward: 'max 4s↑',
  Rbackward: 'max 4s↓',
  B: 'max |x̄↑ − x̄↓|',
  meanB: 'mean of x̄↑ − x̄↓',
};

export function positioningSteps(
  input: {
    kind: string;
    judge?: string;
    targets: string[];
    forward: string[][];
    temperature?: { celsius: string; alpha: string };
  },
  result: ResultOf<'positioning'>,
): ExplainedStep[] {
  const unit = input.kind === 'rotary' ? umPerM : um;
  const [first] = result.positions;
  const judge = input.judge ?? (result.A === undefined && result.Aforward === undefined ? 'E' : 'A');
  const places = (result.at as Record<string, string | { max: string; min: string } | undefined>)[judge];
  const where =
    places === undefined
      ? ''
      : typeof places === 'string'
        ? `, at ${fig(places)}`
        : `, between ${fig(places.max)} and ${fig(places.min)}`;
  const others = ['B', 'R', 'E', 'M'].filter((key) => key !== judge && typeof result[key as 'B'] === 'string');
  const corrected: ExplainedStep[] = input.temperature
    ? [
        {
          what: 'To 20 °C first',
          formula: 'x20 = x − (P − zero) · α · (T − 20)/1000',
          withNumbers: `α = ${fig(input.temperature.alpha)} µm/(m·K), T = ${fig(input.temperature.celsius)} °C`,
          value: 'every reading',
        },
      ]
    : [];
  return [
    ...corrected,
    {
      what: `Mean at target ${fig(first!.target)}, + direction`,
      formula: 'x̄↑ = Σ x/n',
      withNumbers: `${input.temperature ? 'corrected readings of ' : ''}(${input.forward[0]!.map((value, k) => (k === 0 ? fig(value) : negative(value))).join(' + ')}) / ${input.forward[0]!.length}`,
      value: unit(first!.meanForward),
    },
    ...(first!.sForward === undefined
      ? []
      : [
          {
            what: `Estimator of repeatability there`,
            formula: 's↑ = √(Σ(x − x̄↑)²/(n − 1))',
            withNumbers: `n = ${result.cycles}`,
            value: unit(first!.sForward),
          },
        ]),
    ...others.map((key) => ({
      what: `${key} of the axis`,
      formula: formulas[key]!,
      withNumbers: `over ${input.targets.length} targets`,
      value: unit(result[key as 'B']!),
    })),
    {
      what: `${judge}, the figure that is judged${where}`,
      formula: formulas[judge] ?? judge,
      withNumbers: `over ${input.targets.length} targets, ${result.cycles} runs`,
      value: unit(result.deviation),
    },
  ];
}

export function circularSteps(
  input: { nominalRadius: string; judge?: string; clockwise?: unknown[]; counterclockwise?: unknown[] },
  result: ResultOf<'circular'>,
): ExplainedStep[] {
  const ways = (['counterclockwise', 'clockwise'] as const).flatMap((way) => {
    const one = result[way];
    return one
      ? [
          {
            what: `Path ${way}: least distance of two concentric circles that hold it`,
            formula: 'G = min over centre of (max r − min r)',
            withNumbers: `${input[way]?.length ?? 0} readings about R = ${fig(input.nominalRadius)} mm`,
            value: um(one.G),
          },
        ]
      : [];
  });
  const both = result.Gb !== undefined && input.judge !== 'G';
  const last = both
    ? {
        what: 'Both paths together',
        formula: 'Gb = min over centre of (max r − min r)',
        withNumbers: 'all readings',
        value: um(result.deviation),
      }
    : {
        what: 'The larger of the paths',
        formula: 'max G',
        withNumbers: listed(ways.map(({ value }) => value.replace(/[^\d.−]/g, '').replace('−', '-'))),
        value: um(result.deviation),
      };
  return [
    ...ways,
    {
      what: 'Centre of the least-squares circle, as set',
      formula: 'x, y',
      withNumbers: 'all readings',
      value: `x ${um(result.centre.x)}, y ${um(result.centre.y)}`,
    },
    last,
  ];
}

export function roundnessSteps(
  input: { reference?: string; points: { angle: string; reading: string }[] },
  result: ResultOf<'roundness'>,
): ExplainedStep[] {
  const readings = input.points.map(({ reading }) => reading);
  const zone = {
    what: 'About the centre of the minimum zone',
    formula: 'min over a, b of max − min of (r − a·cos θ − b·sin θ)',
    withNumbers: `${readings.length} readings: ${listed(readings)}`,
    value: um(result.minimumZone),
  };
  const squares = {
    what: 'About the least-squares centre',
    formula: 'max − min of (r − a·cos θ − b·sin θ), a and b by least squares',
    withNumbers: `a = ${fig(result.centre.x)}, b = ${fig(result.centre.y)}`,
    value: um(result.leastSquares),
  };
  return input.reference === 'least-squares' ? [zone, squares] : [squares, zone];
}

export function lostMotionSteps(
  input: { sense?: string; places: { feed: string; place?: string; pairs: { forward: string; backward: string }[] }[] },
  result: ResultOf<'lost-motion'>,
): ExplainedStep[] {
  const means = result.places.map(({ mean }) => mean);
  const worst = extremes(means.map((mean) => mean.replace('-', ''))).atLargest;
  const { pairs, feed, place } = input.places[worst]!;
  const [pair] = pairs;
  const sign = input.sense === 'plus-releases' ? '−1 · ' : '';
  return [
    {
      what: `First pair of the worst place (${feed === 'rapid' ? 'rapid' : 'cutting feed'}${place ? `, ${place}` : ''})`,
      formula: `d = ${sign}(reading from − to + approach: forward − backward)`,
      withNumbers: `${sign}(${fig(pair!.forward)} − ${negative(pair!.backward)})`,
      value: 'difference of that pair',
    },
    {
      what: `Means of all places`,
      formula: 'mean d',
      withNumbers: `${pairs.length} pairs at each`,
      value: `${listed(means)} µm`,
    },
    ...(['cuttingFeed', 'rapid'] as const).flatMap((key) => {
      const one = result[key];
      return one
        ? [
            {
              what: `Lost motion, ${key === 'rapid' ? 'rapid' : 'cutting feed'}: + is play that is not compensated`,
              formula: '−mean over places',
              withNumbers: `−${negative(one.mean)}`,
              value: um(one.lostMotion),
            },
          ]
        : [];
    }),
    {
      what: 'Largest amount of a place',
      formula: 'max |mean d|',
      withNumbers: `|${fig(means[worst]!)}|`,
      value: um(result.deviation),
    },
  ];
}

export function referenceShiftSteps(
  input: { target: string; found: string; basis: string; controlFactor?: string | number },
  result: ResultOf<'reference-shift'>,
): ExplainedStep[] {
  const half = input.basis === 'diameter' ? ' / 2' : '';
  return [
    {
      what: 'Way that the slide lacks in +',
      formula: `1000 · (target − found)${half}`,
      withNumbers: `1000 · (${fig(input.target)} − ${fig(input.found)})${half}`,
      value: um(result.shift),
    },
    {
      what: 'As the control counts it',
      formula: 'shift · factor of the control',
      withNumbers: `${negative(result.shift)} · ${input.controlFactor ?? 1}`,
      value: um(result.controlShift),
    },
    {
      what: 'Amount of the shift at the slide',
      formula: '|shift|',
      withNumbers: `|${fig(result.shift)}|`,
      value: um(result.deviation),
    },
  ];
}

export function diameterSteps(
  input: { sections: { position: string; diameter: string }[] },
  result: ResultOf<'diameter-consistency'>,
): ExplainedStep[] {
  const sorted = [...input.sections].sort((a, b) => Number(a.position) - Number(b.position));
  return [
    {
      what: 'Taper: nearest to the headstock less far end',
      formula: '1000 · (D first − D last)',
      withNumbers: `1000 · (${fig(sorted[0]!.diameter)} − ${fig(sorted.at(-1)!.diameter)})`,
      value: um(result.taper),
    },
    {
      what: 'Largest less smallest diameter',
      formula: '1000 · (max D − min D)',
      withNumbers: `1000 · (${rangeOf(input.sections.map(({ diameter }) => diameter))})`,
      value: um(result.deviation),
    },
  ];
}

export function driftSteps(
  input: { points: { minutes: string; reading: string }[] },
  result: ResultOf<'drift'>,
): ExplainedStep[] {
  return [
    {
      what: 'Range in the first hour',
      formula: 'max − min of readings up to 60 min',
      withNumbers: `${input.points.length} readings in all`,
      value: um(result.firstHour),
    },
    {
      what: 'Rate, least squares over all',
      formula: 'slope · 60',
      withNumbers: 'reading over minutes',
      value: `${fig(result.rate)} µm/h`,
    },
    {
      what: 'Range over all readings',
      formula: 'max − min',
      withNumbers: rangeOf(input.points.map(({ reading }) => reading)),
      value: um(result.deviation),
    },
  ];
}
