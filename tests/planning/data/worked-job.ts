import type { Unit } from '@/lib/units/unit';
import type { BoundComponent, DependsOn, Direction } from '@/standards/types';
import data from './worked-job.json';
import further from './worked-job-further.json';

export interface WorkedPass {
  kind: string;
  readings: { at: string; text: string; unit: Unit }[];
  request: Record<string, unknown>;
  expected: { deviation: string };
  conformity: { verdict: string; limit: string; margin: string };
  local: { deviation: string; tolerance: string; verdict: string } | null;
  verdict: string;
  display: { value: string; extraDigits: number };
}

export interface WorkedSheet {
  key: string;
  order: number;
  component: BoundComponent;
  dependsOn: DependsOn;
  direction: Direction;
  tolerance: {
    kind: 'shop' | 'contract';
    text: string;
    base: string;
    value: string;
    arithmetic: string | null;
    baseLength: string | null;
    minimum: string | null;
    local: { value: string; length: string } | null;
  };
  passes: WorkedPass[];
}

/** The sheets of the worked job that belong to the first ten tests, in the order of its plan. */
export const workedSheets = data.sheets as unknown as WorkedSheet[];

/** A sheet without a limit has neither tolerance nor conformity. */
export type FurtherSheet = Omit<WorkedSheet, 'tolerance' | 'passes'> & {
  tolerance: WorkedSheet['tolerance'] | null;
  passes: (Omit<WorkedPass, 'conformity'> & { conformity: WorkedPass['conformity'] | null })[];
};

/** The sheets that came later: turret, reference point, positioning, drift. */
export const furtherSheets = further.sheets as unknown as FurtherSheet[];
