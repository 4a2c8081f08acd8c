import { describe, expect, it } from 'vitest';
import { guessShape, readFigure, readTextTable } from '@/lib/sheet/text-table';

describe('columns of a text', () => {
  const rows = (text: string, separator: Parameters<typeof readTextTable>[1]['separator'], skipLines = 0) =>
    readTextTable(text, { separator, skipLines });

  it('are parted by what the person says, and lines keep their numbers', () => {
    expect(rows('a\tb c\n\n1\t2,5\r\n', 'tab')).toEqual([
      { line: 1, cells: ['a', 'b c'] },
      { line: 3, cells: ['1', '2,5'] },
    ]);
    expect(rows('0;1,5;\n;;\n7;2', 'semicolon')).toEqual([
      { line: 1, cells: ['0', '1,5', ''] },
      { line: 3, cells: ['7', '2'] },
    ]);
    expect(rows('x\ny\n1,2', 'comma', 2)).toEqual([{ line: 3, cells: ['1', '2'] }]);
    expect(rows('  0   1.5\t-2 \n', 'spaces')).toEqual([{ line: 1, cells: ['0', '1.5', '-2'] }]);
  });

  it('may stand in quotes; a mark at the beginning of the file is taken off', () => {
    expect(rows('\uFEFF"a;b";2', 'semicolon')).toEqual([{ line: 1, cells: ['a;b', '2'] }]);
  });

  it('5,000 lines are read', () => {
    const text = Array.from({ length: 5000 }, (_, i) => `${i}\t${i % 7}.5`).join('\n');
    const read = rows(text, 'tab');
    expect([read.length, read[4999]]).toEqual([5000, { line: 5000, cells: ['4999', '1.5'] }]);
  });
});

describe('what a text looks like', () => {
  const guessed: [name: string, text: string, shape: ReturnType<typeof guessShape>][] = [
    ['tabs, points', '0\t1.5\n10\t2.5\n', { separator: 'tab', decimalMark: 'point', skipLines: 0 }],
    ['semicolons, decimal commas', '0;1,5\n10;2,25\n', { separator: 'semicolon', decimalMark: 'comma', skipLines: 0 }],
    ['commas, points', '0,1.5\n10,2.5\n', { separator: 'comma', decimalMark: 'point', skipLines: 0 }],
    ['commas, whole figures', '0,1\n10,2\n', { separator: 'comma', decimalMark: 'point', skipLines: 0 }],
    ['spaces, decimal commas', '0   1,5\n10  2,5\n', { separator: 'spaces', decimalMark: 'comma', skipLines: 0 }],
    [
      'lines above the figures',
      'Z axis\nmeasured in the morning\n\nposition;run;deviation\n0,000;1;-1,25\n105,000;1;0,50\n',
      { separator: 'semicolon', decimalMark: 'comma', skipLines: 4 },
    ],
    [
      'words among the figures',
      'position\tdirection\tdeviation\n0\tforward\t0.5\n0\tbackward\t0.7\n',
      { separator: 'tab', decimalMark: 'point', skipLines: 1 },
    ],
    ['nothing', '', { separator: 'spaces', decimalMark: 'point', skipLines: 0 }],
  ];
  it.each(guessed)('%s', (_, text, shape) => {
    expect(guessShape(text)).toEqual(shape);
  });
});

describe('a figure', () => {
  it('keeps what was written', () => {
    expect(readFigure(' −0,50 ', 'comma')).toEqual({ text: '−0,50', value: '-0.5' });
    expect(readFigure('+12.', 'point')).toMatchObject({ value: '12' });
    expect(readFigure('', 'point')).toEqual({ text: '', value: '' });
  });

  it('with the other mark has a thousands mark, and is refused', () => {
    for (const [text, mark] of [
      ['1,234.5', 'point'],
      ['1,234', 'point'],
      ['1.234,5', 'comma'],
      ['1.234', 'comma'],
    ] as const) {
      expect(readFigure(text, mark)).toEqual({ problem: expect.stringContaining('thousands marks are not read') });
    }
    for (const text of ['1 234', "1'234", '1.2.3', 'abc', '--1']) {
      expect(readFigure(text, 'point')).toEqual({ problem: expect.stringContaining(text) });
    }
  });

  it('with a power of ten is written out exactly', () => {
    expect(readFigure('-1.25E-03', 'point')).toEqual({ text: '-0.00125', value: '-0.00125' });
    expect(readFigure('2,5e2', 'comma')).toEqual({ text: '250', value: '250' });
  });
});
