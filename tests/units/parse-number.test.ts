import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatDecimal } from '@/lib/units/format';
import { Fraction } from '@/lib/units/fraction';
import { parseNumber } from '@/lib/units/parse-number';
import type { Unit } from '@/lib/units/unit';

type Row = [text: string, value: string, unit?: Unit];

/** Read as written. */
const READ: Row[] = [
  ['0', '0'],
  ['5', '5'],
  ['42', '42'],
  ['007', '7'],
  ['000', '0'],
  ['0012.50', '12.50'],
  ['1.5', '1.5'],
  ['1,5', '1.5'],
  ['-35,01', '-35.01'],
  ['-35.01', '-35.01'],
  ['1.234', '1.234'],
  ['1,234', '1.234'],
  ['12,345', '12.345'],
  ['123,456', '123.456'],
  ['0,001', '0.001'],
  ['0.0005', '0.0005'],
  ['.5', '0.5'],
  [',5', '0.5'],
  ['-.5', '-0.5'],
  ['-,5', '-0.5'],
  ['5.', '5'],
  ['5,', '5'],
  ['-5.', '-5'],
  ['1.0', '1.0'],
  ['1.10', '1.10'],
  ['+7', '7'],
  ['+7,25', '7.25'],
  ['+.25', '0.25'],
  ['\u22122.2', '-2.2'],
  ['\u22120,6', '-0.6'],
  ['\u2013 3', '-3'],
  ['\u20133', '-3'],
  ['- 5', '-5'],
  ['+ 5', '5'],
  ['\u2212\u202f5', '-5'],
  ['\u2212\u00a012,5', '-12.5'],
  ['-0', '0'],
  ['-0.0', '0.0'],
  ['-0,000', '0.000'],
  ['\u22120', '0'],
  ['+0', '0'],
  ['-.0', '0.0'],
  ['-0.0001', '-0.0001'],
  [' 5', '5'],
  ['5 ', '5'],
  ['  5  ', '5'],
  ['\t5', '5'],
  ['5\n', '5'],
  ['5\r\n', '5'],
  ['\u00a05\u00a0', '5'],
  ['\u202f5\u2009', '5'],
  ['\u20095', '5'],
  ['5\u3000', '5'],
  ['\u00025.25\u0003', '5.25'],
  ['\u00025,25\r', '5.25'],
  ['\u00005', '5'],
  ['5\u0000', '5'],
  ['\u001b5', '5'],
  ['\u007f5', '5'],
  ['\ufeff5', '5'],
  ['\u200b5\u200b', '5'],
  ['\u200e-5\u200e', '-5'],
  ['\u202a-5,5\u202c', '-5.5'],
  ['\u00ad5', '5'],
  ['1\u202f234', '1234'],
  ['1\u202f234,5', '1234.5'],
  ['1\u00a0234,5', '1234.5'],
  ['1\u2009234.5', '1234.5'],
  ['12\u00a0345', '12345'],
  ['123\u00a0456\u00a0789', '123456789'],
  ['\u22121\u202f234,56', '-1234.56'],
  ['1\u2007234', '1234'],
  ['1\u00a0234\u00a0mm', '1234', 'mm'],
  ['5mm', '5', 'mm'],
  ['5 mm', '5', 'mm'],
  ['5\u00a0mm', '5', 'mm'],
  ['5\u202fmm', '5', 'mm'],
  ['5\u2009mm', '5', 'mm'],
  ['5  mm ', '5', 'mm'],
  ['5\tmm', '5', 'mm'],
  ['\u22120,003mm', '-0.003', 'mm'],
  ['\u22120,003 mm', '-0.003', 'mm'],
  ['0,0136 mm', '0.0136', 'mm'],
  ['5.mm', '5', 'mm'],
  ['3 \u00b5m', '3', 'µm'],
  ['3\u00b5m', '3', 'µm'],
  ['3 \u03bcm', '3', 'µm'],
  ['3\u03bcm', '3', 'µm'],
  ['3um', '3', 'µm'],
  ['-3,5 um', '-3.5', 'µm'],
  ['0.0005 in', '0.0005', 'in'],
  ['0.0005in', '0.0005', 'in'],
  ['.0005"', '0.0005', 'in'],
  ['-.0005 "', '-0.0005', 'in'],
  ['20 °C', '20', '°C'],
  ['20,5°C', '20.5', '°C'],
  ['20 ℃', '20', '°C'],
  ['45°', '45', '°'],
  ['45 °', '45', '°'],
  ['-25 \u00b5m/m', '-25', 'µm/m'],
  ['25\u03bcm/m', '25', 'µm/m'],
  ['25 um/m', '25', 'µm/m'],
  ['0,02 mm/m', '0.02', 'mm/m'],
  ['0.02mm/m', '0.02', 'mm/m'],
  ['5 arcsec', '5', 'arcsec'],
  ['-1,25arcsec', '-1.25', 'arcsec'],
  ['123456789012345678901234567890.5', '123456789012345678901234567890.5'],
  ['0.000000000000000000000000000001', '0.000000000000000000000000000001'],
];

