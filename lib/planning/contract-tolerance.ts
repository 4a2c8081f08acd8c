import type { DecimalText, PlannedSheet, PlannedTolerance } from '@/standards/types';

export interface ContractTolerance {
  baseUm: DecimalText;
  /** Where it is agreed: order, item. */
  text: string;
  /** Absent: the figure holds as it stands, whatever the measuring length. */
  perLength?: PlannedTolerance['perLength'];
  local?: { toleranceUm: DecimalText; lengthMm: DecimalText };
}

/**
 * The planned sheet with the tolerance that the contract gives instead of the catalogue's. Further figures of the same readings keep
 * their own limits: the contract speaks of the judged figure.
 */
export function withContractTolerance(planned: PlannedSheet, contract: ContractTolerance): PlannedSheet {
  const provenance = { kind: 'contract' as const, text: contract.text };
  const { basis, also } = planned.tolerance ?? {};
  return {
    ...planned,
    tolerance: {
      baseUm: contract.baseUm,
      ...(contract.perLength ? { perLength: contract.perLength } : {}),
      ...(contract.local ? { local: { ...contract.local, provenance } } : {}),
      ...(basis ? { basis } : {}),
      ...(also ? { also } : {}),
      foundBy: 'contract',
      provenance,
    },
  };
}
