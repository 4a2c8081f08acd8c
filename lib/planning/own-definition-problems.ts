import type { OwnDefinitionForm } from '@/lib/schemas/own-definition';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells } from '@/lib/sheet/types';
import { Fraction } from '@/lib/units/fraction';
import { cautions } from '@/standards/cautions';
import { sketchScenes } from '@/standards/sketch-scenes';
import type { TestDefinition } from '@/standards/types';
import { workingSteps } from '@/standards/working-order';
import { restsOn, titleParts } from './applies-to-words';
import { composeDefinition } from './compose-definition';
import { exampleSheet } from './example-sheet';
import type { Measurement } from './measurement';
import { findMeasurement } from './measurements';

export interface CompositionProblem {
  /** JSON pointer into the composer's fields. */
  pointer: string;
  detail: string;
}

/**
 * What does not hold together in a composed test, by the rules that the catalogue itself is held to: the method fits the fields,
 * a side only where the result has a sign, a tolerance without gap, a sheet that can be filled in and gives a result.
 */
export function ownDefinitionProblems(form: OwnDefinitionForm): CompositionProblem[] {
  const measurement = findMeasurement(form.measurement);
  if (!measurement) return [{ pointer: '/measurement', detail: 'Choose what is measured.' }];
  const problems = [
    ...measurementProblems(form, measurement),
    ...toleranceProblems(form, measurement),
    ...wordProblems(form),
    ...placeProblems(form),
  ];
  return problems.length > 0 ? problems : trialProblems(composeDefinition(form, 'OWN-0', 1));
}

function measurementProblems(form: OwnDefinitionForm, measurement: Measurement): CompositionProblem[] {
  const { layout, direction, judge, resolutionUm: _ } = form;
  if (layout.kind !== measurement.layout.kind)
    return [{ pointer: '/layout/kind', detail: `These fields do not belong to “${measurement.label}”.` }];
  const problems: CompositionProblem[] = [];
  const unfit = measurement.fits?.(composeDefinition(form, 'OWN-0', 1).layout);
  if (unfit) problems.push({ pointer: '/measurement', detail: unfit });
  if (judge && !measurement.judges.some(({ value }) => value === judge))
    problems.push({ pointer: '/judge', detail: `“${measurement.label}” has no figure “${judge}”.` });
  if (direction !== 'either' && (!measurement.signed || judge === 'range'))
    problems.push({
      pointer: '/direction',
      detail: 'This result has no sign: it can be permitted either way only.',
    });
  if (measurement.signed && judge !== 'range') {
    if (!form.positiveMeans)
      problems.push({ pointer: '/positiveMeans', detail: 'The result has a sign: say what a positive figure means.' });
    if (!form.negativeMeans)
      problems.push({ pointer: '/negativeMeans', detail: 'The result has a sign: say what a negative figure means.' });
  }
  if (layout.kind === 'turns' && layout.names && layout.names.length !== layout.insertions)
    problems.push({
      pointer: '/layout/names',
      detail: `Give a name for each of the ${layout.insertions} turns, or none.`,
    });
  return problems;
}

function toleranceProblems(form: OwnDefinitionForm, measurement: Measurement): CompositionProblem[] {
  const { tolerance } = form;
  if (tolerance.by === 'none') return [];
  const problems: CompositionProblem[] = [];
  if (measurement.method === 'function-check')
    problems.push({
      pointer: '/tolerance/by',
      detail: 'A function check has no tolerance: every item is in order or not.',
    });
  if (tolerance.unit !== measurement.toleranceUnit)
    problems.push({ pointer: '/tolerance/unit', detail: `The result is judged in ${measurement.toleranceUnit}.` });
  if (tolerance.perLength && !measurement.perLength)
    problems.push({
      pointer: '/tolerance/perLength',
      detail: 'This result is taken at a fixed place: its tolerance is not worked out for another length.',
    });
  if (tolerance.local && measurement.method !== 'straightness')
    problems.push({ pointer: '/tolerance/local', detail: 'A local tolerance is judged for straightness only.' });
  if (tolerance.basis && measurement.method !== 'coaxiality')
    problems.push({
      pointer: '/tolerance/basis',
      detail: 'Only a coaxiality counts the offset or the total indicator reading.',
    });
  if (needsAxis(tolerance.by) && !restsOn(form.appliesTo.kind).can.moved.includes('axis'))
    problems.push({ pointer: '/tolerance/by', detail: 'The component has no axis whose travel could decide.' });
  if (tolerance.by === 'size-class') problems.push(...rising(tolerance.byClassUm, (k) => `/tolerance/byClassUm/${k}`));
  if ('steps' in tolerance) problems.push(...stepProblems(tolerance.steps));
  return problems;
}

const needsAxis = (by: string) => by === 'travel';
const compare = (a: string, b: string) => Fraction.from(a).compare(Fraction.from(b));

