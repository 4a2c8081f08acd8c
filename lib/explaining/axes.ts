import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { alike, atLargestAmount, fig, meanText, negative, um } from './figures';

interface Place {
  feed: string;
  place?: string;
  pairs: { forward: string; backward: string }[];
}

const feedWords = (feed: string) => (feed === 'rapid' ? 'rapid' : 'cutting feed');
const placeWords = ({ feed, place }: Place) => `${feedWords(feed)}${place ? `, ${place}` : ''}`;

export function lostMotionSteps(
  input: { sense?: string; places: Place[] },
  result: ResultOf<'lost-motion'>,
): ExplainedStep[] {
  const means = result.places.map(({ mean }) => mean);
  const worst = atLargestAmount(means);
  const releases = input.sense === 'plus-releases';
  const { pairs } = input.places[worst]!;
  const where = placeWords(input.places[worst]!);
  const differences = pairs.map(({ forward, backward }) => {
    const difference = Fraction.from(forward).minus(Fraction.from(backward));
    return (releases ? difference.negated() : difference).toText();
  });
  return [
    ...pairs.slice(0, 3).map(({ forward, backward }, k) => ({
      what: `Pair ${k + 1} at the worst place (${where})`,
      formula: releases
        ? 'd = −1 · (approach in + − approach in −), moving in + releases the plunger'
        : 'd = approach in + − approach in −',
      withNumbers: releases
        ? `−1 · (${fig(forward)} − ${negative(backward)})`
        : `${fig(forward)} − ${negative(backward)}`,
      value: um(differences[k]!),
      readings: [`/places/${worst}/pairs/${k}/forward`, `/places/${worst}/pairs/${k}/backward`],
    })),
    ...alike(pairs.length - 3),
    {
      what: `Mean of the pairs there`,
      formula: 'Σd / number of pairs',
      withNumbers: meanText(differences),
      value: um(means[worst]!),
    },
    ...feedSteps(input.places, means, result),
    {
      what: 'Largest amount of a place',
      formula: 'max |mean d|',
      withNumbers: `|${fig(means[worst]!)}|`,
      value: um(result.deviation),
    },
  ];
}

/** Lost motion of each feed over its places, for information. */
function feedSteps(places: Place[], means: readonly string[], result: ResultOf<'lost-motion'>): ExplainedStep[] {
  const feeds = [
    ['cutting-feed', result.cuttingFeed],
    ['rapid', result.rapid],
  ] as const;
  return feeds.flatMap(([feed, one]) =>
    one
      ? [
          {
            what: `Lost motion at ${feedWords(feed)}: positive is play that is not compensated; for information`,
            formula: '−(mean over the places)',
            withNumbers: `−(${meanText(means.filter((_, k) => places[k]!.feed === feed))})`,
            value: um(one.lostMotion),
          },
        ]
      : [],
  );
}

export function referenceShiftSteps(
  input: { target: string; found: string; basis: string; controlFactor?: string | number },
  result: { shift: string; controlShift: string; deviation: string },
): ExplainedStep[] {
  const half = input.basis === 'diameter' ? ' / 2' : '';
  return [
    {
      what: `Way that the slide lacks in +${half ? ', half of the difference of diameters' : ''}`,
      formula: `shift = 1000 · (target − found)${half}`,
      withNumbers: `1000 · (${fig(input.target)} − ${negative(input.found)})${half}`,
      value: um(result.shift),
      readings: ['/target', '/found'],
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
