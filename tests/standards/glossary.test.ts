import { describe, expect, it } from 'vitest';
import { wordsOnSheet } from '@/lib/planning/words-on-sheet';
import { glossary } from '@/standards/glossary';
import { allDefinitions } from '@/standards/registry';

describe('words of the trade', () => {
  it('are sorted, each once, in whole sentences of our own', () => {
    const terms = glossary.map(({ term }) => term);
    expect(terms.length).toBeGreaterThanOrEqual(60);
    expect([...terms].sort((a, b) => a.localeCompare(b, 'en'))).toEqual(terms);
    const words = glossary.flatMap(({ term, also = [] }) => [term, ...also]);
    expect(new Set(words).size).toBe(words.length);
    for (const { text, term } of glossary) {
      expect(text, term).toMatch(/^[A-Z].*\.$/);
      expect(text.split(/[.:] /).length, term).toBeLessThanOrEqual(3);
    }
  });

  it('are found where they occur, as words of their own, in singular and plural', () => {
    const nose = allDefinitions().find(({ id }) => id === 'AX-1a')!;
    const found = wordsOnSheet(nose).map(({ term }) => term);
    expect(found).toEqual(expect.arrayContaining(['mandrel', 'dial indicator', 'parallelism']));
    expect(found).not.toContain('tailstock');
    const empty = { ...nose, title: 'x', procedure: ['Squares and pitches.'], judgedFigure: '', usualMistakes: [] };
    expect(wordsOnSheet({ ...empty, positiveMeans: '', negativeMeans: '' }).map(({ term }) => term)).toEqual([
      'pitch',
      'square',
    ]);
    const within = { ...empty, procedure: ['Squareness of the mandrelling.'], positiveMeans: '', negativeMeans: '' };
    expect(wordsOnSheet(within).map(({ term }) => term)).toEqual(['squareness']);
  });

  it('help on every sheet that is measured', () => {
    for (const definition of allDefinitions().filter(({ method }) => method !== 'function-check')) {
      expect(wordsOnSheet(definition).length, definition.id).toBeGreaterThan(0);
      expect(definition.usualMistakes?.length ?? 0, definition.id).toBeGreaterThanOrEqual(2);
    }
  });
});
