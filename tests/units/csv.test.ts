import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CsvError, readCsv } from '@/lib/csv/read-csv';
import { guardText, unguardText, writeCsv } from '@/lib/csv/write-csv';

const cells = (text: string) => readCsv(text).map((record) => record.cells);

describe('reading CSV', () => {
  // The forms of RFC 4180, section 2, with examples of our own.
  it.each([
    [
      'a,b\r\nc,d\r\n',
      [
        ['a', 'b'],
        ['c', 'd'],
      ],
    ],
    [
      'a,b\nc,d',
      [
        ['a', 'b'],
        ['c', 'd'],
      ],
    ],
    ['"a","b ""c"", d"\r\n', [['a', 'b "c", d']]],
    ['"two\r\nlines",x', [['two\r\nlines', 'x']]],
    ['a,,\r\n', [['a', '', '']]],
    [' a , b ', [[' a ', ' b ']]],
    ['\uFEFFa\r\n\r\nb\r\n', [['a'], ['b']]],
    ['""', []],
    ['', []],
  ])('%j', (text, expected) => expect(cells(text)).toEqual(expected));

  it('numbers records by the line on which they begin', () => {
    expect(readCsv('a\n"b\nc",d\n\ne').map(({ line }) => line)).toEqual([1, 2, 5]);
  });

  it.each([
    ['a\n"b', 2],
    ['a"b', 1],
    ['a\n"b"c', 2],
  ])('refuses %j', (text, line) => {
    expect(() => readCsv(text)).toThrow(CsvError);
    expect(() => readCsv(text)).toThrow(`line ${line}`);
  });
});

describe('writing CSV', () => {
  it('guards texts that a spreadsheet would calculate, never a figure', () => {
    expect(writeCsv([['=1+1', '+a', '-b', '@c', { figure: '-0.5' }, null, "it's"]])).toBe(
      "'=1+1,'+a,'-b,'@c,-0.5,,it's\r\n",
    );
  });

  it('comes back as it went out', () => {
    const awkward = fc.stringMatching(/^[=+\-@'",;\r\n a0µ″]{0,12}$/);
    fc.assert(
      fc.property(
        fc.array(fc.array(awkward, { minLength: 2, maxLength: 5 }), { minLength: 1, maxLength: 6 }),
        (rows) => {
          expect(cells(writeCsv(rows)).map((row) => row.map(unguardText))).toEqual(rows);
        },
      ),
    );
    fc.assert(fc.property(fc.string(), (text) => unguardText(guardText(text)) === text));
  });
});
