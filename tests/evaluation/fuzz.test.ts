import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EvaluationError, evaluateUnknown } from '@/lib/evaluation';
import { exampleInputs } from './example-inputs';

type Json = string | number | boolean | null | Json[] | { [key: string]: Json };

/** Leaves that are allowed, at the edges of what is allowed. */
const figures = fc.oneof(
  fc.integer({ min: -9999, max: 9999 }).map((n) => (n / 100).toString()),
  fc.constantFrom('0', '-0', '0.000', '+3', '.5', '5.', '007', '1e99', '-1e99', '1e-99', '1E+2', '360', '90', '1e-60'),
  fc.constantFrom(
    '9'.repeat(60),
    `0.${'0'.repeat(57)}1`,
    `-${'9'.repeat(59)}`,
    '1e-45',
    '89.99999999999999999999999999',
  ),
);
/** Leaves that are not. */
const wrong = fc.oneof(
  fc.constantFrom<Json>(
    '',
    ' ',
    '1,5',
    '1 5',
    'NaN',
    'Infinity',
    '1e100',
    '--1',
    '1e',
    '0x10',
    '٣',
    '1\n',
    '9'.repeat(61),
  ),
  fc.constantFrom<Json>(null, 5, 1.5, -0, 1e300, true, [], {}, [['1']], 'minimum-zone', 'range'),
);

/** Places of a value, each as the way to it. */
function placesOf(value: Json, way: string[] = []): string[][] {
  if (typeof value !== 'object' || value === null) return [way];
  return [way, ...Object.entries(value).flatMap(([key, part]) => placesOf(part, [...way, key]))];
}

function changed(value: Json, way: readonly string[], change: (old: Json, parent: Json, key: string) => void): void {
  const key = way.at(-1)!;
  const parent = way.slice(0, -1).reduce<Json>((part, step) => (part as Record<string, Json>)[step]!, value);
  change((parent as Record<string, Json>)[key]!, parent, key);
}

const put = (next: Json) => (_: Json, parent: Json, key: string) => {
  (parent as Record<string, Json>)[key] = next;
};
const take = (_: Json, parent: Json, key: string) => {
  if (Array.isArray(parent)) parent.splice(Number(key), 1);
  else delete (parent as Record<string, Json>)[key];
};
const repeat = (old: Json, parent: Json) => {
  if (Array.isArray(parent)) parent.push(structuredClone(old));
  else (parent as Record<string, Json>).more = structuredClone(old);
};

const example = fc.constantFrom(...exampleInputs).map((input) => structuredClone(input) as unknown as Json);
const someplace = fc.nat({ max: 10_000 });
const step = fc.oneof(
  { weight: 6, arbitrary: figures.map((figure) => ({ leavesOnly: true, change: put(figure) })) },
  { weight: 2, arbitrary: wrong.map((value) => ({ leavesOnly: false, change: put(value) })) },
  { weight: 1, arbitrary: fc.constantFrom({ leavesOnly: false, change: take }, { leavesOnly: false, change: repeat }) },
);

const PLAIN = /^-?(0|[1-9]\d*)(\.\d+)?$/;
/** Fields that hold words; every other text of a result is a figure. */
const words = new Set(
  ['method', 'kind', 'judgedBy', 'verdict', 'direction', 'worstStation', 'formula', 'verify', 'feed'].concat(
    'place',
    'point',
    'action',
  ),
);

function expectPlain(value: unknown, key = ''): void {
  if (typeof value === 'string') {
    if (words.has(key)) return;
    expect(value).toMatch(PLAIN);
    expect(value).not.toMatch(/^-0(\.0*)?$/);
  } else if (typeof value === 'object' && value !== null) {
    for (const [name, part] of Object.entries(value)) expectPlain(part, Array.isArray(value) ? key : name);
  } else expect(typeof value).toBe('boolean');
}

/** Whether the input was taken. */
function evaluateOrRefuse(input: Json): boolean {
  try {
    expectPlain(evaluateUnknown(input));
    return true;
  } catch (error) {
    if (!(error instanceof EvaluationError)) throw error;
    expect(error.issues.length).toBeGreaterThan(0);
    for (const { pointer, detail } of error.issues) {
      expect(pointer).toMatch(/^(\/[^/]*)*$/);
      expect(detail.length).toBeGreaterThan(4);
    }
    return false;
  }
}

