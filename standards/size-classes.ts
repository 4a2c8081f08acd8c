import { Fraction } from '@/lib/units/fraction';
import type { Provenance, SizeClassTable, SizeCriterion } from './types';

const provenance: Provenance = {
  kind: 'from-memory',
  text: 'size classes of the 2004 edition of ISO 13041-1 as remembered; whether the 2020 edition keeps them is to be checked',
  confidence: 'medium',
};

const chuckProvenance: Provenance = {
  ...provenance,
  text: `${provenance.text}; a weaker memory has chuck classes up to 250, 500 and 1000 in some edition`,
};

export const sizeCriterionWords: Record<SizeCriterion, string> = {
  'swing-over-bed': 'swing over bed',
  'bar-diameter': 'nominal bar diameter',
  'chuck-diameter': 'nominal chuck diameter',
};

/** Printed tables share their boundaries; here each class is over … up to and including, so that every size falls into one. */
export const sizeClassTables: SizeClassTable[] = [
  {
    criterion: 'swing-over-bed',
    classes: [
      { class: 1, overMm: '0', upToMm: '250' },
      { class: 2, overMm: '250', upToMm: '500' },
      { class: 3, overMm: '500', upToMm: '1000' },
    ],
    provenance,
  },
  {
    criterion: 'bar-diameter',
    classes: [
      { class: 1, overMm: '0', upToMm: '25' },
      { class: 2, overMm: '25', upToMm: '63' },
      { class: 3, overMm: '63', upToMm: null },
    ],
    provenance,
  },
  {
    criterion: 'chuck-diameter',
    classes: [
      { class: 1, overMm: '0', upToMm: '125' },
      { class: 2, overMm: '125', upToMm: '250' },
      { class: 3, overMm: '250', upToMm: null },
    ],
    provenance: chuckProvenance,
  },
];

/** Whether a size lies over `overMm` and up to `upToMm` (null: no upper limit), all mm. */
export function liesWithin(valueMm: string, step: { overMm: string; upToMm: string | null }): boolean {
  const value = Fraction.from(valueMm);
  if (value.compare(Fraction.from(step.overMm)) <= 0) return false;
  return step.upToMm === null || value.compare(Fraction.from(step.upToMm)) <= 0;
}

/** `over 25 up to 63`, `up to 25`, `over 63`. */
export function limitsInWords(step: { overMm: string; upToMm: string | null }): string {
  const over = Fraction.from(step.overMm).sign() > 0 ? `over ${step.overMm}` : null;
  return [over, step.upToMm === null ? null : `up to ${step.upToMm}`].filter((part) => part !== null).join(' ');
}

export interface FoundSizeClass {
  class: 1 | 2 | 3;
  /** `size class 2 (nominal bar diameter 32 mm: over 25 up to 63)`. */
  words: string;
}

/** Size class of a machine by the criterion that its builder uses; null where the table does not reach so far. */
export function findSizeClass(size: { criterion: SizeCriterion; valueMm: string }): FoundSizeClass | null {
  const table = sizeClassTables.find(({ criterion }) => criterion === size.criterion);
  const found = table?.classes.find((step) => liesWithin(size.valueMm, step));
  if (!found) return null;
  const criterion = sizeCriterionWords[size.criterion];
  return {
    class: found.class,
    words: `size class ${found.class} (${criterion} ${size.valueMm} mm: ${limitsInWords(found)})`,
  };
}
