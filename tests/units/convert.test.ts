import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convert, convertible } from '@/lib/units/convert';
import { Fraction } from '@/lib/units/fraction';

describe('convert', () => {
  it.each([
    ['0.0136', 'mm', 'µm', '13.6'],
    ['1', 'in', 'mm', '25.4'],
    ['0.0005', 'in', 'µm', '12.7'],
    ['25.4', 'µm', 'in', '0.001'],
    ['1', 'mm', 'in', '0.0393700787401574803149606299213'],
    ['-0.003', 'mm', 'µm', '-3'],
    ['0.02', 'mm/m', 'µm/m', '20'],
    ['20', 'µm/m', 'mm/m', '0.02'],
    ['5.0', 'µm', 'µm', '5'],
  ] as const)('%s %s is %s', (value, from, to, expected) => {
    expect(convert(value, from, to)).toBe(expected);
  });

  it('one second of arc is 4.848136811095359935899… µm/m (π/648000)', () => {
    expect(convert('1', 'arcsec', 'µm/m')).toBe('4.84813681109535993589914102358');
  });

  it('goes there and back without loss between mm, µm and in', () => {
    fc.assert(
      fc.property(fc.bigInt({ min: -(10n ** 12n), max: 10n ** 12n }), (n) => {
        const value = Fraction.of(n, 10_000n).toText();
        expect(convert(convert(value, 'in', 'µm'), 'µm', 'in')).toBe(value);
        expect(convert(convert(value, 'mm', 'µm'), 'µm', 'mm')).toBe(value);
      }),
      { seed: 31 },
    );
  });

  it('refuses units of different things', () => {
    expect(convertible('mm', '°C')).toBe(false);
    expect(convertible('in', 'µm')).toBe(true);
    expect(() => convert('1', 'mm', 'µm/m')).toThrow(RangeError);
    expect(() => convert('1', '°C', '°')).toThrow(RangeError);
  });
});
