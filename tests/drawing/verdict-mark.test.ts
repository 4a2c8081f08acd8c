import { describe, expect, it } from 'vitest';
import type { MarkKind } from '@/components/plots/verdict-ink';
import { MARK_INK } from '@/components/plots/verdict-ink';
import { verdictMark } from '@/components/plots/verdict-mark-geometry';
import { VERDICT_WORDS } from '@/lib/reporting/words';
import { outside } from '../helpers/drawing-geometry';

const kinds = Object.keys(MARK_INK) as MarkKind[];

/** The mark without any colour: what a black-and-white printer leaves of it. */
const shape = (kind: MarkKind) =>
  JSON.stringify(
    verdictMark(kind).items.map((item) =>
      item.kind === 'path' ? [item.d, item.widthPx, item.dash, item.fill !== 'none'] : item,
    ),
  );

describe('verdict mark', () => {
  it('has a shape of its own for every verdict and state', () => {
    expect(kinds).toHaveLength(7);
    expect(new Set(kinds.map(shape)).size).toBe(kinds.length);
  });

  it.each(kinds)('draws %s inside its box at any size and says its word', (kind) => {
    for (const widthPx of [16, 24, 32, 64]) expect(outside(verdictMark(kind, { widthPx }))).toEqual([]);
    expect(verdictMark(kind).description).toBe(VERDICT_WORDS[kind]);
  });

  it('has no words in it: they stand beside it', () => {
    for (const kind of kinds) expect(verdictMark(kind).items.every((item) => item.kind === 'path')).toBe(true);
  });
});
