import type { ReportModel } from '@/lib/reporting/report-model';
import type { PlotSeries, Verdict } from '@/lib/sheet/types';
import type { Direction, SketchSpec } from '@/standards/types';

/**
 * The one dictionary of the report's words and of the words in drawings, English. Templates and drawings take every word from here,
 * so that another language is another file of the same shape. Sentences with figures in them: report-text.ts, drawing-text.ts.
 */

export const VERDICT_WORDS: Record<Verdict | 'disturbed' | 'not-measured' | 'left-out', string> = {
  'within-tolerance': 'within tolerance',
  'out-of-tolerance': 'out of tolerance',
  undecided: 'undecided',
  'for-information': 'for information',
  disturbed: 'disturbed',
  'not-measured': 'not measured',
  'left-out': 'left out',
};

/** For narrow columns: the mark beside it has the same shape as beside the long word. */
export const SHORT_VERDICT_WORDS: Record<keyof typeof VERDICT_WORDS, string> = {
  ...VERDICT_WORDS,
  'within-tolerance': 'within',
  'out-of-tolerance': 'out',
};

export const DIRECTION_WORDS: Record<Direction, string> = {
  either: 'either way',
  'concave-only': 'concave only',
  'convex-only': 'convex only',
  'rising-to-free-end': 'rising to the free end only',
  'toward-tool': 'toward the tool only',
  'tailstock-high': 'tailstock higher only',
};

export const SKETCH_WORDS = {
  setUp: 'Set-up',
  plungerIn: '+ in',
  plungerInCounts: 'pushing the plunger in counts positive',
  slowTurn: 'one slow turn',
  squareTurned: 'then square turned over',
  sameTarget: 'same target from both sides',
  collars: ['D1', 'D2'],
  parts: { spindle: 'spindle', axis: 'axis', reference: 'against', turret: 'turret', plane: 'plane' },
} as const;

/** What each scene shows, for somebody who cannot see it. */
export const SCENE_WORDS: Record<SketchSpec['scene'], string> = {
  'spindle-nose': 'indicator on the centring diameter of the spindle nose',
  'spindle-bore-mandrel': 'indicator on a mandrel in the spindle bore',
  'mandrel-along-motion': 'indicator moved along a mandrel in the spindle',
  'disc-across-motion': 'indicator moved across a disc on the spindle',
  'square-two-motions': 'indicators on both arms of a square',
  'straightedge-along-motion': 'indicator moved along a straightedge',
  'two-spindles-sweep': 'indicator carried by one spindle, swept round a mandrel in the other',
  'tool-hole-sweep': 'indicator carried by the spindle, swept round the tool hole',
  'tool-hole-heights': 'heights of a mandrel in the spindle and of one in the tool hole compared',
  'slide-approach': 'slide brought to the same target from both sides, indicator fixed',
  'two-collar-piece': 'test piece with two collars, turned and measured',
};

export const PLOT_WORDS: Record<PlotSeries['kind'], string> = {
  line: 'Readings along a length',
  polar: 'Readings round a turn',
  pairs: 'Readings of pairs of approaches',
};

export const STATE_WORDS: Record<ReportModel['document']['state'], string> = {
  draft: 'draft',
  issued: 'issued',
  signed: 'signed',
  'signed-with-remarks': 'signed with remarks',
  refused: 'refused',
  superseded: 'superseded',
};

export const REPORT_WORDS = {
  title: 'Acceptance report',
  revision: 'revision',
  revisionShort: 'r',
  page: 'page',
  of: 'of',
  draft: 'draft',
  draftMark: 'DRAFT',
  none: '–',
  notRecorded: 'not recorded',
  program: 'made with Witnessmark',
  machine: {
    heading: 'Machine and job',
    maker: 'Maker',
    model: 'Model',
    year: 'Year',
    customer: 'Customer',
    serial: 'Serial number',
    kind: 'Kind',
    control: 'Control',
    hours: 'Operating hours',
    sizeClass: 'Size class',
    site: 'Site',
    makeUp: 'Make-up',
    engineer: 'Customer’s engineer',
    order: 'Order',
    reference: 'Job',
    purpose: 'Purpose',
    scope: 'Scope',
    codes: 'Test codes',
    decisionRule: 'Decision rule',
    people: 'People',
    checkedBy: 'Checked by',
    issuedBy: 'Issued by',
  },
  decisionRule: 'Decision rule',
  conditions: {
    heading: 'Conditions',
    place: 'Place',
    airRange: 'Temperature',
    time: 'Time',
    air: 'Air, °C',
    machine: 'Machine, °C',
  },
  instruments: {
    heading: 'Instruments',
    number: 'No.',
    name: 'Instrument',
    resolution: 'Resolution',
    certificate: 'Certificate',
    calibrated: 'Calibrated',
    due: 'Due',
    uncertainty: 'Uncertainty',
  },
  summary: {
    heading: 'Summary',
    number: 'No.',
    test: 'Test',
    asFound: 'as found',
    asLeft: 'as left',
    tolerance: 'T, mm',
    verdict: 'Verdict',
    remark: 'remark',
    linkedSign: '=',
    linkedNote: '= : as left is as found; nothing was done.',
    asFoundOut: 'A mark before a figure as found: it was not within tolerance.',
  },
  counts: {
    heading: 'Counts',
    planned: 'planned',
    judged: 'judged',
    within: 'within tolerance',
    out: 'out of tolerance',
    undecided: 'undecided',
    forInformation: 'for information',
    leftOut: 'left out',
    notMeasured: 'not measured',
  },
  notInPlan: { heading: 'Not in the plan', test: 'Test', reason: 'Reason' },
  block: {
    photos: 'Photos',
    photo: 'Photo',
    setUp: 'Set-up',
    result: 'Result',
    judged: 'Judged',
    tolerance: 'Tolerance',
    source: 'Source',
    direction: 'Direction',
    instruments: 'Instruments',
    figures: 'Figures',
    local: 'Local',
    limit: 'limit',
    margin: 'to the limit',
    over: 'over',
    remark: 'Remark',
    leftOut: 'Left out',
    corrected: 'Corrected readings',
    reading: 'Reading',
    was: 'was',
    now: 'now',
    by: 'by',
    at: 'at',
    reason: 'reason',
    noResult: 'no result',
  },
  remarks: {
    heading: 'Remarks and points',
    number: 'No.',
    test: 'Test',
    text: 'Remark',
    owner: 'Who',
    due: 'Due',
    closed: 'Closed',
    open: 'open',
  },
  signatures: { heading: 'Signatures', unsigned: 'not signed yet', reason: 'reason' },
  statement: 'Statement',
  monthNames: [
    'January',
    'February',
    'March',
    'April',
    'May',
    'June',
    'July',
    'August',
    'September',
    'October',
    'November',
    'December',
  ],
  to: 'to',
} as const;
