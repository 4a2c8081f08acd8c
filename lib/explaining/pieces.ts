import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { fig, negative, rangeOf, rising, um, umPerM } from './figures';
import { leastSquaresStep } from './least-squares';

export function diameterSteps(
  input: { sections: { position: string; diameter: string }[] },
  result: ResultOf<'diameter-consistency'>,
): ExplainedStep[] {
  const { sections } = input;
  const order = rising(sections.map(({ position }) => position));
  const [first, last] = [sections[order[0]!]!, sections[order.at(-1)!]!];
  return [
    {
      what: `Taper, at ${fig(first.position)} mm less at ${fig(last.position)} mm; for information`,
      formula: '1000 · (D first − D last)',
      withNumbers: `1000 · (${fig(first.diameter)} − ${fig(last.diameter)})`,
      value: um(result.taper),
    },
    leastSquaresStep({
      what: 'Slope of the axis: half the slope of the diameters, turned round; for information',
      x: sections.map(({ position }) => position),
      y: sections.map(({ diameter }) => diameter),
      names: ['x', 'D'],
      factor: '(−1000000) / 2',
      value: umPerM(result.slope),
    }),
    {
      what: 'Largest less smallest diameter',
      formula: '1000 · (max D − min D)',
      withNumbers: `1000 · (${rangeOf(sections.map(({ diameter }) => diameter))})`,
      value: um(result.deviation),
    },
  ];
}

export function driftSteps(
  input: { points: { minutes: string; reading: string }[] },
  result: ResultOf<'drift'>,
): ExplainedStep[] {
  const { points } = input;
  const times = points.map(({ minutes }) => minutes);
  const begin = Fraction.from(times[rising(times)[0]!]!);
  const hour = points.filter(({ minutes }) => Fraction.from(minutes).minus(begin).compare(Fraction.of(60)) <= 0);
  const readings = points.map(({ reading }) => reading);
  return [
    {
      what: 'Range in the first hour, for information',
      formula: 'max r − min r of the readings up to 60 min',
      withNumbers: rangeOf(hour.map(({ reading }) => reading)),
      value: um(result.firstHour),
    },
    leastSquaresStep({
      what: 'Rate over all, for information',
      x: times,
      y: readings,
      names: ['t', 'r'],
      factor: '60',
      value: `${fig(result.rate)} µm/h`,
    }),
    {
      what: 'Range over all readings',
      formula: 'max r − min r',
      withNumbers: rangeOf(readings),
      value: um(result.deviation),
    },
  ];
}

export function angularSteps(
  input: { positions: string[]; forward: string[]; backward?: string[] },
  result: ResultOf<'angular-deviation'>,
): ExplainedStep[] {
  const { forward, backward, positions } = input;
  const at = positions.findIndex(
    (position) =>
      result.hysteresisAt !== undefined && Fraction.from(position).equals(Fraction.from(result.hysteresisAt)),
  );
  const hysteresis: ExplainedStep[] =
    backward && result.hysteresis !== undefined && at >= 0
      ? [
          {
            what: `Hysteresis: largest difference of both ways, at ${fig(positions[at]!)} mm; for information`,
            formula: 'max |forward − backward|',
            withNumbers: `|${fig(forward[at]!)} − ${negative(backward[at]!)}|`,
            value: umPerM(result.hysteresis),
          },
        ]
      : [];
  return [
    ...hysteresis,
    {
      what: `Largest less smallest reading${backward ? ', both ways together' : ''}`,
      formula: 'max − min',
      withNumbers: rangeOf([...forward, ...(backward ?? [])]),
      value: umPerM(result.deviation),
    },
  ];
}

export function twoCollarSteps(
  input: { D1: string; D2: string; distance: string },
  result: ResultOf<'two-collar'>,
): ExplainedStep[] {
  return [
    {
      what: 'Slope of the spindle axis in the plane of the tool; positive: the free end leans toward the tool',
      formula: '1000000 · (D1 − D2) / (2 · L)',
      withNumbers: `1000000 · (${fig(input.D1)} − ${fig(input.D2)}) / (2 · ${fig(input.distance)})`,
      value: umPerM(result.slope),
    },
    {
      what: 'Half the difference of the diameters, over the distance',
      formula: '1000 · (D1 − D2) / 2',
      withNumbers: `1000 · (${fig(input.D1)} − ${fig(input.D2)}) / 2`,
      value: um(result.deviation),
      readings: ['/D1', '/D2'],
    },
  ];
}
