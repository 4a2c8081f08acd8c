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
  /** Station of the turret or place on the gang slide, from 1. */
  station?: number;
  tailstock?: string;
  guideBush?: string;
  toolChanger?: string;
  /** Rotary axis (B1, C1). */
  rotary?: string;
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
  | { kind: 'turning-turret-and-spindle' }
  /** Once for the whole machine: level, safety, backup. */
  | { kind: 'machine' }
  /** Once for each channel of the control. */
  | { kind: 'channel' }
  /** Tool spindles of their own (milling spindle); component: spindle, and turret or axis where it rides on one. */
  | { kind: 'tool-spindle' }
  /** Tool spindle with every work spindle that its carrier can reach. */
  | { kind: 'tool-spindle-and-spindle' }
  /** Linear axes, a sheet in each of the planes that makes sense for the axis (the plane must contain the axis). */
  | { kind: 'linear-axis-in-planes'; letters?: string[]; planes: Plane[] }
  /** A Y-like axis of a turret with each work spindle that it works at (plane YZ). */
  | { kind: 'vertical-axis-and-spindle' }
  /** A sub-spindle with the Z-like axis that carries it. */
  | { kind: 'sub-spindle-and-its-axis'; plane: Plane }
  /** Tailstock with the Z-like axis of the main tool slide. */
  | { kind: 'tailstock-and-axis'; plane?: Plane }
  /** Tailstock with the main spindle and the Z-like axis of the main tool slide. */
  | { kind: 'tailstock-and-spindle'; plane?: Plane }
  /** Turrets and posts, or only some types of them. */
  | { kind: 'turret'; types?: TurretType[] }
  /** Turret with one of its own axes (role), in a plane. `carrying`: where the turret has none, the axis of the spindle it works at. */
  | { kind: 'turret-and-axis'; role: 'longitudinal' | 'cross' | 'vertical'; plane?: Plane; types?: TurretType[] }
  /** Turret, one of its own axes (or of the spindle's) and each work spindle it works at: reference points. */
  | { kind: 'turret-axis-and-spindle'; role: 'longitudinal' | 'cross' | 'vertical' }
  /** Every station of a gang slide or post with each work spindle. */
  | { kind: 'station-and-spindle'; types: TurretType[] }
  /** Turrets with driven tools; `points`: only those whose driven tools point that way. */
  | { kind: 'driven-tools'; points?: 'axial' | 'radial' }
  /** Turret with driven tools and each work spindle it works at. */
  | { kind: 'driven-tools-and-spindle' }
  /** Rotary axes by letter; component: rotary, and spindle or turret that it turns. */
  | { kind: 'rotary-axis'; letters: ('A' | 'B' | 'C')[] }
  /** Guide bush with the main spindle. */
  | { kind: 'guide-bush-and-spindle' }
  /** Guide bush with the axis of the moving headstock, in a plane. */
  | { kind: 'guide-bush-and-axis'; plane: Plane }
  /** Two axes of one turret that span a plane: X and Z, X and Y, Y and Z. A Z that carries the spindle counts too. */
  | { kind: 'axis-pair'; plane: Plane }
  | { kind: 'tool-changer' }
  /** Several make-up parts of one kind at once (`tailstock`, `guideBush`), for function checks. */
  | { kind: 'tailstock' }
  | { kind: 'guide-bush' };

export type TurretType = 'turret' | 'tool-post' | 'gang-slide';