describe('whatever is asked, the answer is a result or a refusal', () => {
  it('every example is taken', () => {
    for (const input of exampleInputs) expect(evaluateOrRefuse(structuredClone(input) as unknown as Json)).toBe(true);
  });

  it('examples with figures, fields and lists changed', () => {
    let taken = 0;
    let refused = 0;
    fc.assert(
      fc.property(example, fc.array(fc.tuple(someplace, step), { minLength: 1, maxLength: 4 }), (input, steps) => {
        for (const [where, { leavesOnly, change }] of steps) {
          const places = placesOf(input).filter((way) => way.length > 0 && way[0] !== 'method' && way[0] !== 'kind');
          const leaves = places.filter((way) => {
            const at = way.reduce<Json>((part, key) => (part as Record<string, Json>)[key]!, input);
            return typeof at === 'string' && (!leavesOnly || PLAIN.test(at));
          });
          const choice = leavesOnly && leaves.length > 0 ? leaves : places;
          const way = choice[where % Math.max(choice.length, 1)];
          if (way) changed(input, way, change);
        }
        if (evaluateOrRefuse(input)) taken += 1;
        else refused += 1;
      }),
      { numRuns: 6000, seed: 73 },
    );
    expect(taken).toBeGreaterThan(1500);
    expect(refused).toBeGreaterThan(1500);
  });

  it('an unknown field is refused in every object, and named', () => {
    for (const input of exampleInputs) {
      const objects = placesOf(input as unknown as Json).filter((way) => {
        const at = way.reduce<Json>((part, key) => (part as Record<string, Json>)[key]!, input as unknown as Json);
        // Keys of readings over angles are angles.
        return typeof at === 'object' && !Array.isArray(at) && way.at(-1) !== 'readings';
      });
      for (const way of objects) {
        const copy = structuredClone(input) as unknown as Json;
        const at = way.reduce<Json>((part, key) => (part as Record<string, Json>)[key]!, copy);
        (at as Record<string, Json>)['some~thing/else'] = '1';
        const pointer = [...way, 'some~0thing~1else'].map((key) => `/${key}`).join('');
        expect(refusalOf(copy)).toContain(pointer);
      }
    }
  });

  it('a JSON number, a comma, an empty text, an exponent of three digits and 61 characters are no figures', () => {
    const numbersToo = new Set(['coverage', 'degreesOfFreedom', 'controlFactor', 'three']);
    const names = new Set(['name', 'place']);
    for (const input of exampleInputs) {
      for (const way of placesOf(input as unknown as Json)) {
        const at = way.reduce<Json>((part, key) => (part as Record<string, Json>)[key]!, input as unknown as Json);
        if (typeof at !== 'string' || !PLAIN.test(at) || names.has(way.at(-1)!)) continue;
        for (const text of [7, '1,5', '', ' ', ' 1', '1e100', 'NaN', '1'.repeat(61)]) {
          if (typeof text === 'number' && way.some((key) => numbersToo.has(key))) continue;
          const copy = structuredClone(input) as unknown as Json;
          changed(copy, way, put(text));
          expect([way, refusalOf(copy)]).toEqual([way, expect.arrayContaining([`/${way.join('/')}`])]);
        }
      }
    }
  });

  it('angles closer together than their cosines can tell are refused, not a fault', () => {
    const angles = ['0', '1e-99', '2e-99', '3e-99', '4e-99'];
    const circle = angles.map((angle, i) => ({ angle, radius: String(i) }));
    const points = angles.map((angle, i) => ({ angle, reading: String(i) }));
    const readings = ['0', '1', '2', '3', '4'];
    for (const input of [
      { method: 'circular', clockwise: circle, nominalRadius: '50' },
      { method: 'circular', clockwise: circle, counterclockwise: circle, nominalRadius: '1e99' },
      { method: 'roundness', points },
      {
        method: 'roundness',
        points: points.map(({ angle, reading }) => ({ angle: angle.replace('99', '50'), reading })),
      },
      { method: 'axis-of-rotation', direction: 'radial', angles, turns: [readings, readings] },
      { method: 'run-out', angles, insertions: [{ readings }] },
    ]) {
      expect(evaluateOrRefuse(input as unknown as Json)).toBe(false);
    }
  });
});

function refusalOf(input: Json): string[] {
  try {
    evaluateUnknown(input);
    return [];
  } catch (error) {
    if (!(error instanceof EvaluationError)) throw error;
    return error.issues.map(({ pointer }) => pointer);
  }
}
