import { expect } from 'vitest';
import type { Provenance } from '@/standards/types';

/** A memory says how sure it is; everything says what it is. */
export function expectProvenance(provenance: Provenance) {
  expect(provenance.text.length).toBeGreaterThan(10);
  if (provenance.kind === 'from-memory') expect(['high', 'medium', 'low']).toContain(provenance.confidence);
  if (provenance.kind === 'published') expect(provenance.confidence).toBeUndefined();
}
