import type { Field, FieldTable, SheetFields } from '@/lib/sheet/types';
import type { Unit } from '@/lib/units/unit';

/**
 * Fields of a method that no sheet holds: helpers and corrections. A field's address is again its place in the input, so that the
 * input is put together from what is filled. `numberless`: a word, not a figure.
 */
export interface FieldForm {
  setUp: Field[];
  rows?: {
    title: string;
    maximum: number;
    columns: { name: (row: number) => string; field: Omit<Field, 'pointer'> }[];
  };
  begin: Record<string, string>;
}

const figure = (pointer: string, label: string, unit: Unit | null, optional = false): Field => ({
  pointer,
  role: 'reading',
  unit,
  label,
  ...(optional ? { optional } : {}),
});
const words = (pointer: string, label: string, options: Record<string, string>, optional = false): Field => ({
  pointer,
  role: 'choice',
  unit: null,
  label,
  options: Object.entries(options).map(([value, said]) => ({ value, label: said })),
  ...(optional ? { optional } : {}),
});

const basis = words('/basis', 'Figures are', { radius: 'ways of the slide (radius)', diameter: 'diameters' });
const feedFields = (at: string, name: string) => [
  figure(`/${at}/present`, `${name}: present value, counts`, null, true),
  figure(`/${at}/lostMotion`, `${name}: lost motion found`, 'µm', true),
];
const collars = [figure('/D1', 'D1, near the headstock', 'mm'), figure('/D2', 'D2, far collar', 'mm')];

