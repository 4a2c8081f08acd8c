import type { ComponentConditions } from '@/lib/schemas/component-conditions';
import type { CalibrationFacts } from '@/lib/schemas/instrument-state';
import type { LeftOutReason, Purpose } from '@/lib/schemas/job';
import type { MakeUp } from '@/lib/schemas/make-up';
import type { SheetOutcome, Verdict } from '@/lib/sheet/types';
import type { Unit } from '@/lib/units/unit';
import type { BoundComponent, Direction, PlannedTolerance, TestDefinition } from '@/standards/types';

/** A job as it is stored, in the shape that check and report are made from; read models satisfy it. */
export interface StoredJob {
  job: {
    reference: string;
    purpose: Purpose;
    scope: string | null;
    customerOrder: string | null;
    customerEngineer: string | null;
    decisionRule: 'simple' | 'guarded';
    codes: { code: string; edition: string }[];
    startsOn: string;
    endsOn: string | null;
    place: string | null;
    hours: string | null;
    conditions: Partial<Record<'warmUp' | 'compensation' | 'level' | 'coolant' | 'notes', string | null>>;
    /** What was opened, by component. */
    componentConditions?: ComponentConditions;
    makeUp: MakeUp;
    state: string;
  };
  people: { name: string; role: 'inspector' | 'reviewer' | 'customer' }[];
  temperatures: { measuredAt: Date; air: string | null; machine: string | null }[];
  sheets: StoredSheet[];
  exclusions: { title: string; reason: LeftOutReason; text: string | null }[];
  instruments: StoredInstrument[];
}

export interface StoredSheet {
  id: string;
  position: number;
  key: string;
  definition: { id: string; code: string; edition: string; version: number };
  ownDefinition?: TestDefinition | null;
  ruleSet?: string;
  title: string;
  component: BoundComponent;
  tolerance: PlannedTolerance | null;
  direction: Direction;
  leftOutReason: LeftOutReason | null;
  leftOutText: string | null;
  remark: string | null;
  passes: StoredPass[];
  photos: StoredPhoto[];
}

export interface StoredPhoto {
  fileId: string;
  sha256: string;
  item: string | null;
  caption: string;
  widthPx: number;
  heightPx: number;
}

export interface StoredPass {
  id: string;
  kind: 'as-found' | 'adjusting' | 'as-left';
  number: number;
  linkedTo: string | null;
  takenAt: Date | null;
  takenBy: string | null;
  temperature: string | null;
  cells: Record<string, { text: string; unit: Unit | null }>;
  instruments: { instrumentId: string; overrideReason: string | null; overrideBy: string | null }[];
  result: {
    state: 'partial' | 'complete';
    verdict: Verdict;
    displayedMm: string;
    displayedUm: string;
    outcome: JudgedOutcome;
  } | null;
}

export type JudgedOutcome = Extract<SheetOutcome, { state: 'partial' | 'complete' }>;

export interface StoredInstrument {
  id: string;
  number: string;
  name: string;
  resolution: string | null;
  resolutionUnit: string | null;
  calibrations: CalibrationFacts[];
}
