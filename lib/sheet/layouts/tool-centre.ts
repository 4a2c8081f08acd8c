import type { Cells, Field, FieldTable, PlotSeries, SheetFields } from '@/lib/sheet/types';
import type { Assembled, LayoutEngine, LayoutOf, SheetValues } from './layout-engine';
import {
  all,
  choiceField,
  chosen,
  noBracketSag,
  readingField,
  rowsToOffer,
  sagField,
  sagNote,
  setUpField,
  surfaceOptions,
  upField,
} from './parts';
import { SWEEP_ANGLES } from './swept-sections';

type ToolCentre = LayoutOf<'tool-centre'>;

const MAX_RADII = 6;
const sweepAt = (angle: string) => `/sweep/${angle}`;
const radius = (k: number) => `/radii/${k}`;
const forms = [
  { value: 'sweep', label: 'swept from the spindle' },
  { value: 'heights', label: 'two heights from one base' },
];

function fields(layout: ToolCentre, cells: Cells): SheetFields {
  const bySweep = chosen(cells, '/form', layout.form) !== 'heights';
  const radii = rowsToOffer(cells, (k) => [radius(k)], MAX_RADII);
  const table: FieldTable = bySweep
    ? oneRow(SWEEP_ANGLES.map((angle) => [`${angle}°`, readingField(sweepAt(angle), `spindle at ${angle}°`)]))
    : oneRow([
        ['tool hole', readingField('/toolHeight', 'height of the mandrel in the tool hole')],
        ['spindle', readingField('/spindleHeight', 'height of the mandrel in the spindle')],
      ]);
  return {
    setUp: [
      choiceField('/form', 'how it was taken', forms),
      ...(bySweep ? [choiceField('/surface', 'swept surface', surfaceOptions), sagField, upField] : []),
      ...Array.from({ length: radii }, (_, k) =>
        setUpField(radius(k), `radius ${k + 1} for the effect on the diameter`, 'mm', true),
      ),
    ],
    tables: [table],
    order: bySweep ? SWEEP_ANGLES.map(sweepAt) : ['/toolHeight', '/spindleHeight'],
  };
}

function oneRow(columns: [string, Field][]): FieldTable {
  return {
    title: null,
    columns: columns.map(([label]) => ({ label, unit: 'µm' })),
    rows: [{ label: 'reading', cells: columns.map(([, field]) => ({ field })) }],
  };
}

function assemble(layout: ToolCentre, values: SheetValues): Assembled {
  const radii = Array.from({ length: MAX_RADII }, (_, k) => values.get(radius(k))).filter(
    (value) => value !== undefined,
  );
  const form = values.get('/form') ?? layout.form;
  const common = { basedOn: null, lengthMm: null, form };
  const effect = radii.length ? { radii } : {};
  if (form === 'heights') {
    const heights = all(values, ['/toolHeight', '/spindleHeight']);
    if (!heights) return { input: null, reason: 'Both heights are needed, of the tool hole and of the spindle.' };
    const [toolHeight, spindleHeight] = heights;
    return { ...common, input: { method: 'centre-height', toolHeight, spindleHeight, ...effect }, notes: [] };
  }
  const sweep = all(values, SWEEP_ANGLES.map(sweepAt));
  if (!sweep) return { input: null, reason: 'The readings at 0°, 90°, 180° and 270° are needed.' };
  const sag = values.get('/sag');
  const up = values.get('/up');
  return {
    ...common,
    input: {
      method: 'centre-height',
      surface: values.get('/surface') ?? layout.surface,
      ...(sag === undefined ? {} : { sag }),
      ...(up === undefined ? {} : { up }),
      sweep: Object.fromEntries(SWEEP_ANGLES.map((angle, k) => [angle, sweep[k]!])),
      ...effect,
    },
    notes: sagNote(values, '/sag', noBracketSag),
  };
}

function plot(layout: ToolCentre, values: SheetValues): PlotSeries | null {
  if ((values.get('/form') ?? layout.form) !== 'sweep') return null;
  const points = SWEEP_ANGLES.flatMap((x) => {
    const y = values.get(sweepAt(x));
    return y === undefined ? [] : [{ x, y }];
  });
  return points.length ? { kind: 'polar', xLabel: 'spindle angle, °', yLabel: 'reading, µm', points } : null;
}

export const toolCentre: LayoutEngine<ToolCentre> = { fields, assemble, plot };
