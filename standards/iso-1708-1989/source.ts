import type { Provenance } from '../types';

export const code = 'ISO 1708';
export const edition = '1989';
export const subject = 'Acceptance conditions for general-purpose parallel lathes: testing of the accuracy';

/** What is known of the code itself, and how. */
export const source: Provenance = {
  kind: 'from-memory',
  text: 'conventional part of ISO 1708 as remembered, without its numbering; procedure in our own words after common practice',
  confidence: 'medium',
};

/** A tolerance remembered, never checked against the text. */
export function remembered(text: string, confidence: 'low' | 'medium' | 'high'): Provenance {
  return { kind: 'from-memory', text: `starter value: ${text}`, confidence };
}

const makersSheet = 'the accuracy sheet printed in a published engine-lathe manual (Grizzly G0509G, pages 2 and 3)';

/** Remembered, and a maker prints the same. */
export function rememberedAndPrinted(text: string): Provenance {
  return remembered(`${text} as remembered for ISO 1708; ${makersSheet} has the same`, 'high');
}

/** Remembered, and a maker prints another value. */
export function rememberedBesides(text: string, makersValue: string): Provenance {
  return remembered(`${text} as remembered for ISO 1708; ${makersSheet} gives ${makersValue}`, 'high');
}

/** Only a maker's value is known: it stands in for that of the code. */
export function printed(text: string): Provenance {
  return { kind: 'published', text: `${text} in ${makersSheet}: a maker's value, not read in the code` };
}
