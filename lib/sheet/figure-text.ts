import { convert } from '@/lib/units/convert';
import { formatDecimal } from '@/lib/units/format';
import { round } from '@/lib/units/round';

export interface Figure {
  label: string;
  value: string;
}

/** A figure rounded for the reader at the last step only; never for a verdict. */
export const shown = (value: string, resolution: string): string =>
  formatDecimal(round(value, resolution, 'half-even'));

export const um = (value: string, resolution = '0.1'): string => `${shown(value, resolution)} µm`;

export const slope = (value: string): string => `${shown(value, '0.1')} µm/m`;

export const seconds = (value: string): string => `${shown(convert(value, 'µm/m', 'arcsec'), '0.1')}″`;
