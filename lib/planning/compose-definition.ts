import type { OwnDefinitionForm } from '@/lib/schemas/own-definition';
import { ownTests } from '@/standards/own-tests';
import type { AppliesTo, CautionId, Layout, SketchSpec, TestDefinition, ToleranceRule } from '@/standards/types';
import { restsOn, titleParts } from './applies-to-words';
import { findMeasurement } from './measurements';

/**
 * The test definition that the composer's fields describe. Whether it holds together is looked at by `ownDefinitionProblems`.
 * @param version 1 for a new test, one more than the last for a new version
 */
export function composeDefinition(form: OwnDefinitionForm, id: string, version: number): TestDefinition {
  const measurement = findMeasurement(form.measurement);
  const layout = layoutOf(form.layout);
  // A sign says nothing of a figure that has none.
  const signed = measurement?.signed === true && form.judge !== 'range';
  const rests = form.dependsOn ?? restsOn(form.appliesTo.kind).usual;
  return {
    id,
    code: ownTests.code,
    edition: ownTests.edition,
    version,
    title: form.title,
    boundTitle: form.boundTitle ?? boundTitleOf(form.title, form.appliesTo.kind),
    procedure: form.procedure,
    appliesTo: defined(form.appliesTo) as AppliesTo,
    method: measurement?.method ?? form.measurement,
    ...(form.judge ? { judge: form.judge } : {}),
    layout,
    tolerance: toleranceOf(form.tolerance),
    direction: form.direction,
    ...(measurement?.shownIn ? { shownIn: measurement.shownIn } : {}),
    resolution: { valueUm: form.resolutionUm, rule: 'half-even' },
    instruments: form.instruments,
    ...(form.usualMistakes.length > 0 ? { usualMistakes: form.usualMistakes } : {}),
    ...(form.setUpTogether ? { setUpTogether: form.setUpTogether } : {}),
    minutes: form.minutes,
    cautions: [...new Set([...form.cautions, 'maker-and-local-rules-first'])] as CautionId[],
    sketch: sketchOf(form, layout, signed),
    dependsOn: rests as TestDefinition['dependsOn'],
    workingStep: form.workingStep,
    judgedFigure: form.judgedFigure,
    ...(signed && form.positiveMeans ? { positiveMeans: form.positiveMeans } : {}),
    ...(signed && form.negativeMeans ? { negativeMeans: form.negativeMeans } : {}),
    source: ownTests.source,
  };
}

/** `Bed level: {axis}, {plane}`: the components behind the title, where the person gave no other. */
function boundTitleOf(title: string, kind: AppliesTo['kind']): string {
  const parts = titleParts(kind).map((part) => `{${part}}`);
  return parts.length > 0 ? `${title}: ${parts.join(', ')}` : title;
}

/** Without the entries that are `undefined`: a definition is plain data that comes back from the database as it went in. */
function defined<T extends object>(value: T): T {
  return Object.fromEntries(Object.entries(value).filter(([, entry]) => entry !== undefined)) as T;
}

function layoutOf(given: OwnDefinitionForm['layout']): Layout {
  switch (given.kind) {
    case 'turns':
      return defined({ ...given, names: given.names ?? undefined });
    case 'profile':
      return defined({ ...given, localLengthMm: given.localLengthMm ?? undefined });
    case 'check-list':
      return {
        kind: 'check-list',
        items: given.items.map(({ question, value }, index) => ({
          id: `i${index + 1}`,
          question,
          ...(value ? { value: defined(value) } : {}),
        })),
      };
    default:
      return defined(given) as Layout;
  }
}

function toleranceOf(given: OwnDefinitionForm['tolerance']): ToleranceRule | null {
  if (given.by === 'none') return null;
  const { perLength, local, basis, provenance, unit, ...figures } = given;
  return {
    ...figures,
    ...(unit === 'µm' ? {} : { unit }),
    ...(perLength ? { perLength: defined(perLength) } : {}),
    ...(local ? { local: { ...local, provenance } } : {}),
    ...(basis ? { basis } : {}),
    provenance: provenance.kind === 'from-memory' ? { ...provenance, confidence: 'medium' } : provenance,
  };
}

function sketchOf(form: OwnDefinitionForm, layout: Layout, signed: boolean): SketchSpec {
  const anglesDeg = 'anglesDeg' in layout ? layout.anglesDeg.filter((angle) => Number(angle) < 360).slice(0, 4) : null;
  const { appliesTo } = form;
  return {
    scene: form.scene as SketchSpec['scene'],
    ...(anglesDeg && anglesDeg.length > 1 ? { anglesDeg } : {}),
    ...('plane' in appliesTo && appliesTo.plane ? { plane: appliesTo.plane } : {}),
    ...(signed && form.positiveMeans ? { positiveMeans: form.positiveMeans } : {}),
  };
}
