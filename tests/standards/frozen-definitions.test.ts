import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { findDefinition } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';

/**
 * What the definitions of the first catalogue were when sheets were first stored with them. Nothing here may ever change: another
 * layout, method, tolerance or direction needs another version.
 */
const fixture = new URL('./fixtures/first-definitions.json', import.meta.url);
const first = JSON.parse(readFileSync(fixture, 'utf8')) as Partial<TestDefinition>[];

describe('definitions of the first catalogue', () => {
  it('are fifteen', () => {
    expect(first.map(({ id }) => id)).toHaveLength(15);
    expect(new Set(first.map(({ id }) => id)).size).toBe(15);
  });

  it.each(first.map((frozen) => ({ id: frozen.id, frozen })))('$id stands as it stood', ({ frozen }) => {
    const { id, code, edition, version } = frozen;
    const now = findDefinition(id as string, code as string, edition as string, version as number);
    const part = Object.fromEntries(Object.keys(frozen).map((key) => [key, now?.[key as keyof TestDefinition]]));
    expect(JSON.stringify(part)).toBe(JSON.stringify(frozen));
    expect(now?.judge).toBeUndefined();
    expect(now?.also).toBeUndefined();
    expect(now?.shownIn).toBeUndefined();
  });
});
