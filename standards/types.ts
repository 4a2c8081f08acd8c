import type { Unit } from '@/lib/units/unit';

/** Decimal string, as everywhere in the project: a JavaScript number never holds a measured value or a tolerance. */
export type DecimalText = string;

/** Where a figure or a rule comes from; shown in words beside it on screen and paper. */
export type ProvenanceKind = 'published' | 'common-practice' | 'from-memory' | 'derived' | 'builder' | 'contract';

export interface Provenance {
  kind: ProvenanceKind;
  /** Published source, contract item, or what a memory is of; our own words. */
  text: string;
  /** How sure a memory is. */
  confidence?: 'high' | 'medium' | 'low';
}

/** How a result may lie: see the permissible directions of the evaluation contract. */
export type Direction =
  | 'either'
  | 'concave-only'
  | 'convex-only'
  | 'rising-to-free-end'
  | 'toward-tool'
  | 'tailstock-high';

export type Plane = 'ZX' | 'YZ' | 'XY';

/** What a planned sheet is bound to. Ids are those of the machine's make-up (S1, Z1, T2 …). */
export interface BoundComponent {
  spindle?: string;
  axis?: string;
  /** The second axis or spindle of a relation (Y square to X: axis Y1, reference X1). */
  reference?: string;
  turret?: string;
  tailstock?: string;
  plane?: Plane;
  channel?: number;
}

/** What a later correction would have to touch to make a result doubtful. */
export interface DependsOn {
  /** Components that must not be loosened without measuring again. */
  components: string[];
  /** Axes whose motion is measured. */
  moved: string[];
  /** Axes whose absolute place enters the result. */
  positioned: string[];
}

/**
 * How a definition finds its components in a make-up. Resolved by lib/planning; data, so that an organisation's own
 * definitions can use the same selectors.
 */
export type AppliesTo =
  | { kind: 'spindle'; types: ('main' | 'sub')[] }
  /** A Z-like axis that carries a turret or post (or a moving headstock) with the work spindle it works at. */
  | { kind: 'longitudinal-axis-and-spindle'; plane: Plane }
  /** An X-like axis of a turret with the work spindle it works at. */
  | { kind: 'cross-axis-and-spindle' }
  /** Y and X of the same turret. */
  | { kind: 'y-and-x' }
  /** A Z-like axis alone, one sheet in each of the planes. */
  | { kind: 'longitudinal-axis'; planes: Plane[] }
  /** Main and sub-spindle facing each other. */
  | { kind: 'main-and-sub-spindle' }
  /** A turret or tool post with every work spindle it can reach. */
  | { kind: 'turret-and-spindle' }
  /** Every linear axis, or only some letters. */
  | { kind: 'linear-axis'; letters?: string[] }
  /** A turret that can turn a test piece held in a work spindle. */
  | { kind: 'turning-turret-and-spindle' };

/** How the fields of a sheet are laid out, in the order in which the readings are taken. */
export type Layout =
  /** Run-out: turns of the spindle, one after another, a reading at each angle. */
  | { kind: 'turns'; insertions: number; anglesDeg: DecimalText[]; insertionLabel: 'insertion' | 'turn' }
  /** Mandrel or disc with the spindle at several angles; down the positions at the first angle, then at the next. */
  | {
      kind: 'angles-by-position';
      anglesDeg: DecimalText[];
      positionsMm: DecimalText[];
      positionName: 'z' | 'radius' | 'along the face';
      sag: boolean;
    }
  /** Straightness: one reading at each position. */
  | {
      kind: 'profile';
      positionsMm: DecimalText[];
      localLengthMm?: DecimalText;
      reference: 'minimum-zone' | 'least-squares' | 'end-points';
    }
  /** Squareness by a square, turned over: reference arm and measured arm, twice. */
  | { kind: 'square-reversed'; referencePositionsMm: DecimalText[]; measuredPositionsMm: DecimalText[] }
  /** Coaxiality: sections swept at four angles. */
  | { kind: 'swept-sections'; positionsMm: DecimalText[]; surface: 'outside' | 'bore' }
  /** Tool hole against the spindle: a sweep, or two heights; the person chooses. */
  | { kind: 'tool-centre'; form: 'sweep' | 'heights'; surface: 'outside' | 'bore'; radiiMm: DecimalText[] }
  /** Lost motion: places, feeds, pairs of approaches. */
  | { kind: 'approach-pairs'; places: string[]; feeds: ('cutting-feed' | 'rapid')[]; pairs: number }
  /** Two turned collars. */
  | { kind: 'two-collars'; distanceMm: DecimalText };

/** One line of a tolerance table: over `overMm` up to and including `upToMm` of the table's criterion. */
export interface ToleranceStep {
  overMm: DecimalText;
  /** null: no upper limit. */
  upToMm: DecimalText | null;
  toleranceUm: DecimalText;
}

export type SizeCriterion = 'swing-over-bed' | 'bar-diameter' | 'chuck-diameter';

/** A machine size class is found by the one criterion that the machine's builder uses. Half-open: over … up to. */
export interface SizeClassTable {
  criterion: SizeCriterion;
  classes: { class: 1 | 2 | 3; overMm: DecimalText; upToMm: DecimalText | null }[];
  provenance: Provenance;
}

