import { useFormContext } from 'react-hook-form';
import type { z } from 'zod';
import type { machineFields } from '@/lib/schemas/machine';
import type { MakeUp, MakeUpInput } from '@/lib/schemas/make-up';

export type MachineInput = z.input<typeof machineFields>;

export const useMachineForm = () => useFormContext<MachineInput>();

/** Empty fields of a form are empty texts. */
export function toMakeUpInput(makeUp: MakeUp): MakeUpInput {
  return {
    ...makeUp,
    linearAxes: makeUp.linearAxes.map((axis) => ({ ...axis, directionNote: axis.directionNote ?? '' })),
    spindles: makeUp.spindles.map((spindle) => ({ ...spindle, onTurret: spindle.onTurret ?? '' })),
    turrets: makeUp.turrets.map((turret) => ({ ...turret, drivenTools: turret.drivenTools ?? 'none' })),
    toolChanger: makeUp.toolChanger ?? null,
    distanceBetweenCentresMm: makeUp.distanceBetweenCentresMm ?? '',
    swingOverBedMm: makeUp.swingOverBedMm ?? '',
    swingOverCrossSlideMm: makeUp.swingOverCrossSlideMm ?? '',
    chuckDiameterMm: makeUp.chuckDiameterMm ?? '',
    barDiameterMm: makeUp.barDiameterMm ?? '',
  };
}

/** Every message of one row of a list, to be shown under the row. */
export function rowMessages(errors: object | null | undefined): string[] {
  if (!errors) return [];
  if ('message' in errors && typeof errors.message === 'string') return [errors.message];
  return Object.entries(errors).flatMap(([key, value]) =>
    key !== 'ref' && typeof value === 'object' ? rowMessages(value) : [],
  );
}
