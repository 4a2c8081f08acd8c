import type { ResultOf } from '@/lib/evaluation';
import type { ExplainedStep } from './explanation';
import { extremes, fig, listed, negative, rangeOf, um, umPerM } from './figures';

export function runOutSteps(
  input: { judge?: string; insertions: { readings: string[] }[] },
  result: ResultOf<'run-out'>,
): ExplainedStep[] {
  const totals = result.perInsertion.map(({ totalIndicatorReading }) => totalIndicatorReading);
  const each = input.insertions.map(({ readings }, k) => ({
    what: input.insertions.length === 1 ? 'Total indicator reading' : `Total indicator reading ${k + 1}`,
    formula: 'max r − min r',
    withNumbers: rangeOf(readings),
    value: um(totals[k]!),
  }));
  const shownEach = each.length > 4 ? [...each.slice(0, 3), each.at(-1)!] : each;
  if (each.length === 1) return shownEach;
  return [
    ...shownEach,
    input.judge === 'largest'
      ? {
          what: 'The largest of them',
          formula: 'max',
          withNumbers: `max(${listed(totals)})`,
          value: um(result.deviation),
        }
      : {
          what: 'Mean over the insertions',
          formula: `(${totals.map((_, k) => `T${k + 1}`).join(' + ')})/${totals.length}`,
          withNumbers: `(${totals.map(fig).join(' + ')}) / ${totals.length}`,
          value: um(result.deviation),
        },
  ];
}

export function axialSteps(
  input: { circles: { name?: string; readings: string[] }[] },
  result: ResultOf<'axial-run-out'>,
): ExplainedStep[] {
  const each = input.circles.map(({ name, readings }, k) => ({
    what: name ?? `Circle ${k + 1}`,
    formula: 'max r − min r',
    withNumbers: rangeOf(readings),
    value: um(result.perCircle[k]!),
  }));
  const largest = {
    what: 'The largest of them',
    formula: 'max',
    withNumbers: `max(${listed(result.perCircle)})`,
    value: um(result.deviation),
  };
  return [...each.slice(0, 6), largest];
}

interface Sweep {
  '0': string;
  '90': string;
  '180': string;
  '270': string;
}

function offsetSteps(
  sweep: Sweep,
  surface: string,
  sag: string,
  centre: { ex: string; ey: string },
  at: string,
): ExplainedStep[] {
  const q = surface === 'bore' ? '−1 · ' : '';
  const off = Number(sag) === 0 ? '' : ` − ${fig(sag)}`;
  return [
    {
      what: `Offset along the first axis${at}`,
      formula: `ex = ${q}(r0 − r180)/2`,
      withNumbers: `${q}(${fig(sweep['0'])} − ${negative(sweep['180'])}) / 2`,
      value: um(centre.ex),
    },
    {
      what: `Offset along the second axis${at}${off ? ', sag of the bracket taken off' : ''}`,
      formula: `ey = ${q}(r90 − r270)/2${off ? ' − sag' : ''}`,
      withNumbers: `${q}(${fig(sweep['90'])} − ${negative(sweep['270'])}) / 2${off}`,
      value: um(centre.ey),
    },
  ];
}

export function coaxialitySteps(
  input: {
    sections: { position: string; readings: Sweep }[];
    surface: string;
    sag?: string;
    up?: string;
    basis?: string;
    plane?: string;
  },
  result: ResultOf<'coaxiality'>,
): ExplainedStep[] {
  const plainUp = input.up === undefined || Number(input.up) === 90;
  const sections = input.sections.flatMap(({ position, readings }, k) => {
    const centre = result.sections[k]!;
    const at = ` at ${fig(position)} mm`;
    const offsets = plainUp
      ? offsetSteps(readings, input.surface, input.sag ?? '0', centre, at)
      : [
          {
            what: `Offsets${at}, sag of the bracket taken off along ${fig(input.up!)}°`,
            formula: 'ex = ±(r0 − r180)/2 − s·cos(up); ey = ±(r90 − r270)/2 − s·sin(up)',
            withNumbers: `s = ${fig(input.sag ?? '0')} µm`,
            value: `ex = ${um(centre.ex)}, ey = ${um(centre.ey)}`,
          },
        ];
    return [
      ...offsets,
      {
        what: `Distance of the axes${at}`,
        formula: 'e = √(ex² + ey²)',
        withNumbers: `√(${negative(centre.ex)}·${negative(centre.ex)} + ${negative(centre.ey)}·${negative(centre.ey)})`,
        value: um(centre.offset),
      },
    ];
  });
  const total = input.basis === 'total-indicator-reading';
  return [
    ...sections.slice(0, 9),
    {
      what: `Largest ${input.plane === 'x' ? '|ex|' : input.plane === 'y' ? '|ey|' : 'distance'} of the sections${total ? ', twice: total indicator reading' : ''}`,
      formula: total ? '2 · max' : 'max',
      withNumbers: listed(
        result.sections.map(({ ex, ey, offset }) => (input.plane === 'x' ? ex : input.plane === 'y' ? ey : offset)),
      ),
      value: um(result.deviation),
    },
  ];
}

