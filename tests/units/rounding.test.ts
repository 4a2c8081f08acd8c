import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Dec, plain } from '@/lib/units/decimal';
import { formatDecimal } from '@/lib/units/format';
import { Fraction } from '@/lib/units/fraction';
import { displayRounded, round, roundToDecimals } from '@/lib/units/round';

describe('round', () => {
  it.each([
    ['0.0125', '0.001', '0.012', '0.013'],
    ['-0.0125', '0.001', '-0.012', '-0.013'],
    ['-0.0004', '0.001', '0.000', '0.000'],
    ['0.0135', '0.001', '0.014', '0.014'],
    ['2.25', '0.5', '2.0', '2.5'],
    ['10.75', '0.5', '11.0', '11.0'],
    ['-0.4', '1', '0', '0'],
    ['0.5', '1', '0', '1'],
    ['1.5', '1', '2', '2'],
    ['-2.5', '1', '-2', '-3'],
    ['15', '10', '20', '20'],
    ['25', '10', '20', '30'],
    ['0.3', '0.2', '0.4', '0.4'],
    ['0.1', '0.2', '0.0', '0.2'],
    ['7', '0.50', '7.00', '7.00'],
    ['1e2', '0.1', '100.0', '100.0'],
    ['0.00151', '1e-3', '0.002', '0.002'],
    ['1.005', '0.01', '1.00', '1.01'],
  ])('%s at %s: half-even %s, half away from zero %s', (value, resolution, even, away) => {
    expect(round(value, resolution, 'half-even')).toBe(even);
    expect(round(value, resolution, 'half-away-from-zero')).toBe(away);
  });

  it('refuses a resolution that is not above zero', () => {
    expect(() => round('1', '0')).toThrow(RangeError);
    expect(() => round('1', '-0.1')).toThrow(RangeError);
  });

  it('is off by half a resolution at most, symmetric about zero, and changes nothing the second time', () => {
    const figure = fc.bigInt({ min: -(10n ** 12n), max: 10n ** 12n }).map((n) => Fraction.of(n, 10n ** 6n).toText());
    fc.assert(
      fc.property(
        figure,
        fc.constantFrom('0.001', '0.0005', '0.2', '0.5', '1', '2', '0.025', '10'),
        fc.constantFrom('half-even' as const, 'half-away-from-zero' as const),
        (value, resolution, rule) => {
          const rounded = round(value, resolution, rule);
          const error = Fraction.from(rounded).minus(Fraction.from(value)).abs();
          expect(error.times(Fraction.of(2)).compare(Fraction.from(resolution))).toBeLessThanOrEqual(0);
          expect(Fraction.from(rounded).dividedBy(Fraction.from(resolution)).reduced().d).toBe(1n);
          expect(round(rounded, resolution, rule)).toBe(rounded);
          const opposite = round(Fraction.from(value).negated().toText(), resolution, rule);
          expect(Fraction.from(opposite).plus(Fraction.from(rounded)).sign()).toBe(0);
          expect(rounded).not.toMatch(/^-[0.]*$/);
        },
      ),
      { numRuns: 2000, seed: 21 },
    );
  });
});

describe('displayRounded', () => {
  it.each([
    [{ value: '5.25', resolution: '1', limit: '5' }, '5.2', 1],
    [{ value: '5.04', resolution: '1', limit: '5' }, '5.04', 2],
    [{ value: '-5.04', resolution: '1', limit: '5' }, '-5.04', 2],
    [{ value: '0.0104', resolution: '0.001', limit: '0.010' }, '0.0104', 1],
    [{ value: '5', resolution: '1', limit: '5' }, '5', 0],
    [{ value: '4.96', resolution: '1', limit: '5' }, '5', 0],
    [{ value: '10.04', resolution: '0.5', limit: '10' }, '10.04', 1],
    [{ value: '5.0000001', resolution: '0.1', limit: '5' }, '5.0000001', 6],
    [{ value: '-0.2', resolution: '0.5', lower: '0', upper: '6' }, '-0.20', 1],
    [{ value: '-0.2', resolution: '0.5', limit: '6' }, '0.0', 0],
    [{ value: '-0.4', resolution: '1' }, '0', 0],
  ])('%j → %s with %d more digits', (input, text, extraDigits) => {
    expect(displayRounded(input)).toEqual({ text, extraDigits });
  });

  it('shows every failure, however small', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 500 }),
        fc.integer({ min: 1, max: 999 }),
        fc.integer({ min: 2, max: 9 }),
        (t, over, places) => {
          const limit = Fraction.of(t, 10).toText();
          const value = Fraction.of(t, 10)
            .plus(Fraction.of(over, 10n ** BigInt(places + 2)))
            .toText();
          const { text } = displayRounded({ value, resolution: '0.1', limit });
          expect(Fraction.from(text).compare(Fraction.from(limit))).toBe(1);
        },
      ),
      { seed: 22 },
    );
  });
});

describe('figures as text', () => {
  it('is plain, without exponent and minus zero', () => {
    expect(plain(new Dec('1e-30'))).toBe('0.000000000000000000000000000001');
    expect(plain(new Dec('-0'))).toBe('0');
    expect(plain(new Dec('1e25'))).toBe('10000000000000000000000000');
    expect(plain(new Dec(2).sqrt())).toBe('1.41421356237309504880168872421');
    expect(new Dec('1e-40').toString()).not.toMatch(/e/i);
  });

  it('writes finite fractions in full and others to 30 digits', () => {
    expect(Fraction.of(1, 8).toText()).toBe('0.125');
    expect(Fraction.of(-1, 3).toText()).toBe('-0.333333333333333333333333333333');
    expect(Fraction.of(20, 3).toText()).toBe('6.66666666666666666666666666667');
    expect(Fraction.from('12345678901234567890123456789012345.00001').toText()).toBe(
      '12345678901234567890123456789012345.00001',
    );
  });

  it.each([
    ['-0.0042', { decimals: 3, locale: 'de' }, '\u22120,004'],
    ['-0.0042', { decimals: 3, locale: 'en', minus: 'ascii' as const }, '-0.004'],
    ['-0.00001', { decimals: 3, locale: 'fr' }, '0,000'],
    ['12.5', {}, '12.5'],
    ['12.50', {}, '12.50'],
    ['3', { signed: true, decimals: 1 }, '+3.0'],
    ['0', { signed: true }, '0'],
    ['-0.04', { signed: true, decimals: 1 }, '0.0'],
    ['1234567.5', { locale: 'de-CH' }, '1234567.5'],
    ['1234567.5', { locale: 'fi' }, '1234567,5'],
  ])('%s with %j is shown as %s', (value, options, shown) => {
    expect(formatDecimal(value, options)).toBe(shown);
  });

  it('cuts decimals half-even', () => {
    expect(roundToDecimals('2.675', 2)).toBe('2.68');
    expect(roundToDecimals('2.665', 2)).toBe('2.66');
  });
});
