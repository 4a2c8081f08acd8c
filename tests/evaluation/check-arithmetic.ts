import { expect } from 'vitest';
import type { ExplainedStep } from '@/lib/explaining/explanation';
import { agree, isArithmetic, leadingFigure, readArithmetic } from './read-arithmetic';

/** Every step that is nothing but arithmetic is worked out again by a reader of its own. @returns how many there were */
export function checkArithmetic(steps: readonly ExplainedStep[]): number {
  let checked = 0;
  for (const { what, withNumbers, value } of steps) {
    const text = `${what}: ${withNumbers} → ${value}`;
    expect(text).not.toMatch(/undefined|NaN|null|Infinity/);
    const said = leadingFigure(value);
    if (said === null || !isArithmetic(withNumbers)) continue;
    expect(agree(readArithmetic(withNumbers), said), text).toBe(true);
    checked++;
  }
  return checked;
}
