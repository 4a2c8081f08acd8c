import type { SheetExplanation } from '@/lib/explaining/explain-outcome';
import type { Judgement, PlotSeries, Verdict } from '@/lib/sheet/types';
import type { BoundComponent, ShownIn, SketchSpec } from '@/standards/types';

/**
 * Everything that an acceptance report says, frozen when the report is issued. Figures are stored results, already rounded to the
 * text that is shown: neither the template nor the page computes. All lengths of results are shown in mm, readings in the unit typed.
 */
export interface ReportModel {
  schemaVersion: 1;
  language: 'en';
  paper: 'A4' | 'Letter';
  document: {
    number: string;
    revision: number;
    state: 'draft' | 'issued' | 'signed' | 'signed-with-remarks' | 'refused' | 'superseded';
    issuedAt: string | null;
    issuedBy: string | null;
    checkedBy: string | null;
    programVersion: string;
  };
  letterhead: { name: string; addressLines: string[]; contact: string | null };
  machine: {
    manufacturer: string;
    model: string;
    serialNumber: string;
    year: number | null;
    control: string | null;
    hours: string | null;
    kind: string;
    sizeClass: string | null;
    site: string | null;
    /** `condition`: what the work did to it; absent where nothing is said, and in reports from before it was asked. */
    components: { id: string; what: string; condition?: string }[];
  };
  customer: { name: string; engineer: string | null; order: string | null };
  job: {
    reference: string;
    purpose: string;
    scope: string | null;
    from: string;
    to: string | null;
    codes: string[];
    decisionRule: string;
    people: { name: string; role: string }[];
  };
  conditions: {
    place: string | null;
    lines: { label: string; value: string }[];
    temperatures: { at: string; air: string | null; machine: string | null }[];
    airRange: string | null;
  };
  instruments: {
    number: string;
    name: string;
    resolution: string | null;
    certificate: string | null;
    calibrated: string | null;
    due: string | null;
    uncertainty: string | null;
    /** Set where it was used after its due date: who allowed it and why. */
    override: string | null;
  }[];
  headline: string;
  counts: { asFound: Counts; asLeft: Counts };
  /** Function checks, counted beside the measured tests; absent where none is planned, and in reports from before there were any. */
  checks?: CheckCounts;
  /** On what the tolerances rest; absent in reports from before they could be confirmed. */
  toleranceSources?: { confirmed: number; replaced: number; contract: number; unconfirmed: number };
  summary: SummaryRow[];
  notInPlan: { title: string; reason: string }[];
  blocks: TestBlock[];
  remarks: {
    no: number;
    sheetOrder: number | null;
    text: string;
    owner: string | null;
    due: string | null;
    closed: string | null;
  }[];
  signatures: SignatureBlock[];
  statement: string;
  /** On demand: how every result came about. Absent: the report was made without it. */
  annex?: AnnexEntry[];
}

export interface Counts {
  planned: number;
  within: number;
  out: number;
  undecided: number;
  forInformation: number;
  leftOut: number;
  notMeasured: number;
  judged: number;
}

/** planned = in order + not in order + not done + left out. */
export interface CheckCounts {
  planned: number;
  inOrder: number;
  notInOrder: number;
  notDone: number;
  leftOut: number;
}

export interface SummaryRow {
  order: number;
  /** The same for the same test of the same component at every visit: `AX-1a:Z1:S1`. */
  key: string;
  title: string;
  component: string;
  /** mm as shown, sign included; null: not measured in that state. */
  asFound: string | null;
  /** The unrounded deviation, µm, as a plain decimal: for machines, and for drift over the years. */
  asFoundUm: string | null;
  asFoundVerdict: Verdict | null;
  asLeft: string | null;
  asLeftUm: string | null;
  asLeftVerdict: Verdict | null;
  /** as left = as found, nothing was done. */
  linked: boolean;
  toleranceMm: string | null;
  /** Unit of the figures as found and as left and of the tolerance, where it is not mm; `items`: a function check, which has no figures. */
  unit?: ShownIn;
  leftOut: string | null;
  remarkNo: number | null;
}

export interface TestBlock {
  order: number;
  /** Own id and where the test comes from: `AX-1a · ISO 13041-1:2020`. */
  reference: string;
  title: string;
  component: BoundComponent;
  componentWords: string;
  sketch: SketchSpec;
  toleranceWords: string;
  toleranceSource: string;
  directionWords: string | null;
  judgedFigure: string;
  instruments: string[];
  /** Rules by which it was begun and computed; absent in reports from before it was kept with each sheet. */
  ruleSet?: string;
  cautions: string[];
  passes: PassBlock[];
  leftOut: { reason: string; text: string | null } | null;
  remark: string | null;
  /** A function check: items instead of readings, in order or not in order instead of a verdict on a tolerance. */
  check?: true;
  /** Absent in reports from before photographs could be added. */
  photos?: PhotoBlock[];
}

export interface AnnexEntry {
  sheetOrder: number;
  title: string;
  passWords: string;
  explanation: SheetExplanation;
}

export interface PhotoBlock {
  fileId: string;
  sha256: string;
  widthPx: number;
  heightPx: number;
  /** Item of a function check and caption, for the line below the picture. */
  words: string;
}

export interface PassBlock {
  kind: 'as-found' | 'adjusting' | 'as-left';
  kindWords: string;
  takenAt: string | null;
  by: string | null;
  temperature: string | null;
  /** as left = as found: no table of its own. */
  linkedWords: string | null;
  setUp: { label: string; value: string }[];
  tables: { title: string | null; columns: string[]; rows: { label: string; cells: string[] }[] }[];
  resultMm: string | null;
  resultUm: string | null;
  /** Unit of `resultMm` where it is not mm. */
  resultUnit?: ShownIn;
  /** Items of a function check, instead of tables. */
  items?: CheckedItem[];
  resultWords: string | null;
  judgement: Judgement | null;
  plot: PlotSeries | null;
  /** Further figures of the method, `slope 25.0 µm/m`. */
  figures: { label: string; value: string }[];
  corrections: { field: string; was: string; now: string; by: string; at: string; reason: string | null }[];
}

/** One item of a function check as it was answered. */
export interface CheckedItem {
  question: string;
  /** `yes`, `no`, `not fitted`; null: not answered. */
  answer: string | null;
  /** Figure with its unit, and the limits that it is held to: `4.2 bar (4 to 6)`. */
  value: string | null;
  remark: string | null;
  /** null: not answered, or not fitted. */
  inOrder: boolean | null;
}

export interface SignatureBlock {
  role: 'inspector' | 'reviewer' | 'customer';
  roleWords: string;
  name: string;
  function: string | null;
  company: string | null;
  signedAt: string | null;
  outcome: string | null;
  reason: string | null;
  typed: string | null;
  /** Strokes of a drawn signature as SVG path data in a box of 600 × 200. */
  strokes: string[] | null;
}