function rising(figures: readonly string[], pointer: (k: number) => string): CompositionProblem[] {
  return figures.flatMap((figure, k) =>
    k > 0 && compare(figure, figures[k - 1]!) < 0
      ? [{ pointer: pointer(k), detail: 'A larger machine has no smaller tolerance than the one before.' }]
      : [],
  );
}

type Steps = Extract<OwnDefinitionForm['tolerance'], { by: 'travel' }>['steps'];

function stepProblems(steps: Steps): CompositionProblem[] {
  const at = (k: number, field: string) => `/tolerance/steps/${k}/${field}`;
  return [
    ...steps.flatMap(({ overMm, upToMm }, k): CompositionProblem[] => {
      const before = steps[k - 1];
      const gap = before && (before.upToMm === null || compare(before.upToMm, overMm) !== 0);
      return [
        ...(gap ? [{ pointer: at(k, 'overMm'), detail: 'A line begins where the one before ends.' }] : []),
        ...(upToMm !== null && compare(upToMm, overMm) <= 0
          ? [{ pointer: at(k, 'upToMm'), detail: 'The line ends before it begins.' }]
          : []),
      ];
    }),
    ...rising(
      steps.map(({ toleranceUm }) => toleranceUm),
      (k) => at(k, 'toleranceUm'),
    ),
  ];
}

function wordProblems(form: OwnDefinitionForm): CompositionProblem[] {
  const known: readonly string[] = titleParts(form.appliesTo.kind);
  const problems: CompositionProblem[] = [];
  for (const [field, text] of [
    ['boundTitle', form.boundTitle],
    ['setUpTogether', form.setUpTogether],
  ] as const) {
    for (const [, name = ''] of (text ?? '').matchAll(/\{([^}]*)\}/g)) {
      if (known.includes(name)) continue;
      const allowed = known.map((part) => `{${part}}`).join(', ');
      problems.push({
        pointer: `/${field}`,
        detail: `{${name}} cannot stand here. ${allowed ? `This component has ${allowed}.` : 'This component has no name.'}`,
      });
    }
  }
  if (/[{}]/.test(form.title))
    problems.push({ pointer: '/title', detail: 'Braces belong into the title on the sheet.' });
  return problems;
}

function placeProblems(form: OwnDefinitionForm): CompositionProblem[] {
  const problems: CompositionProblem[] = [];
  if (!sketchScenes.some((scene) => scene === form.scene))
    problems.push({ pointer: '/scene', detail: 'Choose a sketch.' });
  if (!Object.values(workingSteps).some((step) => step === form.workingStep))
    problems.push({ pointer: '/workingStep', detail: 'Choose its place in the working order.' });
  if (form.cautions.some((id) => !Object.hasOwn(cautions, id)))
    problems.push({ pointer: '/cautions', detail: 'Choose the cautions from the list.' });
  const { can } = restsOn(form.appliesTo.kind);
  for (const part of ['components', 'moved', 'positioned'] as const) {
    const strange = form.dependsOn?.[part].find((one) => !can[part].includes(one));
    if (strange !== undefined)
      problems.push({ pointer: `/dependsOn/${part}`, detail: `This component has no “${strange}”.` });
  }
  return problems;
}

/**
 * The sheet is filled in on trial, on a machine that has what it is done on: every field has a name of its own, and readings give a
 * result. Nothing is said where no machine to start from has such a component.
 */
function trialProblems(definition: TestDefinition): CompositionProblem[] {
  const wrong = (detail: string): CompositionProblem[] => [{ pointer: '/layout', detail }];
  const example = exampleSheet(definition);
  if (!example) return [];
  const { sheet } = example;
  const fields = sheetFields(definition, sheet.setUp);
  const all = allFields(fields);
  if (fields.order.length === 0) return wrong('The sheet has no field to be read.');
  if (new Set(all.map(({ pointer }) => pointer)).size !== all.length) return wrong('Two fields of the sheet are one.');
  if (new Set(all.map(({ label }) => label)).size !== all.length)
    return wrong('Two fields of the sheet have one name.');
  const outcome = judgeSheet(
    { definition: sheet.definition, tolerance: sheet.tolerance, direction: sheet.direction, decisionRule: 'simple' },
    definition,
    trialCells(definition, sheet.setUp),
  );
  if (outcome.state === 'complete') return [];
  const reason = outcome.state === 'not-yet' ? outcome.reason : '';
  return wrong(`These fields give no result. ${reason}`.trim());
}

/** Every reading filled with something that its field takes. */
export function trialCells(definition: TestDefinition, setUp: Cells): Cells {
  const fields = sheetFields(definition, setUp);
  const byPointer = new Map(allFields(fields).map((field) => [field.pointer, field]));
  const readings = fields.order.map((pointer, k) => {
    const field = byPointer.get(pointer);
    const text = field?.options?.[0]?.value ?? (field?.unit === 'mm' ? `30.00${k % 10}` : String((k * 7) % 3));
    return [pointer, { text, unit: field?.options ? null : (field?.unit ?? null) }];
  });
  return { ...setUp, ...Object.fromEntries(readings) };
}
