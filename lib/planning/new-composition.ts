import type { OwnDefinitionInput } from '@/lib/schemas/own-definition';
import { workingSteps } from '@/standards/working-order';
import { findMeasurement, measurements } from './measurements';

/** On what a measurement is done most often: where the composer begins. */
const usualComponent: Record<string, OwnDefinitionInput['appliesTo']> = {
  'run-out': { kind: 'spindle', types: ['main'] },
  'face-run-out': { kind: 'spindle', types: ['main'] },
  'axis-of-rotation': { kind: 'spindle', types: ['main'] },
  parallelism: { kind: 'longitudinal-axis-and-spindle', plane: 'ZX' },
  'squareness-to-axis': { kind: 'cross-axis-and-spindle' },
  squareness: { kind: 'y-and-x' },
  coaxiality: { kind: 'main-and-sub-spindle' },
  'centre-height': { kind: 'turret-and-spindle' },
  'two-collar': { kind: 'turning-turret-and-spindle' },
  diameters: { kind: 'turning-turret-and-spindle' },
  roundness: { kind: 'turning-turret-and-spindle' },
  indexing: { kind: 'turret' },
  circular: { kind: 'axis-pair', plane: 'ZX' },
  'positioning-rotary': { kind: 'rotary-axis', letters: ['A', 'B', 'C'] },
  drift: { kind: 'turning-turret-and-spindle' },
  flatness: { kind: 'machine' },
  'function-check': { kind: 'machine' },
};

/** What the composer shows for a new test. @param measurement id of measurements.ts; anything else: the first of them */
export function newComposition(measurement: string = measurements[0]!.id): OwnDefinitionInput {
  const chosen = findMeasurement(measurement) ?? measurements[0]!;
  return {
    title: '',
    boundTitle: '',
    appliesTo: usualComponent[chosen.id] ?? { kind: 'linear-axis' },
    measurement: chosen.id,
    judge: '',
    layout: chosen.layout,
    tolerance: { by: 'none' },
    direction: 'either',
    resolutionUm: '1',
    scene: chosen.scene,
    procedure: '',
    instruments: 'indicator\nindicator stand',
    usualMistakes: '',
    cautions: ['isolate-before-touching'],
    judgedFigure: chosen.gives,
    positiveMeans: '',
    negativeMeans: '',
    workingStep: workingSteps.straightness,
    setUpTogether: '',
    minutes: 20,
  };
}