/** How the fields of a sheet are laid out, in the order in which the readings are taken. */
export type Layout =
  /** Run-out: turns of the spindle, one after another, a reading at each angle. */
  | {
      kind: 'turns';
      insertions: number;
      anglesDeg: DecimalText[];
      insertionLabel: 'insertion' | 'turn';
      /** Names of the turns where they are more than a count: `at the nose`, `at 300 mm`. */
      names?: string[];
    }
  /** Mandrel or disc with the spindle at several angles; down the positions at the first angle, then at the next. */
  | {
      kind: 'angles-by-position';
      anglesDeg: DecimalText[];
      positionsMm: DecimalText[];
      positionName:
        | 'z'
        | 'radius'
        | 'along the face'
        | 'along the slide'
        | 'along the mandrel'
        | 'along the quill'
        | 'y';
      sag: boolean;
      /** What is turned to the angles, where it is not the spindle. */
      turned?: 'mandrel' | 'turret' | 'tool spindle';
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
  | { kind: 'two-collars'; distanceMm: DecimalText }
  /** Straightness by level or autocollimator, foot by foot: an angle a step, out and, where wanted, back. */
  | {
      kind: 'angle-steps';
      stepLengthMm: DecimalText;
      steps: number;
      returnRun: boolean;
      reference: 'minimum-zone' | 'least-squares' | 'end-points';
    }
  /** Straightness with the straightedge turned over: two runs over the same positions. */
  | { kind: 'two-runs'; positionsMm: DecimalText[]; reference: 'minimum-zone' | 'least-squares' | 'end-points' }
  /** Flatness: a reading at each point of a grid (free points are rows of x, y, reading). */
  | { kind: 'grid'; xMm: DecimalText[]; yMm: DecimalText[]; reference: 'minimum-zone' | 'least-squares' }
  /** Pitch, yaw or roll over the travel, out and back. */
  | { kind: 'angular-runs'; positionsMm: DecimalText[]; quantity: 'pitch' | 'yaw' | 'roll'; bothDirections: boolean }
  /** ISO 230-2: targets, cycles, both directions. Targets of a linear axis are proposed from its travel. */
  | {
      kind: 'target-cycles';
      quantity: 'linear' | 'rotary';
      cycles: number;
      targets: DecimalText[];
      /** Only going in the + direction. */
      oneWay?: true;
    }
  /** Circular test: radius over the angle, clockwise and counterclockwise. */
  | { kind: 'circle-trace'; anglesDeg: DecimalText[]; nominalRadiusMm: DecimalText; arcDeg: DecimalText }
  /** Axis of rotation: several turns, the same angles in each. */
  | { kind: 'rotation-turns'; turns: number; anglesDeg: DecimalText[]; direction: 'radial' | 'axial' | 'tilt' }
  /** Indexing: stations, each indexed several times. Names come from the turret's stations where `stations` is null. */
  | { kind: 'stations'; stations: string[] | null; repeats: number; radiusMm: DecimalText | null }
  /** Face run-out: circles read at several angles; the largest counts. */
  | {
      kind: 'circles';
      names: string[];
      anglesDeg: DecimalText[];
      /** What is turned to the angles, where it is not the spindle. */
      turned?: 'tool spindle' | 'screw' | 'swivel axis';
    }
  /** Diameters of a turned piece along its axis. */
  | { kind: 'diameters'; positionsMm: DecimalText[] }
  /** Roundness: one reading at each angle. */
  | { kind: 'round-trace'; anglesDeg: DecimalText[]; surface: 'outside' | 'bore' }
  /** Readings over time, temperature beside them. */
  | { kind: 'time-series'; minutes: DecimalText[]; temperature: boolean }
  /** Where it should be and where it was found, mm. `basis` null: the axis's own way of programming is proposed. */
  | { kind: 'target-and-found'; basis: 'radius' | 'diameter' | null }
  /** Function check: items answered one after another. No evaluation method; judged by whether every item is in order. */
  | { kind: 'check-list'; items: CheckItem[] };

/** One item of a function check. */
export interface CheckItem {
  /** Short, stable within the definition; part of the field's address: `/items/<id>/answer`. */
  id: string;
  /** Our own words, so that “yes” is what should be. */
  question: string;
  /** value: a figure with unit and limits besides yes, no, not fitted. */
  value?: { label: string; unit: string; lower?: DecimalText; upper?: DecimalText };
}

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
  by: 'size-class' | 'travel' | 'centre-distance' | 'all';
  /** Unit of the figures in the rule, µm where absent. Angles of rotary axes are given in ″ and become µm/m when a plan is made. */
  unit?: 'µm' | 'µm/m' | '″';
  /** size-class: index 0..2 is class 1..3; all: one entry; travel, centre-distance: steps. */
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
    | 'two-collar-piece'
    | 'face-run-out'
    | 'axial-slip'
    | 'level-on-carriage'
    | 'level-steps'
    | 'angle-instrument'
    | 'straightedge-turned-over'
    | 'laser-along-motion'
    | 'circular-gauge'
    | 'spindle-sensors'
    | 'turret-index'
    | 'turret-face'
    | 'mandrel-in-turret'
    | 'tool-spindle-mandrel'
    | 'tailstock-quill'
    | 'between-centres'
    | 'guide-bush'
    | 'rotary-axis'
    | 'swivel-axis'
    | 'test-piece-cylinder'
    | 'test-piece-face'
    | 'test-piece-pattern'
    | 'transfer-piece'
    | 'drift-at-tool'
    | 'target-and-found'
    | 'mandrel-half-turn'
    | 'gang-stations'
    | 'checklist';
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
  /** Number in that edition, only where it is known, and how well it is known. */
  testNumber?: string;
  testNumberSource?: Provenance;
  /** Kinds of machine (ids of the make-up) for which it is not, or only, meant; absent: every turning machine. */
  machineKinds?: { only?: string[]; not?: string[] };
  /** Id of the test of the same code that this one stands in for: another way to measure the same thing. A plan needs one of them. */
  insteadOf?: string;
  title: string;
  /** Title with the component put in: `{axis}`, `{spindle}`, `{reference}`, `{turret}`, `{plane}`; spindles and turrets in words (`sub-spindle S2`). */
  boundTitle: string;
  /** Steps in our own words, in the order in which they are done. */
  procedure: string[];
  appliesTo: AppliesTo;
  /** A method of the evaluation contract; `function-check` for layout `check-list`. */
  method: string;
  /** Which figure of the method is judged, where it offers several (`range`, `largest`, `A`, `Gb`, `synchronous` …). */
  judge?: string;
  layout: Layout;
  tolerance: ToleranceRule | null;
  /**
   * Further figures of the same readings that have a limit of their own (ISO 230-2: R, B, E, M beside A). `figure` is the key in
   * the method's result. The worst verdict counts.
   */
  also?: { figure: string; label: string; tolerance: ToleranceRule }[];
  direction: Direction;
  /** Unit in which result and tolerance are shown: mm where absent; `mm/m` for angles of slides, `″` for rotary axes. */
  shownIn?: ShownIn;
  /** `byForm`: where a pass can be taken in several forms, the forms that resolve differently. */
  resolution: {
    valueUm: DecimalText;
    rule: 'half-even' | 'half-away-from-zero';
    byForm?: Record<string, DecimalText>;
  };
  /** Kinds of instrument, in the register's words. */
  instruments: string[];
  /** What goes wrong most often, one sentence each, our own words. */
  usualMistakes?: string[];
  /**
   * What stands set up while it is measured, with components put in as in boundTitle: `test mandrel in {spindle}`. Sheets with the
   * same words are done one after another.
   */
  setUpTogether?: string;
  /** Stands first among what is set up together, because the others rest on it. */
  leads?: true;
  /** Minutes for setting up and measuring once, until the organisation's own past says better (common practice, our estimate). */
  minutes?: number;
  cautions: CautionId[];
  sketch: SketchSpec;
  /** Which of the bound component's parts count as what; resolved to ids by lib/planning. */
  dependsOn: {
    components: ('spindle' | 'reference' | 'turret' | 'bed' | 'tailstock' | 'guide-bush' | 'tool-changer' | 'rotary')[];
    /** `turret-axes`, `spindle-axis`: as below, moved. */
    moved: ('axis' | 'reference' | 'rotary' | 'turret-axes' | 'spindle-axis')[];
    /** `turret-axes`: all linear axes of the turret; `spindle-axis`: the axis that carries the (sub-)spindle; `turret-cross-axis`: its X. */
    positioned: ('turret-axes' | 'spindle-axis' | 'turret-cross-axis' | 'axis' | 'reference' | 'rotary')[];
  };
  /** Function check only: doing it moves or opens what these sheets rest on (a restored parameter backup, say). Words for the plan. */
  canDisturb?: ('everything' | 'turret' | 'spindle' | 'axis')[];
  /** Place in the working order (handed on by `standards/working-order.ts`). */
  workingStep: number;
  /** In words: which figure is judged. */
  judgedFigure: string;
  /** Words for the sign of the result. */
  positiveMeans?: string;
  negativeMeans?: string;
  source: Provenance;
}

