import { formatDecimal } from '@/lib/units/format';
import type { GuideField } from './method-guide';

export interface ResultRow {
  words: string;
  name: string;
  figure: string;
  unit: string;
}

const MOST_IN_A_LIST = 12;
const isDecimal = (text: string) => /^-?\d+(\.\d+)?$/.test(text);

/** Every field of a result that was evaluated, unrounded, in the order of the guide. */
export function resultRows(result: object, fields: readonly GuideField[]): ResultRow[] {
  return fields.flatMap(({ name, words, unit }) => {
    const value = (result as Record<string, unknown>)[name];
    return value === undefined ? [] : [{ words, name, unit, figure: textOf(value) }];
  });
}

function textOf(value: unknown): string {
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return isDecimal(value) ? formatDecimal(value) : value;
  if (Array.isArray(value)) {
    const more = value.length - MOST_IN_A_LIST;
    const apart = value.some((part) => typeof part === 'object') ? '; ' : ', ';
    return [...value.slice(0, MOST_IN_A_LIST).map(textOf), ...(more > 0 ? [`${more} more`] : [])].join(apart);
  }
  if (typeof value !== 'object' || value === null) return '';
  return Object.entries(value)
    .map(([name, part]) => `${name} ${typeof part === 'object' ? `(${textOf(part)})` : textOf(part)}`)
    .join(', ');
}
