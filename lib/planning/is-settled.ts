import type { PlannedTolerance } from '@/standards/types';

type Figure = Pick<PlannedTolerance, 'confirmation' | 'provenance'>;
const settled = ({ confirmation, provenance }: Figure) => confirmation !== undefined || provenance.kind === 'contract';

/**
 * Whether a planned tolerance is confirmed, replaced or given by the contract, with every further limit of the same readings.
 * Where there is none, nothing has to be confirmed: the result is for information.
 */
export const isSettled = (tolerance: PlannedTolerance | null): boolean =>
  tolerance === null || (settled(tolerance) && (tolerance.also ?? []).every(settled));

/** `confirmed by R. Tamm on 2026-03-10`; null where nobody has. */
export function confirmationWords({ confirmation }: Pick<PlannedTolerance, 'confirmation'>): string | null {
  if (!confirmation) return null;
  const { state, by, on, secondBy } = confirmation;
  return `${state} by ${by}${secondBy ? ` and ${secondBy}` : ''} on ${on}`;
}
