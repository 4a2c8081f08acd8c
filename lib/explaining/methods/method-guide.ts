import type { EvaluationInput, EvaluationMethod } from '@/lib/evaluation';
import type { ProvenanceKind } from '@/standards/types';

export const guideGroups = {
  straight: 'Straight and flat',
  angles: 'Parallel, square and inclined',
  turning: 'Spindles and turrets',
  axes: 'Axes and their controls',
  piece: 'Turned pieces and time',
  helpers: 'Tolerance, uncertainty and verdict',
  corrections: 'Amounts for a correction',
} as const;
export type GuideGroup = keyof typeof guideGroups;

/** A field of a method's input or result, by the name that it has in a request. */
export interface GuideField {
  name: string;
  /** '' where it is no figure. */
  unit: string;
  words: string;
  optional?: true;
}

export interface GuideSource {
  kind: ProvenanceKind;
  text: string;
}

/** What a person has to know to use a method and to trust it. Data only. */
export interface MethodGuide {
  /** Last part of its address. */
  slug: string;
  method: EvaluationMethod;
  group: GuideGroup;
  title: string;
  /** One sentence for the list. */
  sentence: string;
  /** When it is used, in two or three sentences. */
  purpose: string;
  formulas: string[];
  /** Without `method` and `kind`, which every input carries. */
  inputs: GuideField[];
  /** Without `method`, `deviation`, `judgedBy`, `signed`, which every judged result carries. */
  outputs: GuideField[];
  /** What a positive and a negative figure mean; null where the figure has no sign. */
  sign: string | null;
  sensitiveTo: string[];
  source: GuideSource;
  example: { words: string; input: EvaluationInput };
}

export const given = (name: string, unit: string, words: string): GuideField => ({ name, unit, words });
export const maybe = (name: string, unit: string, words: string): GuideField => ({ name, unit, words, optional: true });
