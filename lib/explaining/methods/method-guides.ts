import { angleGuides } from './angles';
import { axisGuides } from './axes';
import { correctionGuides } from './corrections';
import { helperGuides } from './helpers';
import type { MethodGuide } from './method-guide';
import { pieceGuides } from './piece';
import { straightGuides } from './straight';
import { turningGuides } from './turning';

/** Every method of the calculator, in the order in which it is offered. */
export const methodGuides: readonly MethodGuide[] = [
  ...straightGuides,
  ...angleGuides,
  ...turningGuides,
  ...axisGuides,
  ...pieceGuides,
  ...helperGuides,
  ...correctionGuides,
];

export function findGuide(slug: string): MethodGuide | null {
  return methodGuides.find((guide) => guide.slug === slug) ?? null;
}
