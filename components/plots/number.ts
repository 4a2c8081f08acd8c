import { convert } from '@/lib/units/convert';
import { formatDecimal } from '@/lib/units/format';

/** A decimal string as a coordinate. Only drawings turn figures into numbers; nothing computed from this is ever shown as a figure. */
export function coordinate(text: string): number {
  const value = text.trim() === '' ? Number.NaN : Number(text);
  if (!Number.isFinite(value)) throw new Error(`Not a figure that can be drawn: ${text}`);
  return value;
}

/**
 * A limit as it is written beside a drawing: at most a tenth (two figures where it is below one), cut off and never rounded up, so that it never looks
 * wider than it is.
 */
export function shortLimit(limitUm: string): string {
  const parts = /^(-?\d+)\.(\d)\d*$/.exec(limitUm);
  if (!parts) return limitUm;
  // Below one a tenth would be coarse, or nothing at all: two figures after the zeros.
  const small = /^-?0\.0*\d{1,2}/.exec(limitUm);
  if (small && /[1-9]/.test(small[0])) return small[0].replace(/0+$/, '');
  return parts[2] === '0' ? (parts[1] ?? '') : `${parts[1]}.${parts[2]}`;
}

/** µm as mm with no figure lost and with at least `places` decimals, so that limit and deviation stand in the same resolution. */
export function micrometresAsMm(valueUm: string, places: number, signed = false): string {
  const mm = convert(valueUm, 'µm', 'mm');
  return formatDecimal(mm, { decimals: Math.max(decimalsOf(mm), places), signed });
}

/** Decimals of a figure as it is shown. */
export function decimalsOf(shown: string): number {
  return shown.match(/[.,](\d+)/)?.[1]?.length ?? 0;
}
