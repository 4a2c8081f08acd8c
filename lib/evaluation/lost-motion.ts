import { z } from 'zod';
import { Fraction } from '@/lib/units/fraction';
import { decimalText, label, tooFew } from './decimal-text';

const place = z.strictObject({
  feed: z.enum(['cutting-feed', 'rapid']),
  place: label.optional(),
  pairs: z.array(z.strictObject({ forward: decimalText, backward: decimalText })).min(1, tooFew(1, 'pair')),
});

export const lostMotionInput = z.strictObject({
  method: z.literal('lost-motion'),
  places: z.array(place).min(1, tooFew(1, 'place')),
  sense: z.enum(['plus-pushes-in', 'plus-releases']).optional(),
});

/**
 * Lost motion of an axis: the same target approached from both sides, at cutting feed and at rapid.
 *
 * Per place: mean of forward − backward (the reversal value B of ISO 230-2) and its spread. Per feed: mean over
 * the places, lostMotion = −mean (+ = play not compensated, − = compensated too much), spread of the places' means.
 * Judged: the largest amount of a place's mean.
 *
 * @param places feed, name, pairs of readings µm at the same target (at least one pair)
 * @param sense what the axis moving in + does to the plunger; `plus-releases` turns the sign of every reading
 * @returns per place mean, spread µm; per feed mean, lostMotion, spread µm; deviation µm
 * @throws EvaluationError no place, a place without a pair
 * @example forward 0, backward −2 → mean 2, lostMotion −2
 * Source: reversal value after ISO 230-2:2014 (from memory); sign of lostMotion common practice.
 */
export function lostMotion(input: z.output<typeof lostMotionInput>) {
  const sign = Fraction.of(input.sense === 'plus-releases' ? -1 : 1);
  const places = input.places.map(({ feed, place: name, pairs }) => {
    const differences = pairs.map((p) => Fraction.from(p.forward).minus(Fraction.from(p.backward)).times(sign));
    return { feed, name, mean: Fraction.mean(differences), spread: Fraction.range(differences) };
  });
  const feedPart = (feed: 'cutting-feed' | 'rapid') => {
    const means = places.filter((p) => p.feed === feed).map((p) => p.mean);
    if (means.length === 0) return null;
    const mean = Fraction.mean(means);
    return { mean: mean.toText(), lostMotion: mean.negated().toText(), spread: Fraction.range(means).toText() };
  };
  const cuttingFeed = feedPart('cutting-feed');
  const rapid = feedPart('rapid');
  return {
    method: 'lost-motion' as const,
    deviation: Fraction.max(places.map((p) => p.mean.abs())).toText(),
    judgedBy: 'largest amount of the mean of a place',
    signed: false as const,
    places: places.map(({ feed, name, mean, spread }) => ({
      feed,
      ...(name !== undefined && { place: name }),
      mean: mean.toText(),
      spread: spread.toText(),
    })),
    ...(cuttingFeed && { cuttingFeed }),
    ...(rapid && { rapid }),
  };
}
