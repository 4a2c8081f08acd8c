import type { Confirmation, PlannedTolerance, Provenance } from '@/standards/types';
import { provenanceWords } from './record-words';
import type { ReportModel } from './report-model';

interface Figure {
  provenance: Provenance;
  confirmation?: Confirmation;
  foundBy?: string;
}

/**
 * Where a tolerance comes from: who confirmed or replaced it, when and against what; else the contract or the catalogue's own source,
 * where a memory says that it is one. Further limits of the same readings follow where they stand otherwise; the catalogue has each
 * one's own source.
 * @param code test code of the definition, for editions that are only a year
 */
export function toleranceSource(tolerance: PlannedTolerance | null, code: string): string {
  if (!tolerance) return '';
  const also = tolerance.also ?? [];
  const others = also.filter((figure) => standing(figure, code) !== standing(tolerance, code));
  const likewise =
    also.length > others.length ? [others.length > 0 ? 'other limits likewise' : 'further limits likewise'] : [];
  return [
    sourceOf(tolerance, code),
    ...others.map(({ label, ...figure }) => `${label}: ${sourceOf({ ...figure, foundBy: '' }, code)}`),
    ...likewise,
  ].join('; ');
}

/** What a figure rests on, in short: who confirmed it, or of which kind its source is. */
const standing = ({ provenance, confirmation }: Figure, code: string): string =>
  confirmation ? confirmed(confirmation, code) : provenanceWords[provenance.kind];

function sourceOf({ provenance, confirmation, foundBy }: Figure, code: string): string {
  const found = foundBy && foundBy !== 'contract' ? ` (${foundBy})` : '';
  if (confirmation) return `${confirmed(confirmation, code)}${found}`;
  return `${provenanceWords[provenance.kind]}: ${provenance.text}${found}`;
}

function confirmed({ state, by, on, edition, clause, secondBy }: Confirmation, code: string): string {
  const people = secondBy ? `${by} and ${secondBy}` : by;
  const against = state === 'confirmed' ? 'against' : 'with the figure of';
  const place = [editionWords(edition, code), clauseWords(clause)].filter(Boolean).join(', ');
  return `${state} by ${people} on ${on}${place ? ` ${against} ${place}` : ''}`;
}

/** A year alone is an edition of the test's own code. */
const editionWords = (edition: string, code: string) =>
  /^\d{4}(-\d{2})?$/.test(edition.trim()) ? `${code}:${edition.trim()}` : edition.trim();

/** `5.2` is a clause; `Table 3` and `G7` say themselves what they are. */
const clauseWords = (clause: string) => (/^\d/.test(clause.trim()) ? `clause ${clause.trim()}` : clause.trim());

/** How many tolerances rest on what; tests without a tolerance are not counted. Further limits of the same readings count as one with it. */
export function countToleranceSources(
  tolerances: readonly (PlannedTolerance | null)[],
): NonNullable<ReportModel['toleranceSources']> {
  const states = tolerances.flatMap((tolerance) => {
    if (!tolerance) return [];
    const figures: Figure[] = [tolerance, ...(tolerance.also ?? [])];
    const settled = figures.every(({ confirmation, provenance }) => confirmation || provenance.kind === 'contract');
    if (!settled) return ['unconfirmed'];
    if (figures.some(({ confirmation }) => confirmation?.state === 'replaced')) return ['replaced'];
    return tolerance.confirmation ? ['confirmed'] : ['contract'];
  });
  const count = (wanted: string) => states.filter((state) => state === wanted).length;
  return {
    confirmed: count('confirmed'),
    replaced: count('replaced'),
    contract: count('contract'),
    unconfirmed: count('unconfirmed'),
  };
}

/** `Tolerances: 12 confirmed, 2 by contract, 31 not confirmed.` */
export function toleranceSourceWords(counts: ReportModel['toleranceSources']): string {
  if (!counts) return '';
  const parts = [
    [counts.confirmed, 'confirmed against the organisation’s own copy'],
    [counts.replaced, 'replaced from its own copy'],
    [counts.contract, 'by contract'],
    [counts.unconfirmed, 'not confirmed'],
  ] as const;
  const said = parts.filter(([count]) => count > 0).map(([count, words]) => `${count} ${words}`);
  return said.length ? `Tolerances: ${said.join(', ')}.` : '';
}
