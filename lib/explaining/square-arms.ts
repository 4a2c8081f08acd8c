import { evaluate } from '@/lib/evaluation';

export interface Arm {
  slope?: string;
  points?: { position: string; reading: string }[];
}
export interface Setting {
  referenceArm?: Arm;
  measuredArm: Arm;
}
export type ArmSlopes = { referenceArm: string; measuredArm: string };

/** Slopes of both arms, each by the method's own door: an arm alone is a squareness with the other one at 0. */
export function armSlopes({ referenceArm, measuredArm }: Setting): ArmSlopes {
  const slopeOf = (arm: Arm) =>
    evaluate({ method: 'squareness', first: { measuredArm: arm }, measuringLength: '1000' }).s1;
  return { referenceArm: referenceArm ? slopeOf(referenceArm) : '0', measuredArm: slopeOf(measuredArm) };
}
