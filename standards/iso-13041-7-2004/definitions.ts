import type { Plane, TestDefinition } from '../types';
import { workingSteps } from '../working-order';
import { circular, circularSteps } from './circular';
import { code, edition, source } from './source';

const usual =
  'There is no tolerance unless it is agreed; 15 to 30 µm at radii of 50 to 100 mm are usual (common practice).';

function circularIn(id: string, plane: Plane): TestDefinition {
  return {
    ...circular,
    code,
    edition,
    version: 1,
    source,
    machineKinds: { not: ['engine-lathe'] },
    id,
    title: `Circular test in ${plane}`,
    boundTitle: `Circular test {axis}/{reference}, in ${plane}`,
    procedure: [
      ...circularSteps,
      'Judged is the width of both paths together between two concentric circles of least separation; the squareness and the difference of the scales are given beside it.',
      usual,
    ],
    appliesTo: { kind: 'axis-pair', plane },
    judge: 'Gb',
    tolerance: null,
    workingStep: workingSteps.circular,
    judgedFigure: 'Gb, both directions together',
    setUpTogether: 'circular-test gauge at {axis}/{reference}',
  };
}

export const definitions: TestDefinition[] = [
  circularIn('CI-1', 'ZX'),
  circularIn('CI-2', 'XY'),
  circularIn('CI-3', 'YZ'),
];
