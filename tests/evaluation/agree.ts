import { expect } from 'vitest';
import { Dec } from '@/lib/units/decimal';

const DECIMAL = /^-?\d+(\.\d+)?$/;

/**
 * Compares an answer with expected figures: every expected field must be there; decimal texts agree exactly where the
 * expected one is short, else to a relative 1e-20 (or the given one). Fields of the answer not listed are ignored.
 */
export function expectAgreement(
  actual: unknown,
  expected: unknown,
  path = '',
  loose: Record<string, string> = {},
): void {
  if (Array.isArray(expected)) {
    expect(Array.isArray(actual), path).toBe(true);
    expect((actual as unknown[]).length, path).toBe(expected.length);
    for (const [i, item] of expected.entries()) expectAgreement((actual as unknown[])[i], item, `${path}/${i}`, loose);
    return;
  }
  if (expected !== null && typeof expected === 'object') {
    expect(actual, path).toBeTypeOf('object');
    for (const [key, value] of Object.entries(expected)) {
      expectAgreement((actual as Record<string, unknown>)[key], value, `${path}/${key}`, loose);
    }
    return;
  }
  if (typeof expected !== 'string' || !DECIMAL.test(expected)) {
    expect(actual, path).toEqual(expected);
    return;
  }
  expect(String(actual), `${path} is plain decimal text`).toMatch(DECIMAL);
  const tolerance = loose[path.split('/').pop()!] ?? (expected.replace(/\D/g, '').length < 20 ? '0' : '1e-20');
  const [a, e] = [new Dec(String(actual)), new Dec(expected)];
  const limit = e.abs().times(tolerance);
  expect(a.minus(e).abs().lte(limit), `${path}: ${String(actual)} instead of ${expected}`).toBe(true);
}
