import type { EvaluationMethod } from '@/lib/evaluation';
import { angleGuides } from './angles';
import { axisGuides } from './axes';
import { correctionGuides } from './corrections';
import { helperGuides } from './helpers';
import type { MethodGuide } from './method-guide';
import { pieceGuides } from './piece';
import { straightGuides } from './straight';
import { turningGuides } from './turning';

/** Every method, helper and correction, in the order of the list. */
export const allGuides: readonly MethodGuide[] = [
  ...straightGuides,
  ...angleGuides,
  ...turningGuides,
  ...axisGuides,
  ...pieceGuides,
  ...helperGuides,
  ...correctionGuides,
];

export const findGuide = (slug: string): MethodGuide | undefined => allGuides.find((guide) => guide.slug === slug);

/** Guide of a method that a test uses; function checks have none. */
export const guideOfMethod = (method: EvaluationMethod | (string & {})): MethodGuide | undefined =>
  method === 'correction' ? undefined : allGuides.find((guide) => guide.method === method);