/** Unit in which a result is shown; `items`: a count of items not in order (function checks). */
export type ShownIn = 'mm' | 'mm/m' | '″' | 'items';

/** That the organisation looked a value up in its own licensed copy, or put its own in its place. */
export interface Confirmation {
  state: 'confirmed' | 'replaced';
  by: string;
  /** Day, ISO. */
  on: string;
  edition: string;
  clause: string;
  /** Second person, where the organisation wants two. */
  secondBy: string | null;
}

/** Tolerance of one planned sheet, found when the plan is made and kept with the sheet for ever. */
export interface PlannedTolerance {
  baseUm: DecimalText;
  /** Scaled at judging time with the length really measured. */
  perLength?: { baseLengthMm: DecimalText; minimumUm: DecimalText; maximumUm?: DecimalText };
  local?: { toleranceUm: DecimalText; lengthMm: DecimalText; provenance: Provenance };
  /** What a coaxiality tolerance counts: the offset of the axes (default) or the total indicator reading. */
  basis?: 'offset' | 'total-indicator-reading';
  /** Limits of further figures of the same readings. */
  also?: {
    figure: string;
    label: string;
    toleranceUm: DecimalText;
    foundBy: string;
    provenance: Provenance;
    confirmation?: Confirmation;
  }[];
  /** Absent: not confirmed by the organisation (a contract tolerance has its provenance instead). */
  confirmation?: Confirmation;
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
  /** The organisation's own definition, whole, as it stood when the plan was made; null: one of the catalogue. */
  ownDefinition: TestDefinition | null;
  title: string;
  component: BoundComponent;
  dependsOn: DependsOn;
  tolerance: PlannedTolerance | null;
  direction: Direction;
  /** Set-up fields proposed for the first pass: JSON pointer → text. */
  setUp: Record<string, CellDefault>;
  workingStep: number;
  /** Words of `setUpTogether` with the components put in; null where it is set up on its own. */
  setUpTogether: string | null;
  minutes: number;
}
