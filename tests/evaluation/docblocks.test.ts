import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { expect, it } from 'vitest';

const root = path.resolve(import.meta.dirname, '../..');
const files = ['evaluation', 'conformity', 'uncertainty', 'correction'].flatMap((room) =>
  readdirSync(path.join(root, 'lib', room)).map((file) => path.join('lib', room, file)),
);

/** The block of text in front of the function that computes a method, for every file that has a method's input. */
const methods = files.flatMap((file) => {
  const text = readFileSync(path.join(root, file), 'utf8');
  const inputs = [...text.matchAll(/^export const (\w+)Input = z\.strictObject\(\{/gm)].map((match) => match[1]!);
  return inputs.map((name) => {
    const own = name === 'conformity' ? 'judge' : name;
    const before = text.slice(0, text.search(new RegExp(`^export function ${own}\\(`, 'm')));
    return { file, name, block: before.slice(before.lastIndexOf('/**')) };
  });
});

it('every method is found', () => {
  expect(methods.length).toBeGreaterThanOrEqual(34);
});

it.each(methods.map(({ file, name, block }) => [`${file} ${name}`, block] as const))(
  '%s says what it takes, what it refuses, an example and its source',
  (_, block) => {
    expect(block).toMatch(/@param|referenceShift|as the method/);
    expect(block).toMatch(/\b(mm|µm|µm\/m|°|counts|same unit)\b|one unit|µm/);
    expect(block).toMatch(/@throws EvaluationError/);
    expect(block).toMatch(/@example/);
    expect(block).toMatch(
      /Source: .*(from memory|common practice|Common practice|derived|textbook|published|JCGM|ISO)/s,
    );
  },
);
