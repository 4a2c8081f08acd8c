import type { Provenance } from '@/standards/types';

const kinds: Record<Provenance['kind'], string> = {
  published: 'published',
  'common-practice': 'common practice',
  'from-memory': 'from memory, to be confirmed',
  derived: 'derived',
  builder: 'the maker’s figure',
  contract: 'by contract',
};

/** Where a figure comes from, in words: always beside the figure. */
export const provenanceWords = (provenance: Provenance) => kinds[provenance.kind];
