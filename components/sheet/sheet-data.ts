import type { LeftOutReason } from '@/lib/schemas/job';
import type { CellPointer, SheetRules, Verdict } from '@/lib/sheet/types';
import type { GlossaryTerm } from '@/standards/glossary';
import type { BoundComponent, TestDefinition } from '@/standards/types';
import type { KnownCell } from './operation-log';

/** Everything the entry screen needs to run by itself: drawings, words and rules come with the sheet. Plain data. */
export interface SheetData {
  sheet: OpenSheet;
  job: { id: string; reference: string; closed: string | null };
  machine: { manufacturer: string; model: string; serialNumber: string };
  /** `main spindle S1, axis Z1, plane ZX`. */
  place: string;
  definition: TestDefinition;
  cautions: string[];
  /** Trade words that occur on the sheet. */
  words: GlossaryTerm[];
  rules: SheetRules;
  /** `ISO 13041-1:2020`. */
  codeTitle: string;
  passes: SheetPass[];
  instruments: Instrument[];
  /** Instruments last used in this job: proposed, and said to be so. */
  recentInstruments: string[];
  neighbours: { previous: Neighbour | null; next: Neighbour | null; count: number };
  viewer: { accountId: string; name: string; mayMeasure: boolean; mayAllow: boolean };
  timeZone: string;
  /** When the server made this, RFC 3339. */
  readAt: string;
}

export interface Neighbour {
  id: string;
  position: number;
  title: string;
}

export interface OpenSheet {
  id: string;
  position: number;
  title: string;
  component: BoundComponent;
  leftOut: { reason: LeftOutReason; text: string | null; by: string | null } | null;
  remark: string | null;
  version: number;
}

export type PassKind = 'as-found' | 'adjusting' | 'as-left';

export interface UsedInstrument {
  instrumentId: string;
  overrideReason: string | null;
  overrideBy: string | null;
}

export interface SheetPass {
  id: string;
  kind: PassKind;
  number: number;
  linkedTo: string | null;
  takenAt: string | null;
  takenBy: string | null;
  temperatureText: string | null;
  version: number;
  cells: Record<CellPointer, KnownCell>;
  instruments: UsedInstrument[];
  result: { state: 'partial' | 'complete'; verdict: Verdict; displayedMm: string } | null;
}

export interface Instrument {
  id: string;
  number: string;
  name: string;
  kind: string;
  resolution: string | null;
  resolutionUnit: string | null;
  /** Last valid day; null: no certificate. */
  dueOn: string | null;
}

const kindWords: Record<PassKind, string> = { 'as-found': 'as found', adjusting: 'adjusting', 'as-left': 'as left' };

/** `as found`, `adjusting 2`, `as left`. */
export const passWords = (pass: Pick<SheetPass, 'kind' | 'number'>) =>
  pass.kind === 'adjusting' || pass.number > 1 ? `${kindWords[pass.kind]} ${pass.number}` : kindWords[pass.kind];

/** A part of what the route answers, in the shape of the screen. */
export interface SheetAnswer {
  sheet: {
    version: number;
    remark: string | null;
    leftOutReason: LeftOutReason | null;
    leftOutText: string | null;
    leftOutBy: string | null;
  };
  passes: SheetPass[];
}

export interface LiveSheet {
  passes: SheetPass[];
  remark: string | null;
  leftOut: OpenSheet['leftOut'];
  version: number;
}

export const liveSheet = ({ sheet, passes }: SheetAnswer): LiveSheet => ({
  passes,
  remark: sheet.remark,
  version: sheet.version,
  leftOut: sheet.leftOutReason ? { reason: sheet.leftOutReason, text: sheet.leftOutText, by: sheet.leftOutBy } : null,
});
