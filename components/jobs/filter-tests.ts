import type { ProposedTest } from './plan-choices';

/** Tests that hold every word of the text in title, code, group, set-up or component; all of them where nothing is typed. */
export function filterTests(tests: ProposedTest[], text: string): ProposedTest[] {
  const words = text.toLowerCase().split(/\s+/).filter(Boolean);
  if (words.length === 0) return tests;
  return tests.filter((test) => {
    const held = [test.title, test.code, test.group, test.setUp ?? '', test.key, ...test.components]
      .join(' ')
      .toLowerCase();
    return words.every((word) => held.includes(word));
  });
}