/** Refused: can be read in two ways, or not at all. */
const REFUSED = [
  '',
  ' ',
  '\t',
  '\u00a0',
  '\u0000',
  '\u200b',
  '-',
  '\u2212',
  '+',
  '.',
  ',',
  '-.',
  '+,',
  '1,234.5',
  '1.234,5',
  '1.234,56',
  '1,234,567',
  '1.234.567',
  '1..5',
  '1,,5',
  '1.,5',
  '1,.5',
  '.5.',
  '5,,',
  '..5',
  '1.2.3',
  '--5',
  '\u2212\u22125',
  '-\u22125',
  '+-5',
  '-+5',
  '++5',
  '5-',
  '5\u2212',
  '5+',
  '5 -',
  '5-3',
  '5+3',
  '1e3',
  '1E3',
  '1e-3',
  '1.5e+2',
  '1×10³',
  '1/2',
  '½',
  '5½',
  '2²',
  '12 34',
  '1 234',
  '1 234,5',
  '1 000 000',
  '12\t34',
  '12\n34',
  '12\r\n34',
  '1\u00a023',
  '12\u00a034',
  '1234\u00a0567',
  '1\u00a02345',
  '1\u00a0234\u00a05',
  '1\u00a0234 567',
  '0,1\u00a0234',
  '1’234',
  "1'234",
  "1'234.5",
  '1_234',
  '1;2',
  '1:2',
  '(5)',
  '5%',
  '~5',
  '≈5',
  '<5',
  '±5',
  '#5',
  'mm',
  'mm 5',
  'µm5',
  '5 mm 3',
  '5mm3',
  '5 mm mm',
  '5 MM',
  '5 Mm',
  '5 UM',
  '5 m',
  '5 cm',
  '5 nm',
  '5 inch',
  '5 IN',
  '5\u2033',
  "5''",
  "5'",
  '5 µ',
  '5 µm /m',
  '5 K',
  '5 °F',
  '5 °c',
  '5 mm.',
  '5,0,mm',
  'abc',
  'NaN',
  'Infinity',
  '-Infinity',
  '0x10',
  'null',
  '５',
  '٥',
  '१',
  'O',
  '1O',
  'l2',
  '5 5',
  '-5 -5',
  '=5',
  '\u20145',
  'ß5',
  `0.${'1'.repeat(60)}`,
];

describe('parseNumber', () => {
  it('is tried on at least 150 texts', () => {
    expect(new Set([...READ.map(([text]) => text), ...REFUSED]).size).toBe(READ.length + REFUSED.length);
    expect(READ.length + REFUSED.length).toBeGreaterThanOrEqual(150);
  });

  it.each(READ)('reads %j', (text, value, unit) => {
    const decimals = value.split('.')[1]?.length ?? 0;
    expect(parseNumber(text)).toEqual({ ok: true, value, unit: unit ?? null, decimals });
  });

  it.each(REFUSED.map((text) => [text]))('refuses %j with a reason in words', (text) => {
    const parsed = parseNumber(text);
    expect(parsed.ok).toBe(false);
    expect(!parsed.ok && parsed.problem).toMatch(/^[A-Z].{10,}\.$/);
  });

  it('takes the unit of the field only where none was typed', () => {
    expect(parseNumber('3', { defaultUnit: 'µm' })).toMatchObject({ unit: 'µm' });
    expect(parseNumber('0,003 mm', { defaultUnit: 'µm' })).toMatchObject({ value: '0.003', unit: 'mm' });
  });
});

const LOCALES = ['de', 'de-CH', 'fr', 'fr-CH', 'sv', 'fi', 'nb', 'en-US', 'pl', 'cs'];
const decimal = fc
  .tuple(fc.bigInt({ min: -(10n ** 18n), max: 10n ** 18n }), fc.integer({ min: 0, max: 12 }))
  .map(([digits, places]) => ({ text: Fraction.of(digits, 10n ** BigInt(places)).toText(), places }));

describe('format and parse', () => {
  it.each(LOCALES)('%s: what is shown is read back as the same figure', (locale) => {
    fc.assert(
      fc.property(
        decimal,
        fc.boolean(),
        fc.constantFrom('typographic' as const, 'ascii' as const),
        ({ text, places }, signed, minus) => {
          const shown = formatDecimal(text, { decimals: places, locale, signed, minus });
          const parsed = parseNumber(shown);
          expect(parsed.ok && Fraction.from(parsed.value).equals(Fraction.from(text)), `${text} as ${shown}`).toBe(
            true,
          );
          expect(parsed.ok && parsed.decimals).toBe(places);
        },
      ),
      { numRuns: 300, seed: 11 },
    );
  });

  it.each(LOCALES)(
    '%s: grouped figures of the platform are read right or refused, never by a factor of ten wrong',
    (locale) => {
      const platform = new Intl.NumberFormat(locale, { minimumFractionDigits: 2, maximumFractionDigits: 2 });
      let read = 0;
      fc.assert(
        fc.property(fc.integer({ min: -999_999_999, max: 999_999_999 }), (hundredths) => {
          const text = platform.format(hundredths / 100);
          const parsed = parseNumber(text);
          if (!parsed.ok) return;
          read++;
          expect(Fraction.from(parsed.value).equals(Fraction.of(hundredths, 100)), text).toBe(true);
        }),
        { numRuns: 500, seed: 12 },
      );
      expect(read).toBeGreaterThan(0);
    },
  );

  it('never throws, and what it reads is plain decimal text', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(...'0123456789.,-+ \u00a0\u2212\tmµin"°/ea\u0002') }), (text) => {
        const parsed = parseNumber(text);
        if (parsed.ok) expect(parsed.value).toMatch(/^-?(0|[1-9]\d*)(\.\d+)?$/);
        if (parsed.ok) expect(parsed.value).not.toMatch(/^-[0.]*$/);
      }),
      { numRuns: 5000, seed: 13 },
    );
  });

  it('keeps every typed digit in order', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(...'0123456789.,-+ \u00a0\u202f') }), (text) => {
        const parsed = parseNumber(text);
        if (parsed.ok)
          expect(parsed.value.replace(/\D/g, '').replace(/^0+/, '')).toBe(text.replace(/\D/g, '').replace(/^0+/, ''));
      }),
      { numRuns: 5000, seed: 14 },
    );
  });
});
