import { PERMISSIBLE_DIRECTIONS } from '@/lib/evaluation';
import { DIRECTION_WORDS } from '@/lib/reporting/words';
import type { Unit } from '@/lib/units/unit';

export interface ListField {
  pointer: string;
  label: string;
  unit: Unit | null;
  kind: 'figure' | 'text' | 'choice' | 'yes-no';
  optional?: true;
  /** The first one holds while nothing is chosen. */
  options?: { value: string; label: string }[];
}

/** Fields of a helper or a correction: single ones, and where it takes several of a kind, rows of them. */
export interface FieldList {
  fields: ListField[];
  rows?: {
    title: string;
    least: number;
    columns: (Omit<ListField, 'pointer'> & { at: [before: string, after: string] })[];
  };
}

const figure = (pointer: string, label: string, unit: Unit | null = null): ListField => ({
  ...{ pointer, label, unit },
  kind: 'figure',
});
const optional = (field: ListField): ListField => ({ ...field, optional: true });
const choice = (pointer: string, label: string, options: [value: string, label: string][]): ListField => ({
  ...{ pointer, label, unit: null, kind: 'choice' },
  options: options.map(([value, words]) => ({ value, label: words })),
});
const yesNo = (pointer: string, label: string): ListField => ({
  ...choice(pointer, label, [
    ['false', 'no'],
    ['true', 'yes'],
  ]),
  kind: 'yes-no',
});

const basis = (label: string) =>
  choice('/basis', label, [
    ['radius', 'radius'],
    ['diameter', 'diameter'],
  ]);
const D1 = figure('/D1', 'D1, diameter near the headstock', 'mm');
const D2 = figure('/D2', 'D2, diameter of the far collar', 'mm');
const slope = figure('/slope', 'slope, the error', 'µm/m');
const feed = (name: string, words: string) => [
  optional(figure(`/${name}/present`, `${words}: present value, counts`)),
  optional(figure(`/${name}/lostMotion`, `${words}: lost motion found`, 'µm')),
];

/** By the address of the guide. */
export const fieldLists: Record<string, FieldList> = {
  tolerance: {
    fields: [
      figure('/base', 'tolerance as given', 'µm'),
      figure('/baseLength', 'over a length of', 'mm'),
      figure('/length', 'length really measured', 'mm'),
      optional(figure('/minimum', 'floor', 'µm')),
      optional(figure('/maximum', 'at most', 'µm')),
    ],
  },
  conformity: {
    fields: [
      figure('/deviation', 'figure that is judged', 'µm'),
      yesNo('/signed', 'its sign says something'),
      figure('/tolerance', 'tolerance', 'µm'),
      choice(
        '/direction',
        'it may lie',
        PERMISSIBLE_DIRECTIONS.map((value) => [value, DIRECTION_WORDS[value]]),
      ),
      choice('/rule', 'decision rule', [
        ['simple', 'simple acceptance'],
        ['guarded', 'guarded acceptance'],
      ]),
      optional(figure('/standardUncertainty', 'standard uncertainty', 'µm')),
      choice('/guard', 'guard band', [
        ['1.65u', '1.65·u'],
        ['U', 'U = 2·u'],
      ]),
    ],
  },
  uncertainty: {
    fields: [
      choice('/coverage', 'coverage', [
        ['0.95', '95 %'],
        ['0.99', '99 %'],
      ]),
    ],
    rows: {
      title: 'Parts of the uncertainty, all in one unit',
      least: 1,
      columns: [
        { at: ['/components/', '/name'], label: 'part', unit: null, kind: 'text' },
        { at: ['/components/', '/value'], label: 'half-width, or u', unit: null, kind: 'figure' },
        {
          ...{ at: ['/components/', '/distribution'], label: 'distribution', unit: null, kind: 'choice' },
          options: ['normal', 'rectangular', 'triangular', 'u-shaped'].map((value) => ({ value, label: value })),
        },
        { at: ['/components/', '/divisor'], label: 'divisor', unit: null, kind: 'figure', optional: true },
        { at: ['/components/', '/sensitivity'], label: 'sensitivity', unit: null, kind: 'figure', optional: true },
        {
          ...{ at: ['/components/', '/degreesOfFreedom'], label: 'degrees of freedom', unit: null },
          ...{ kind: 'figure', optional: true },
        },
      ],
    },
  },
  rounding: {
    fields: [
      figure('/value', 'figure'),
      figure('/resolution', 'step'),
      choice('/rule', 'a tie goes', [
        ['half-even', 'to the even multiple'],
        ['half-away-from-zero', 'away from zero'],
      ]),
    ],
  },
  'correct-lost-motion': {
    fields: [
      figure('/unit', 'one count of the control is worth', 'µm'),
      basis('the control’s value counts in'),
      ...feed('cuttingFeed', 'cutting feed'),
      ...feed('rapid', 'rapid'),
      optional(figure('/limit', 'look at the mechanics first above', 'µm')),
    ],
  },
  'correct-reference': {
    fields: [
      figure('/target', 'where it should be', 'mm'),
      figure('/found', 'where it was found', 'mm'),
      basis('these figures are'),
      choice('/controlFactor', 'the control counts its shift', [
        ['1', 'as way of the slide (1)'],
        ['2', 'on the diameter (2)'],
      ]),
    ],
  },
  'correct-pitch': {
    fields: [
      figure('/referencePosition', 'position where the table is zero', 'mm'),
      figure('/start', 'first point', 'mm'),
      figure('/end', 'last point', 'mm'),
      figure('/interval', 'distance of the points', 'mm'),
      figure('/unit', 'one count of the control is worth', 'µm'),
      choice('/form', 'the control wants', [
        ['absolute', 'absolute values'],
        ['incremental', 'incremental values'],
      ]),
    ],
    rows: {
      title: 'Means of the positioning test',
      least: 2,
      columns: [
        { at: ['/positions/', ''], label: 'target', unit: 'mm', kind: 'figure' },
        { at: ['/means/', ''], label: 'mean of both ways', unit: 'µm', kind: 'figure' },
      ],
    },
  },
  'correct-jacks': {
    fields: [
      figure('/slopeChange', 'change of slope, + raises B against A', 'µm/m'),
      figure('/span', 'distance of the points', 'mm'),
    ],
  },
  'correct-pivot': { fields: [slope, figure('/distance', 'from pivot to screw', 'mm')] },
  'correct-shim': { fields: [figure('/heightError', 'error of height, + is too high', 'µm')] },
  'correct-turret': {
    fields: [
      slope,
      figure('/height', 'error of height', 'µm'),
      figure('/heightPosition', 'position where the height was read', 'mm'),
      figure('/jackA', 'position of jack point A', 'mm'),
      figure('/jackB', 'position of jack point B', 'mm'),
    ],
  },
  'correct-taper': {
    fields: [
      D1,
      D2,
      figure('/length', 'from collar to collar', 'mm'),
      figure('/distance', 'from pivot to screw', 'mm'),
    ],
  },
  'mandrel-sag': {
    fields: [
      figure('/length', 'free length', 'mm'),
      figure('/diameter', 'diameter', 'mm'),
      optional(figure('/at', 'at a place from the clamped end (left empty: at the end)', 'mm')),
      optional(figure('/density', 'density, kg/m³ (left empty: 7850)')),
      optional(figure('/modulus', 'modulus of elasticity, GPa (left empty: 206)')),
    ],
  },
};
