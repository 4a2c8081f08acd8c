import { type GlossaryTerm, glossary } from '@/standards/glossary';
import type { TestDefinition } from '@/standards/types';

/** Trade words that occur in the texts of a test, with what they mean: what a person beside the machine may want to look up. */
export function wordsOnSheet(definition: TestDefinition): GlossaryTerm[] {
  const { title, procedure, judgedFigure, usualMistakes = [], positiveMeans = '', negativeMeans = '' } = definition;
  const text = [title, ...procedure, judgedFigure, ...usualMistakes, positiveMeans, negativeMeans]
    .join(' ')
    .toLowerCase();
  return glossary.filter(({ term, also = [] }) => [term, ...also].some((word) => occurs(word, text)));
}

/** As a word of its own, in the singular or the plural. */
function occurs(word: string, text: string): boolean {
  const plain = word.toLowerCase().replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
  return new RegExp(`(^|[^\\p{L}-])${plain}(s|es)?($|[^\\p{L}-])`, 'u').test(text);
}