export function centreHeightSteps(
  input: {
    sweep?: Sweep;
    surface?: string;
    sag?: string;
    top?: string;
    bottom?: string;
    toolHeight?: string;
    spindleHeight?: string;
  },
  result: ResultOf<'centre-height'>,
): ExplainedStep[] {
  const q = input.surface === 'bore' ? '−1 · ' : '';
  const off = Number(input.sag ?? '0') === 0 ? '' : ` − ${fig(input.sag!)}`;
  const pair = input.sweep
    ? ([input.sweep['90'], input.sweep['270']] as const)
    : input.top !== undefined
      ? ([input.top, input.bottom!] as const)
      : null;
  const height: ExplainedStep = pair
    ? {
        what: `Height of the tool over the spindle axis${off ? ', sag of the bracket taken off' : ''}`,
        formula: `ey = ${q}(r top − r bottom)/2${off ? ' − sag' : ''}`,
        withNumbers: `${q}(${fig(pair[0])} − ${negative(pair[1])}) / 2${off}`,
        value: um(result.ey),
      }
    : {
        what: 'Height of the tool over the spindle axis',
        formula: 'ey = height of the tool − height of the spindle',
        withNumbers: `${fig(input.toolHeight!)} − ${negative(input.spindleHeight!)}`,
        value: um(result.ey),
      };
  const across: ExplainedStep[] =
    input.sweep && result.ex !== undefined
      ? [
          {
            what: 'Offset along X, for information',
            formula: `ex = ${q}(r0 − r180)/2`,
            withNumbers: `${q}(${fig(input.sweep['0'])} − ${negative(input.sweep['180'])}) / 2`,
            value: um(result.ex),
          },
        ]
      : [];
  return [...across, height];
}

export function indexingSteps(
  input: { judge?: string; radius?: string; stations: { name: string; readings: string[] }[] },
  result: ResultOf<'indexing'>,
): ExplainedStep[] {
  const accuracy = input.judge === 'accuracy';
  const worst = accuracy
    ? extremes(result.departures.map((departure) => departure.replace('-', ''))).atLargest
    : input.stations.findIndex(({ name }) => name === result.worstStation);
  const { name, readings } = input.stations[worst]!;
  if (!accuracy)
    return [
      {
        what: `Range of each station`,
        formula: 'max r − min r',
        withNumbers: input.stations
          .map((station) => station.name)
          .slice(0, 4)
          .join(', '),
        value: `${listed(result.ranges)} µm`,
      },
      {
        what: `Worst station: ${name}`,
        formula: 'max r − min r',
        withNumbers: rangeOf(readings),
        value: um(result.deviation),
      },
    ];
  return [
    {
      what: 'Departure of each station’s mean from the mean of all means',
      formula: 'd = mean(r) − mean of means',
      withNumbers: `${input.stations.length} stations`,
      value: `${listed(result.departures)} µm`,
    },
    {
      what: `Largest amount, station ${name}`,
      formula: 'max |d|',
      withNumbers: `|${fig(result.departures[worst]!)}|`,
      value: um(result.deviation),
    },
  ];
}

export function rotationSteps(
  input: { direction: string; judge?: string; turns: string[][] },
  result: ResultOf<'axis-of-rotation'>,
): ExplainedStep[] {
  const unit = input.direction === 'tilt' ? umPerM : um;
  const judge = input.judge ?? 'total';
  const axial = input.direction === 'axial';
  const steps: ExplainedStep[] = [
    {
      what: 'Mean trace over the turns, and the part that comes once a turn',
      formula: 'm(k) = mean over turns of r(i, k); fit c + a·cos θ + b·sin θ',
      withNumbers: `${input.turns.length} turns of ${input.turns[0]!.length} readings`,
      value:
        axial && 'fundamental' in result
          ? `once per turn ${unit(result.fundamental!)}`
          : `eccentricity ${unit('eccentricity' in result ? result.eccentricity! : '0')}`,
    },
    {
      what: 'Synchronous: what comes back every turn',
      formula: axial ? 'max m − min m' : 'max (m − fit) − min (m − fit)',
      withNumbers: 'of the mean trace',
      value: unit(result.synchronous),
    },
    {
      what: 'Asynchronous: what does not',
      formula: 'max over k of (max over turns − min over turns)',
      withNumbers: 'at each angle over the turns',
      value: unit(result.asynchronous),
    },
    {
      what: 'Total over all turns',
      formula: axial ? 'max r − min r' : 'max (r − fit) − min (r − fit)',
      withNumbers: 'over all turns and angles',
      value: unit(result.total),
    },
  ];
  const at = { synchronous: 1, asynchronous: 2, total: 3 }[judge] ?? 3;
  const [judged] = steps.splice(at, 1);
  return [...steps, judged!];
}
