import { expect, it } from 'vitest';
import { readAs } from '@/components/sheet/read-as';
import { figureOf } from '@/db/queries/passes';
import { correctedReadings } from '@/lib/reporting/corrected-readings';
import type { Field } from '@/lib/sheet/types';

const field = (unit: Field['unit']): Field => ({ pointer: '/D1', role: 'reading', unit, label: 'D1' });

it.each([
  ['1,234', null, 'mm', 'read as 1.234 mm'],
  ['1.234', null, 'mm', 'read as 1.234 mm'],
  ['−0,003mm', null, 'µm', 'read as −3 µm'],
  ['0,0026', 'mm', 'µm', 'read as 2.6 µm'],
  ['0.0005 in', null, 'µm', 'read as 12.7 µm'],
  ['1,2', null, 'mm', ''],
  ['12', null, 'µm', ''],
  ['1,2345', null, 'mm', ''],
  ['1,234,5', null, 'mm', ''],
  ['', null, 'mm', ''],
] as const)('how %s (%s) in a column of %s is understood: %s', (text, unit, column, wanted) => {
  expect(readAs({ text, unit }, field(column))).toBe(wanted);
});

it('a reading that stood differently before is a correction; the first text and a repeat are none', () => {
  const at = new Date('2026-03-10T12:16:00Z');
  const change = (pointer: string, text: string, passId = 'p') => ({
    passId,
    pointer,
    text,
    by: 'T. Orrell',
    at,
    reason: null,
  });
  const found = correctedReadings(
    [
      change('/a', '55'),
      change('/b', '1'),
      change('/a', '5'),
      change('/b', '1'),
      change('/a', '', 'other'),
      change('/a', ''),
      change('/a', '6'),
    ],
    'p',
  );
  expect(found.map(({ pointer, was, now }) => [pointer, was, now])).toEqual([
    ['/a', '55', '5'],
    ['/a', '5', ''],
  ]);
});

it('a figure is stored with its unit and with how finely it was typed', () => {
  expect(figureOf('12.50', 'µm')).toEqual({ value: '12.50', unit: 'µm', resolution: '1e-2' });
  expect(figureOf('−0,003mm', 'µm')).toEqual({ value: '-0.003', unit: 'mm', resolution: '1e-3' });
  expect(figureOf('7', 'µm')).toEqual({ value: '7', unit: 'µm', resolution: '1e-0' });
  expect(figureOf('1,2,3', 'µm')).toEqual({ value: null, unit: 'µm', resolution: null });
});
