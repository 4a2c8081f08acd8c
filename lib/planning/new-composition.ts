import type { OwnDefinitionForm, OwnDefinitionInput } from '@/lib/schemas/own-definition';
import { workingSteps } from '@/standards/working-order';
import { findMeasurement, measurements } from './measurements';

/** What the composer shows for a new test. @param measurement id of measurements.ts; anything else: the first of them */
export function newComposition(measurement: string = measurements[0]!.id): OwnDefinitionInput {
  const chosen = findMeasurement(measurement) ?? measurements[0]!;
  return {
    title: '',
    boundTitle: '',
    appliesTo: chosen.usualComponent,
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
    workingStep: workingSteps[chosen.step],
    setUpTogether: '',
    minutes: 20,
  };
}

/** Between what stands in a line of the layout that is typed as text. */
const between: Record<string, string> = { names: ', ', places: ', ', stations: ', ' };

/** What was composed, as the composer's fields show it: lists as the text that they were typed as. */
export function composedAgain(form: OwnDefinitionForm): OwnDefinitionInput {
  const layout = Object.fromEntries(
    Object.entries(form.layout).map(([field, value]) => [field, typedAgain(field, value)]),
  );
  const { boundTitle, judge, positiveMeans, negativeMeans, setUpTogether } = form;
  return {
    ...form,
    ...{ boundTitle: boundTitle ?? '', judge: judge ?? '', setUpTogether: setUpTogether ?? '' },
    ...{ positiveMeans: positiveMeans ?? '', negativeMeans: negativeMeans ?? '' },
    layout: layout as OwnDefinitionInput['layout'],
    procedure: form.procedure.join('\n'),
    instruments: form.instruments.join('\n'),
    usualMistakes: form.usualMistakes.join('\n'),
  };
}

function typedAgain(field: string, value: unknown): unknown {
  // `feeds` and `items` are chosen one by one, not typed.
  if (field === 'feeds' || field === 'items') return value;
  if (Array.isArray(value)) return value.join(between[field] ?? ' ');
  return value ?? '';
}
