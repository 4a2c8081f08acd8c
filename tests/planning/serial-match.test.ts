import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { markSerial, slipPatterns } from '@/lib/schemas/serial-match';
import { foldSerial } from '@/lib/schemas/serial-number';

const like = (pattern: string, text: string) => new RegExp(`^${pattern.replaceAll('_', '.')}$`).test(text);
const folded = fc.stringMatching(/^[0-9A-Z]{5,14}$/).map(foldSerial);

describe('foldSerial', () => {
  it.each([
    ['LK32-0O81-B', '1K3200818'],
    ['lk32 oo8i 8', '1K3200818'],
    ['SW20Z/2Z7O', '5W2022270'],
    ['hp25·lI10·S5', 'HP25111055'],
    ['Ärö 7', 'AR07'],
    ['--- ', ''],
  ])('%s is compared as %s', (typed, expected) => {
    expect(foldSerial(typed)).toBe(expected);
  });

  it('is the same folded twice, and never longer', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme-ascii' }), (text) => {
        expect(foldSerial(foldSerial(text))).toBe(foldSerial(text));
        expect(foldSerial(text)).toMatch(/^[0-9A-Z]*$/);
      }),
    );
  });
});

describe('slipPatterns', () => {
  const matches = (typed: string, serial: string) => slipPatterns(typed).some((pattern) => like(pattern, serial));

  it('has one for every serial number that is one slip away', () => {
    fc.assert(
      fc.property(folded, fc.nat(), fc.constantFrom('X', '7', 'Q'), (serial, at, sign) => {
        const index = at % serial.length;
        const [head, tail] = [serial.slice(0, index), serial.slice(index)];
        const typed = [head + sign + tail.slice(1), head + tail.slice(1), head + sign + tail];
        if (tail.length > 1) typed.push(`${head}${tail[1]}${tail[0]}${tail.slice(2)}`);
        for (const each of typed)
          if (each !== serial) expect(matches(each, serial), `${each} for ${serial}`).toBe(true);
      }),
    );
  });

  it('has none for two slips', () => {
    expect(matches('AX12Y45', 'AB12345')).toBe(false);
    expect(matches('AB123', 'AB12345')).toBe(false);
  });
});

describe('markSerial', () => {
  const marked = (...args: Parameters<typeof markSerial>) =>
    markSerial(...args)
      .map((piece) => (piece.marked ? `[${piece.text}]` : piece.text))
      .join('');

  it.each([
    ['LK32-0O81-B', 'lk32 0', 'prefix', '[LK32-0]O81-B'],
    ['HP25-1I10-S5', '10s', 'part', 'HP25-1I[10-S]5'],
    ['HP25-1I10-S5', 'hp25-1i10-s5', 'exact', '[HP25-1I10-S5]'],
    ['MM-774-4411', 'MM-774-4511', 'slip', 'MM-774-4[4]11'],
    ['MM-774-4411', 'MM-747-4411', 'slip', 'MM-7[74]-4411'],
    ['MM-774-4411', 'XQ', 'part', 'MM-774-4411'],
  ] as const)('%s looked for as %s (%s)', (serial, query, match, expected) => {
    expect(marked(serial, query, match)).toBe(expected);
  });

  it('never changes the serial number', () => {
    fc.assert(
      fc.property(
        fc.string(),
        fc.string(),
        fc.constantFrom('exact', 'prefix', 'part', 'slip'),
        (serial, query, match) => {
          expect(
            markSerial(serial, query, match)
              .map(({ text }) => text)
              .join(''),
          ).toBe(serial);
        },
      ),
    );
  });
});
