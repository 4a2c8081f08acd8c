import type { PlannedTolerance } from '@/standards/types';

type Figure = Pick<PlannedTolerance, 'confirmation' | 'provenance'>;
const settled = ({ confirmation, provenance }: Figure) => confirmation !== undefined || provenance.kind === 'contract';

/**
 * Whether a planned tolerance is confirmed, replaced or given by the contract, with every further limit of the same readings.
 * Where there is none, nothing has to be confirmed: the result is for information.
 */
export const isSettled = (tolerance: PlannedTolerance | null): boolean =>
  tolerance === null || (settled(tolerance) && (tolerance.also ?? []).every(settled));