export interface ToleranceRule {
  /** By size class of the machine, by the travel of the axis, or one figure for all. */
  by: 'size-class' | 'travel' | 'all';
  /** size-class: index 0..2 is class 1..3; all: one entry; travel: steps. */
  byClassUm?: [DecimalText, DecimalText, DecimalText];
  allUm?: DecimalText;
  steps?: ToleranceStep[];
  /** Given per length: T(L) = max(T0·L/L0, minimum), capped at `maximumUm`. Absent: never scaled. */
  perLength?: { baseLengthMm: DecimalText; minimumUm: DecimalText; maximumUm?: DecimalText };
  /** A local tolerance that must hold too. */
  local?: { toleranceUm: DecimalText; lengthMm: DecimalText; provenance: Provenance };
  basis?: 'offset' | 'total-indicator-reading';
  provenance: Provenance;
}

/** Parts of a set-up sketch; the sketch is drawn from this, never copied. See components/sketches. */
export interface SketchSpec {
  scene:
    | 'spindle-nose'
    | 'spindle-bore-mandrel'
    | 'mandrel-along-motion'
    | 'disc-across-motion'
    | 'square-two-motions'
    | 'straightedge-along-motion'
    | 'two-spindles-sweep'
    | 'tool-hole-sweep'
    | 'tool-hole-heights'
    | 'slide-approach'
    | 'two-collar-piece';
  /** Angles at which the spindle stands, for the arc arrow. */
  anglesDeg?: DecimalText[];
  /** Distance from the nose at which the stylus stands, where it matters. */
  atMm?: DecimalText;
  /** The four readings insertions note, plane, sign note … are derived from layout and component. */
  plane?: Plane;
  /** What a positive deviation means, our own words, short. */
  positiveMeans?: string;
}

/** Short caution sentences are kept once and named by id; see standards/cautions.ts. */
export type CautionId =
  | 'isolate-before-touching'
  | 'turn-spindle-by-hand'
  | 'reduced-speed-enabling-device'
  | 'other-channels-at-rest'
  | 'support-heavy-parts'
  | 'guards-back-before-cutting'
  | 'stored-energy'
  | 'turret-and-sub-spindle-pinch'
  | 'maker-and-local-rules-first';

export interface TestDefinition {
  /** Our own neutral id (SP-1a). With code, edition and version it identifies a definition for ever. */
  id: string;
  code: string;
  /** Edition of the code; '' for common practice, which has none. */
  edition: string;
  /** Raised whenever readings, method, tolerance or direction change; old versions stay. */
  version: number;
  /** Number in that edition, only where it is known. */
  testNumber?: string;
  title: string;
  /** Title with the component put in: `{axis}`, `{spindle}`, `{reference}`, `{turret}`, `{plane}`; spindles and turrets in words (`sub-spindle S2`). */
  boundTitle: string;
  /** Steps in our own words, in the order in which they are done. */
  procedure: string[];
  appliesTo: AppliesTo;
  method: string;
  layout: Layout;
  tolerance: ToleranceRule | null;
  direction: Direction;
  /** `byForm`: where a pass can be taken in several forms, the forms that resolve differently. */
  resolution: {
    valueUm: DecimalText;
    rule: 'half-even' | 'half-away-from-zero';
    byForm?: Record<string, DecimalText>;
  };
  /** Kinds of instrument, in the register's words. */
  instruments: string[];
  cautions: CautionId[];
  sketch: SketchSpec;
  /** Which of the bound component's parts count as what; resolved to ids by lib/planning. */
  dependsOn: {
    components: ('spindle' | 'reference' | 'turret' | 'bed')[];
    moved: ('axis' | 'reference')[];
    /** `turret-axes`: all linear axes of the turret; `spindle-axis`: the axis that carries the (sub-)spindle; `turret-cross-axis`: its X. */
    positioned: ('turret-axes' | 'spindle-axis' | 'turret-cross-axis')[];
  };
  /** Place in the working order (handed on by `standards/working-order.ts`). */
  workingStep: number;
  /** In words: which figure is judged. */
  judgedFigure: string;
  /** Words for the sign of the result. */
  positiveMeans?: string;
  negativeMeans?: string;
  source: Provenance;
}

/** Tolerance of one planned sheet, found when the plan is made and kept with the sheet for ever. */
export interface PlannedTolerance {
  baseUm: DecimalText;
  /** Scaled at judging time with the length really measured. */
  perLength?: { baseLengthMm: DecimalText; minimumUm: DecimalText; maximumUm?: DecimalText };
  local?: { toleranceUm: DecimalText; lengthMm: DecimalText; provenance: Provenance };
  /** What a coaxiality tolerance counts: the offset of the axes (default) or the total indicator reading. */
  basis?: 'offset' | 'total-indicator-reading';
  /** `size class 2 (bar diameter 32 mm: over 25 up to 63)` and the like. */
  foundBy: string;
  provenance: Provenance;
}

export interface CellDefault {
  text: string;
  unit: Unit | null;
}

/** One sheet of a plan, before it is stored. */
export interface PlannedSheet {
  /** Stable within a job: definition id and component, e.g. `AX-1a:Z1:S1`. */
  key: string;
  definition: { id: string; code: string; edition: string; version: number };
  title: string;
  component: BoundComponent;
  dependsOn: DependsOn;
  tolerance: PlannedTolerance | null;
  direction: Direction;
  /** Set-up fields proposed for the first pass: JSON pointer → text. */
  setUp: Record<string, CellDefault>;
  workingStep: number;
}