const fieldForms: Record<string, FieldForm> = {
  uncertainty: {
    setUp: [words('/coverage', 'Coverage', { '0.95': '95 %', '0.99': '99 %' })],
    rows: {
      title: 'Components, all in one unit',
      maximum: 20,
      columns: [
        { name: (row) => `/components/${row}/name`, field: { role: 'set-up', unit: null, label: 'name' } },
        { name: (row) => `/components/${row}/value`, field: { role: 'reading', unit: null, label: 'value' } },
        {
          name: (row) => `/components/${row}/distribution`,
          field: {
            role: 'choice',
            unit: null,
            label: 'shape',
            options: [
              { value: 'normal', label: 'normal' },
              { value: 'rectangular', label: 'rectangular' },
              { value: 'triangular', label: 'triangular' },
              { value: 'u-shaped', label: 'u-shaped' },
            ],
          },
        },
        {
          name: (row) => `/components/${row}/divisor`,
          field: { role: 'reading', unit: null, label: 'divisor', optional: true },
        },
        {
          name: (row) => `/components/${row}/sensitivity`,
          field: { role: 'reading', unit: null, label: 'sensitivity', optional: true },
        },
        {
          name: (row) => `/components/${row}/degreesOfFreedom`,
          field: { role: 'reading', unit: null, label: 'degrees of freedom', optional: true },
        },
      ],
    },
    begin: { '/coverage': '0.95' },
  },
  conformity: {
    setUp: [
      figure('/deviation', 'Figure', 'µm'),
      words('/signed', 'Its sign', { true: 'says something', false: 'there is none, it is an amount' }),
      figure('/tolerance', 'Tolerance', 'µm'),
      words('/direction', 'Permitted', {
        either: 'to either side',
        'concave-only': 'concave only',
        'convex-only': 'convex only',
        'rising-to-free-end': 'rising to the free end',
        'toward-tool': 'toward the tool',
        'tailstock-high': 'tailstock high',
      }),
      words('/rule', 'Decision rule', { simple: 'simple acceptance', guarded: 'guarded acceptance' }),
      figure('/standardUncertainty', 'Standard uncertainty u', 'µm', true),
      words('/guard', 'Guard band', { '1.65u': '1.65 · u', U: 'U = 2 · u' }),
    ],
    begin: { '/signed': 'true', '/direction': 'either', '/rule': 'simple', '/guard': '1.65u' },
  },
  rounding: {
    setUp: [
      figure('/value', 'Figure', null),
      figure('/resolution', 'Step', null),
      words('/rule', 'A tie', {
        'half-even': 'goes to the even multiple',
        'half-away-from-zero': 'goes away from zero',
      }),
    ],
    begin: { '/rule': 'half-even' },
  },
  tolerance: {
    setUp: [
      figure('/base', 'Tolerance as given', 'µm'),
      figure('/baseLength', 'for a length of', 'mm'),
      figure('/length', 'Measured length', 'mm'),
      figure('/minimum', 'Never below', 'µm', true),
      figure('/maximum', 'Never above', 'µm', true),
    ],
    begin: { '/minimum': '5' },
  },
  'correction-lost-motion': {
    setUp: [
      figure('/unit', 'One count of the control', 'µm'),
      words('/basis', 'Its value counts on', { radius: 'radius', diameter: 'diameter' }),
      ...feedFields('cuttingFeed', 'Cutting feed'),
      ...feedFields('rapid', 'Rapid'),
      figure('/limit', 'Mechanics first above', 'µm', true),
    ],
    begin: { '/unit': '1', '/basis': 'radius', '/limit': '20' },
  },
  'correction-reference-shift': {
    setUp: [
      figure('/target', 'Should show', 'mm'),
      figure('/found', 'Shows', 'mm'),
      basis,
      words('/controlFactor', 'The control counts', {
        '1': 'as way of the slide (factor 1)',
        '2': 'on the diameter (factor 2)',
      }),
    ],
    begin: { '/basis': 'radius', '/controlFactor': '1' },
  },
  'correction-pitch-table': {
    setUp: [
      figure('/referencePosition', 'Axis is referenced at', 'mm'),
      figure('/start', 'First point of the table', 'mm'),
      figure('/end', 'End of the table', 'mm'),
      figure('/interval', 'Distance of the points', 'mm'),
      figure('/unit', 'One count of the control', 'µm'),
      words('/form', 'Values are', { absolute: 'absolute', incremental: 'incremental' }),
    ],
    rows: {
      title: 'Mean deviations of the positioning test',
      maximum: 60,
      columns: [
        { name: (row) => `/positions/${row}`, field: { role: 'set-up', unit: 'mm', label: 'position' } },
        { name: (row) => `/means/${row}`, field: { role: 'reading', unit: 'µm', label: 'mean of both directions' } },
      ],
    },
    begin: { '/unit': '1', '/form': 'absolute' },
  },
  'correction-two-jack-points': {
    setUp: [figure('/slopeChange', 'Slope to be changed by', 'µm/m'), figure('/span', 'Distance of the points', 'mm')],
    begin: {},
  },
  'correction-pivot-and-push-screw': {
    setUp: [figure('/slope', 'Slope found', 'µm/m'), figure('/distance', 'Pivot to screw', 'mm')],
    begin: {},
  },
  'correction-shim': { setUp: [figure('/heightError', 'Height error, too high positive', 'µm')], begin: {} },
  'correction-turret-parallel-and-centre': {
    setUp: [
      figure('/slope', 'Slope found', 'µm/m'),
      figure('/height', 'Height error', 'µm'),
      figure('/heightPosition', 'Height was read at', 'mm'),
      figure('/jackA', 'Jack point A at', 'mm'),
      figure('/jackB', 'Jack point B at', 'mm'),
    ],
    begin: {},
  },
  'correction-headstock-for-taper': {
    setUp: [...collars, figure('/length', 'Collar to collar', 'mm'), figure('/distance', 'Pivot to screw', 'mm')],
    begin: {},
  },
  'correction-mandrel-sag': {
    setUp: [
      figure('/length', 'Free length', 'mm'),
      figure('/diameter', 'Diameter', 'mm'),
      figure('/at', 'Wanted at, else at the end', 'mm', true),
      figure('/density', 'Density, kg/m³, else 7850', null, true),
      figure('/modulus', 'Modulus, GPa, else 206', null, true),
    ],
    begin: {},
  },
};

/** The form of a helper or correction, by what its input says of itself; null: the method is taken on a sheet. */
export function fieldFormOf(input: { method: string; kind?: unknown }): FieldForm | null {
  const key = input.method === 'correction' ? `correction-${String(input.kind)}` : input.method;
  return fieldForms[key] ?? null;
}

/** The fields as they are drawn: rows that hold something, and one more. */
export function formFields({ setUp, rows }: FieldForm, filled: (pointer: string) => boolean): SheetFields {
  if (!rows) return { setUp, tables: [], order: setUp.map(({ pointer }) => pointer) };
  const all = Array.from({ length: rows.maximum }, (_, row) => row);
  const last = all.findLast((row) => rows.columns.some(({ name }) => filled(name(row)))) ?? -1;
  const table: FieldTable = {
    title: rows.title,
    columns: rows.columns.map(({ field }) => ({ label: field.label, unit: field.unit })),
    rows: all.slice(0, last + 2).map((row) => ({
      label: `${row + 1}`,
      cells: rows.columns.map(({ name, field }) => ({
        field: { ...field, pointer: name(row), label: `${field.label}, row ${row + 1}` },
      })),
    })),
  };
  return { setUp, tables: [table], order: [] };
}
