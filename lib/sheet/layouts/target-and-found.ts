import type { SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import { all, choiceField, readingField } from './parts';

type TargetAndFound = LayoutOf<'target-and-found'>;

const rows = [
  { pointer: '/target', label: 'where it should be' },
  { pointer: '/found', label: 'where it was found' },
];

function fields(): SheetFields {
  return {
    setUp: [
      choiceField('/basis', 'the figures are', [
        { value: 'radius', label: 'way of the slide (radius)' },
        { value: 'diameter', label: 'diameters' },
      ]),
      choiceField('/controlFactor', 'the control counts its shift', [
        { value: '1', label: 'as way of the slide (factor 1)' },
        { value: '2', label: 'on the diameter (factor 2)' },
      ]),
    ],
    tables: [
      {
        title: null,
        columns: [{ label: 'figure', unit: 'mm' }],
        rows: rows.map(({ pointer, label }) => ({ label, cells: [{ field: readingField(pointer, label, 'mm') }] })),
      },
    ],
    order: rows.map(({ pointer }) => pointer),
  };
}

function assemble(layout: TargetAndFound, values: SheetValues): Assembled {
  const both = all(values, ['/target', '/found']);
  if (!both) return { input: null, reason: 'Both figures are needed: where it should be and where it was found.' };
  const basis = values.get('/basis') ?? layout.basis;
  if (!basis) return { input: null, reason: 'Choose whether the figures are ways of the slide or diameters.' };
  const controlFactor = values.get('/controlFactor');
  const [target, found] = both;
  return {
    input: {
      method: 'reference-shift',
      target,
      found,
      basis,
      ...(controlFactor === undefined ? {} : { controlFactor }),
    },
    basedOn: null,
    lengthMm: null,
    notes: [],
  };
}

export const targetAndFound: LayoutEngine<TargetAndFound> = { fields, assemble, plot: () => null };
