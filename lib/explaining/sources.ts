import type { EvaluationMethod } from '@/lib/evaluation';
import type { ProvenanceKind } from '@/standards/types';

interface Named {
  title: string;
  source: { kind: ProvenanceKind; text: string };
}

const derived = (text: string) => ({ kind: 'derived' as const, text });
const remembered = (text: string) => ({ kind: 'from-memory' as const, text });
const practice = (text: string) => ({ kind: 'common-practice' as const, text });
const published = (text: string) => ({ kind: 'published' as const, text });

/** Name of each method in the trade's words, and where its formula comes from. */
export const sources: Record<EvaluationMethod, Named> = {
  straightness: {
    title: 'Straightness about a reference line',
    source: published(
      'ISO 230-1:2012, excerpt on straightness: largest deviations on both sides of a stated reference line',
    ),
  },
  'straightness-from-angles': {
    title: 'Straightness from angles, foot by foot',
    source: derived('sum of step times angle; straightness as in ISO 230-1:2012'),
  },
  'straightness-reversal': {
    title: 'Straightness with the straightedge turned over',
    source: derived('half the sum and half the difference of both runs; straightness as in ISO 230-1:2012'),
  },
  flatness: {
    title: 'Flatness about a reference plane',
    source: remembered(
      'ISO 230-1:2012, definition of flatness, high confidence; the narrowest slab is worked out exactly',
    ),
  },
  parallelism: {
    title: 'Parallelism of a motion to an axis',
    source: remembered(
      'ISO 230-1:2012: angle between reference lines; mean of 0° and 180° is derived, high confidence',
    ),
  },
  'squareness-to-axis': {
    title: 'Squareness of a motion to an axis of rotation',
    source: remembered('ISO 230-1:2012; mean of 0° and 180° is derived, high confidence'),
  },
  squareness: {
    title: 'Squareness of two motions by a square that is turned over',
    source: derived('half the sum of both settings drops the square’s own error'),
  },
  'run-out': {
    title: 'Run-out',
    source: remembered('total indicator reading over a turn, mean over the insertions of the mandrel, high confidence'),
  },
  'axial-run-out': {
    title: 'Face run-out and axial slip',
    source: remembered('total indicator reading over a turn, worst of the circles, high confidence'),
  },
  coaxiality: {
    title: 'Coaxiality by sweep',
    source: derived('half the differences of opposite readings; sag of the bracket taken off'),
  },
  'centre-height': {
    title: 'Height of a tool over the spindle axis',
    source: derived('half the difference of top and bottom, or the difference of two heights'),
  },
  'angular-deviation': {
    title: 'Angular deviation of a motion',
    source: remembered('ISO 230-1:2012: largest less smallest over the travel in both directions, high confidence'),
  },
  positioning: {
    title: 'Positioning by ISO 230-2',
    source: remembered('ISO 230-2:2014, formulas with the factor 2, high confidence'),
  },
  circular: {
    title: 'Circular test by ISO 230-4',
    source: remembered('ISO 230-4:2005, quantities published in its abstract, symbols from memory, high confidence'),
  },
  'axis-of-rotation': {
    title: 'Error motion of an axis of rotation',
    source: remembered('ISO 230-7, contents published, definitions from memory, high confidence'),
  },
  indexing: { title: 'Indexing', source: derived('range of each station, departure of its mean from the mean of all') },
  'lost-motion': {
    title: 'Lost motion',
    source: practice('pairs of approaches from both sides; the mean is the B of ISO 230-2'),
  },
  'reference-shift': { title: 'Reference shift', source: practice('target less found, half of it on diameter') },
  roundness: {
    title: 'Roundness',
    source: remembered(
      'two concentric circles of least separation, or about the least-squares centre, high confidence',
    ),
  },
  'diameter-consistency': {
    title: 'Consistency of diameter',
    source: remembered('largest less smallest diameter in one axial plane, medium confidence'),
  },
  drift: {
    title: 'Drift over time',
    source: remembered('ISO 230-3: ranges of the first hour and of all, medium confidence'),
  },
  'two-collar': {
    title: 'Two-collar cutting test',
    source: practice('half the difference of the diameters over their distance'),
  },
  uncertainty: {
    title: 'Combined uncertainty',
    source: published('GUM (JCGM 100:2008), 5.1.2, G.4: sum of squares, Welch–Satterthwaite, Student t'),
  },
  conformity: {
    title: 'Conformity with a tolerance',
    source: remembered('ISO 14253-1:2017 and JCGM 106: guard band and probability, high confidence'),
  },
  rounding: {
    title: 'Rounding',
    source: remembered('ISO 80000-1 Annex B, rules A and B, high confidence; rule A is also published in IS 2:1960'),
  },
  tolerance: {
    title: 'Tolerance for another length',
    source: remembered('proportion with a floor, high confidence; the floor of 5 µm medium'),
  },
  correction: { title: 'Correction', source: derived('geometry of the set-up; signs are verified by measuring again') },
};
