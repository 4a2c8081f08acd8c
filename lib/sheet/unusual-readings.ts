import { Fraction } from '@/lib/units/fraction';
import type { DecimalText } from '@/standards/types';
import type { SheetValues } from './layouts/layout-engine';
import type { CellProblem, Field } from './types';

/** Factor and ratio that give away a wrong unit or a key pressed twice (chosen here; 25.4 is the inch in mm). */
const TIMES_TOLERANCE = Fraction.of(20);
const INCH_LOW = Fraction.from('25.146');
const INCH_HIGH = Fraction.from('25.654');

/** Readings of one table that stand out from the middle of their neighbours. */
export function unusualReadings(fields: Field[], values: SheetValues, toleranceUm: DecimalText | null): CellProblem[] {
  const present = fields.flatMap((field) => {
    const text = values.get(field.pointer);
    const inUm = field.unit === 'mm' ? Fraction.of(1000) : Fraction.one;
    return text === undefined ? [] : [{ pointer: field.pointer, value: Fraction.from(text).times(inUm) }];
  });
  if (present.length < 2) return [];
  const unit = fields[0]?.unit === 'µm/m' ? 'µm/m' : 'µm';
  const tolerance = toleranceUm === null ? null : Fraction.from(toleranceUm);
  const middle = median(present.map(({ value }) => value));
  const usual = median(present.map(({ value }) => value.abs()));
  return present.flatMap(({ pointer, value }, k) => {
    const neighbour = present.length === 2 ? present[1 - k]!.value : middle;
    const message = unusual(value, neighbour, present.length > 2 ? usual : null, tolerance, unit);
    return message === null ? [] : [{ pointer, severity: 'unusual' as const, message }];
  });
}

function unusual(
  value: Fraction,
  neighbour: Fraction,
  usual: Fraction | null,
  tolerance: Fraction | null,
  unit: string,
): string | null {
  const away = value.minus(neighbour).abs();
  if (tolerance && away.compare(tolerance.times(TIMES_TOLERANCE)) >= 0)
    return `${away.toText()} ${unit} away from its neighbours, over 20 times the tolerance. Look at the figure and its unit.`;
  if (!usual || usual.sign() === 0 || (tolerance && away.compare(tolerance) < 0)) return null;
  const isInch = [value.abs().dividedBy(usual), ...(value.sign() === 0 ? [] : [usual.dividedBy(value.abs())])].some(
    (ratio) => ratio.compare(INCH_LOW) >= 0 && ratio.compare(INCH_HIGH) <= 0,
  );
  return isInch ? 'About 25.4 times as large or small as its neighbours: was it read in inches?' : null;
}

function median(values: Fraction[]): Fraction {
  const sorted = [...values].sort((a, b) => a.compare(b));
  const half = Math.floor(sorted.length / 2);
  const upper = sorted[half]!;
  return sorted.length % 2 ? upper : sorted[half - 1]!.plus(upper).dividedBy(Fraction.of(2));
}
