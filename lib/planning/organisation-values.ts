import { limitsInWords } from '@/standards/size-classes';
import type { Confirmation, DecimalText, TestDefinition, ToleranceRule } from '@/standards/types';

/**
 * What an organisation says of single figures of the catalogue, by `toleranceCellKey`. The figure is in the unit of its rule, as in the
 * catalogue (`″` too); where it was only confirmed, it is the catalogue's own.
 */
export type OrganisationValues = ReadonlyMap<string, { toleranceUm: DecimalText; confirmation: Confirmation }>;

/** One figure of a definition's tolerance that can be confirmed or replaced. */
export interface ToleranceCell {
  /** `all`, `class-2`, `step-0-500`, `local`; before a further limit of the same readings `also-R-`. */
  cell: string;
  words: string;
  /** In `unit`, as it stands in the catalogue. */
  toleranceUm: DecimalText;
  unit: NonNullable<ToleranceRule['unit']>;
}

export const toleranceCellKey = (
  definition: Pick<TestDefinition, 'id' | 'code' | 'edition' | 'version'>,
  cell: string,
): string => JSON.stringify([definition.code, definition.edition, definition.id, definition.version, cell]);

export const cellPrefix = (figure: string): string => `also-${figure}-`;
export const classCell = (sizeClass: number): string => `class-${sizeClass}`;
export const stepCell = (step: { overMm: DecimalText; upToMm: DecimalText | null }): string =>
  `step-${step.overMm}-${step.upToMm ?? 'up'}`;

/** Every figure of a definition's tolerances, in the order of the catalogue. */
export function toleranceCells(definition: TestDefinition): ToleranceCell[] {
  return [
    ...(definition.tolerance ? cellsOf(definition.tolerance, '', '') : []),
    ...(definition.also ?? []).flatMap(({ figure, label, tolerance }) =>
      cellsOf(tolerance, cellPrefix(figure), `${label}: `),
    ),
  ];
}

function cellsOf(rule: ToleranceRule, prefix: string, label: string): ToleranceCell[] {
  const unit = rule.unit ?? 'µm';
  const cell = (name: string, words: string, toleranceUm: DecimalText, inUnit = unit): ToleranceCell => ({
    cell: `${prefix}${name}`,
    words: `${label}${words}`,
    toleranceUm,
    unit: inUnit,
  });
  const per = rule.perLength ? ` over ${rule.perLength.baseLengthMm} mm` : '';
  return [
    ...(rule.by === 'all' && rule.allUm !== undefined ? [cell('all', `all sizes${per}`, rule.allUm)] : []),
    ...(rule.by === 'size-class' ? (rule.byClassUm ?? []) : []).map((figure, index) =>
      cell(classCell(index + 1), `size class ${index + 1}${per}`, figure),
    ),
    ...(rule.by === 'travel' || rule.by === 'centre-distance' ? (rule.steps ?? []) : []).map((step) =>
      cell(stepCell(step), `${byWords[rule.by as keyof typeof byWords]} ${limitsInWords(step)} mm`, step.toleranceUm),
    ),
    ...(rule.local ? [cell('local', `local, over any ${rule.local.lengthMm} mm`, rule.local.toleranceUm)] : []),
  ];
}

const byWords = { travel: 'travel', 'centre-distance': 'distance between centres' } as const;
