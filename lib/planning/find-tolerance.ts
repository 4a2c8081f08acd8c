import type { MakeUp } from '@/lib/schemas/make-up';
import { convert } from '@/lib/units/convert';
import { findSizeClass, liesWithin, limitsInWords } from '@/standards/size-classes';
import type {
  BoundComponent,
  Confirmation,
  DecimalText,
  PlannedTolerance,
  Provenance,
  TestDefinition,
  ToleranceRule,
} from '@/standards/types';
import { cellPrefix, classCell, type OrganisationValues, stepCell, toleranceCellKey } from './organisation-values';

/**
 * Tolerance of a bound definition by the machine's sizes, µm or, for slopes and angles, µm/m (1″ = π/648000 rad). A figure that the
 * organisation replaced stands instead of the catalogue's, with who looked it up and where.
 * @returns null where the definition has none or its table does not reach the machine's size: the sheet is for information then
 */
export function findTolerance(
  definition: TestDefinition,
  component: BoundComponent,
  makeUp: MakeUp,
  values?: OrganisationValues,
): PlannedTolerance | null {
  const rule = definition.tolerance;
  const of = (cell: string) => values?.get(toleranceCellKey(definition, cell));
  const found = rule && figureFor(rule, component, makeUp, of, '');
  if (!rule || !found) return null;
  const also = (definition.also ?? []).flatMap(({ figure, label, tolerance }) => {
    const limit = figureFor(tolerance, component, makeUp, of, cellPrefix(figure));
    return limit ? [{ figure, label, ...limit }] : [];
  });
  const local = rule.local && localOf(rule, rule.local, of);
  // A tolerance with a local one beside it is confirmed when both figures are.
  const { toleranceUm, confirmation, foundBy, provenance } = found;
  return {
    baseUm: toleranceUm,
    ...(rule.perLength ? { perLength: perLengthOf(rule, rule.perLength) } : {}),
    ...(local ? { local: local.tolerance } : {}),
    ...(rule.basis ? { basis: rule.basis } : {}),
    ...(also.length > 0 ? { also } : {}),
    ...(confirmation && (!local || local.confirmation) ? { confirmation } : {}),
    foundBy,
    provenance,
  };
}

type StoredValue = (cell: string) => { toleranceUm: DecimalText; confirmation: Confirmation } | undefined;

function figureFor(rule: ToleranceRule, component: BoundComponent, makeUp: MakeUp, of: StoredValue, prefix: string) {
  const found = findFigure(rule, component, makeUp);
  if (!found) return null;
  const value = of(`${prefix}${found.cell}`);
  return {
    toleranceUm: inUm(value?.toleranceUm ?? found.figure, rule),
    foundBy: found.foundBy,
    provenance: provenanceOf(rule.provenance, value?.confirmation),
    ...(value ? { confirmation: value.confirmation } : {}),
  };
}

function localOf(rule: ToleranceRule, local: NonNullable<ToleranceRule['local']>, of: StoredValue) {
  const value = of('local');
  return {
    confirmation: value?.confirmation,
    tolerance: {
      toleranceUm: inUm(value?.toleranceUm ?? local.toleranceUm, rule),
      lengthMm: local.lengthMm,
      provenance: provenanceOf(local.provenance, value?.confirmation),
    },
  };
}

/** A figure that was put in the catalogue's place comes from where the organisation looked it up. */
function provenanceOf(catalogue: Provenance, confirmation: Confirmation | undefined): Provenance {
  if (confirmation?.state !== 'replaced') return catalogue;
  const { edition, clause, by, on } = confirmation;
  return { kind: 'published', text: `${[edition, clause].filter(Boolean).join(', ')}; put in by ${by} on ${on}` };
}

const inUm = (figure: DecimalText, { unit }: ToleranceRule): DecimalText =>
  unit === '″' ? convert(figure, 'arcsec', 'µm/m') : figure;

function perLengthOf(rule: ToleranceRule, perLength: NonNullable<ToleranceRule['perLength']>) {
  const { baseLengthMm, minimumUm, maximumUm } = perLength;
  return {
    baseLengthMm,
    minimumUm: inUm(minimumUm, rule),
    ...(maximumUm === undefined ? {} : { maximumUm: inUm(maximumUm, rule) }),
  };
}

function findFigure(rule: ToleranceRule, component: BoundComponent, makeUp: MakeUp) {
  if (rule.by === 'all') {
    if (rule.allUm === undefined) return null;
    const over = rule.perLength ? `, over ${rule.perLength.baseLengthMm} mm` : '';
    return { figure: rule.allUm, cell: 'all', foundBy: `one figure for all sizes${over}` };
  }
  if (rule.by === 'size-class') {
    const size = findSizeClass(makeUp.sizeClass);
    const figure = size && rule.byClassUm?.[size.class - 1];
    return figure ? { figure, cell: classCell(size.class), foundBy: size.words } : null;
  }
  const length = rule.by === 'travel' ? travelOf(component, makeUp) : centreDistanceOf(makeUp);
  const step = length && rule.steps?.find((candidate) => liesWithin(length.mm, candidate));
  if (!length || !step) return null;
  return {
    figure: step.toleranceUm,
    cell: stepCell(step),
    foundBy: `${length.words} ${length.mm} mm: ${limitsInWords(step)}`,
  };
}

function travelOf(component: BoundComponent, makeUp: MakeUp) {
  const axis = makeUp.linearAxes.find(({ id }) => id === component.axis);
  return axis && { mm: axis.travelMm, words: `travel of ${axis.id}` };
}

function centreDistanceOf({ distanceBetweenCentresMm }: MakeUp) {
  return distanceBetweenCentresMm ? { mm: distanceBetweenCentresMm, words: 'distance between centres' } : null;
}
