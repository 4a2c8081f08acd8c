import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EvaluationError, evaluate } from '@/lib/evaluation';

const along = (positions: string[], figures: string[], localLength: string) =>
  evaluate({ method: 'parallelism', positions, readings: { '0': figures }, judge: 'range', localLength }).local;

describe('parallelism: local range', () => {
  it('is the largest difference within the length', () => {
    const positions = ['0', '200', '400', '600', '800'];
    const figures = ['0', '4', '9', '7', '1'];
    expect(along(positions, figures, '200')).toBe('6');
    expect(along(positions, figures, '400')).toBe('9');
    expect(along(positions, figures, '100')).toBe('0');
  });

  it('is the range itself over the whole length or more, and left out where no length is asked for', () => {
    expect(along(['0', '50', '100'], ['3', '-2', '1'], '100')).toBe('5');
    expect(along(['0', '50', '100'], ['3', '-2', '1'], '1000')).toBe('5');
    const without = evaluate({ method: 'parallelism', positions: ['0', '1'], readings: { '0': ['0', '1'] } });
    expect('local' in without).toBe(false);
  });

  it('refuses a length that is not above 0', () => {
    expect(() => along(['0', '1'], ['0', '1'], '0')).toThrow(EvaluationError);
  });

  it('equals what trying every pair finds', () => {
    const point = fc.record({
      at: fc.integer({ min: -4000, max: 4000 }),
      reading: fc.integer({ min: -300, max: 300 }),
    });
    fc.assert(
      fc.property(
        fc.uniqueArray(point, { minLength: 2, maxLength: 30, selector: ({ at }) => at }),
        fc.integer({ min: 1, max: 9000 }),
        (points, length) => {
          const tenths = (value: number) =>
            `${value < 0 ? '-' : ''}${Math.floor(Math.abs(value) / 10)}.${Math.abs(value) % 10}`;
          let widest = 0;
          for (const a of points)
            for (const b of points)
              if (Math.abs(a.at - b.at) <= length) widest = Math.max(widest, Math.abs(a.reading - b.reading));
          const found = along(
            points.map(({ at }) => tenths(at)),
            points.map(({ reading }) => String(reading)),
            tenths(length),
          );
          expect(found).toBe(String(widest));
        },
      ),
    );
  });
});
