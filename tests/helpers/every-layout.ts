import { exampleSheet } from '@/lib/planning/example-sheet';
import { buildReportModel } from '@/lib/reporting/build-report-model';
import type { ReportModel } from '@/lib/reporting/report-model';
import type { StoredJob, StoredPass, StoredSheet } from '@/lib/reporting/stored-job';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { allFields, sheetFields } from '@/lib/sheet/sheet-fields';
import type { Cells, Field } from '@/lib/sheet/types';
import { currentDefinitions } from '@/standards/registry';
import type { TestDefinition } from '@/standards/types';
import { sampleReportModel } from './sample-report-model';

/** One test of the catalogue for each way to lay out a sheet. */
export const oneOfEachLayout = (): TestDefinition[] => [
  ...new Map(
    currentDefinitions()
      .filter((definition) => exampleSheet(definition) !== null)
      .reverse()
      .map((definition) => [definition.layout.kind, definition]),
  ).values(),
];

/** A reading of its own in every field: a slow wave with a little noise on it, negative ones among them. */
function typed(field: Field, k: number, amount: number): string {
  if (field.options) return field.options[0]!.value;
  if (field.pointer.startsWith('/D') || field.pointer.endsWith('/diameter'))
    return `30.${String(100 + (k % 9)).slice(1)}4`;
  return (Math.sin(k / 4) * amount + ((k * 7) % 5) / 10).toFixed(1);
}

/** Every reading of a sheet typed in, in the order in which it is taken; `amount` is how far they go. */
export function filledCells(definition: TestDefinition, setUp: Cells, amount: number): Cells {
  const fields = sheetFields(definition, setUp);
  const all = allFields(fields);
  const readings = fields.order.map((pointer, k) => {
    const field = all.find((one) => one.pointer === pointer)!;
    return [pointer, { text: typed(field, k, amount), unit: field.unit }] as const;
  });
  const { layout } = definition;
  // Figures of a function check stand beside its answers.
  const values = (layout.kind === 'check-list' ? layout.items : []).flatMap(({ id, value }) =>
    value ? [[`/items/${id}/value`, { text: value.lower ?? value.upper ?? '1', unit: null }] as const] : [],
  );
  return { ...setUp, ...Object.fromEntries([...readings, ...values]) };
}

/** The definition as a sheet that was measured as found and as left. */
export function storedSheet(definition: TestDefinition, position: number, change: Cells = {}): StoredSheet {
  const { sheet } = exampleSheet(definition)!;
  const rules = {
    definition: sheet.definition,
    tolerance: sheet.tolerance,
    direction: sheet.direction,
    decisionRule: 'simple' as const,
  };
  const pass = (kind: StoredPass['kind'], amount: number): StoredPass => {
    const cells = { ...filledCells(definition, sheet.setUp, amount), ...change };
    const outcome = judgeSheet(rules, definition, cells);
    const judged = outcome.state === 'partial' || outcome.state === 'complete' ? outcome : null;
    return {
      id: `${position}-${kind}`,
      kind,
      number: 1,
      linkedTo: null,
      takenAt: new Date(`2026-03-1${kind === 'as-found' ? 0 : 2}T09:00:00Z`),
      takenBy: 'T. Orrell',
      temperature: '20.4',
      cells,
      instruments: [],
      result: judged && {
        state: judged.state,
        verdict: judged.judgement.verdict,
        displayedMm: judged.displayed.textMm,
        displayedUm: judged.displayed.textUm,
        outcome: judged,
      },
    };
  };
  return {
    id: `sheet-${position}`,
    position,
    key: sheet.key,
    definition: sheet.definition,
    ownDefinition: sheet.ownDefinition ?? (definition.id.startsWith('OWN-') ? definition : null),
    title: sheet.title,
    component: sheet.component,
    tolerance: sheet.tolerance,
    direction: sheet.direction,
    leftOutReason: null,
    leftOutText: null,
    remark: null,
    passes: [pass('as-found', 9), pass('as-left', 4)],
    photos: [],
  };
}

/** A job of such sheets. */
export function storedJob(sheets: StoredSheet[], change: Partial<StoredJob> = {}): StoredJob {
  return {
    job: {
      reference: 'QMF-2041',
      purpose: 'overhaul',
      scope: null,
      customerOrder: null,
      customerEngineer: null,
      decisionRule: 'simple',
      codes: [],
      startsOn: '2026-03-10',
      endsOn: '2026-03-12',
      place: null,
      hours: null,
      conditions: { warmUp: '60 min of axis and spindle exercise' },
      makeUp: startingMakeUps[0]!.makeUp,
      state: 'open',
    },
    people: [],
    temperatures: [{ measuredAt: new Date('2026-03-10T08:00:00Z'), air: '20.1', machine: '20.3' }],
    sheets,
    exclusions: [],
    instruments: [],
    ...change,
  };
}

/** The report of a stored job; document, people and organisation are those of the sample. */
export function reportOf(stored: StoredJob): ReportModel {
  const sample = sampleReportModel();
  return buildReportModel({
    stored,
    changes: [],
    machine: sample.machine,
    customerName: sample.customer.name,
    organisation: { ...sample.letterhead, timeZone: 'Europe/Berlin', paper: 'A4' },
    document: sample.document,
    inspector: { name: 'T. Orrell', at: '2026-03-12 16:00' },
    reviewer: null,
    remarks: [],
  });
}

const angles = (count: number, overDeg = 360) => Array.from({ length: count }, (_, k) => String((k * overDeg) / count));
const steps = (count: number, step: number) => Array.from({ length: count }, (_, k) => String(k * step));

/** Layouts as wide and as long as they come, on a test of the catalogue: made up for the page, no test of any code. */
export function widestLayouts(): TestDefinition[] {
  const base = currentDefinitions().find(({ layout }) => layout.kind === 'profile')!;
  const also = ['R', 'B', 'E'].map((figure) => ({
    figure,
    label: `further figure ${figure}`,
    tolerance: base.tolerance!,
  }));
  const made: Pick<TestDefinition, 'title' | 'layout' | 'method' | 'sketch'>[] = [
    {
      title: 'Positioning, ten targets and five runs both ways',
      method: 'positioning',
      layout: { kind: 'target-cycles', quantity: 'linear', cycles: 5, targets: steps(10, 50) },
      sketch: { scene: 'laser-along-motion' },
    },
    {
      title: 'Circle of 36 angles both ways',
      method: 'circular',
      layout: { kind: 'circle-trace', anglesDeg: angles(36), nominalRadiusMm: '100', arcDeg: '360' },
      sketch: { scene: 'circular-gauge' },
    },
    {
      title: 'Axis of rotation, twenty turns',
      method: 'axis-of-rotation',
      layout: { kind: 'rotation-turns', turns: 20, anglesDeg: angles(12), direction: 'radial' },
      sketch: { scene: 'spindle-sensors' },
    },
    {
      title: 'Indexing of twelve stations with long names',
      method: 'indexing',
      layout: {
        kind: 'stations',
        stations: Array.from({ length: 12 }, (_, k) => `station ${k + 1}, driven tool`),
        repeats: 5,
        radiusMm: '100',
      },
      sketch: { scene: 'turret-index' },
    },
    {
      title: 'Flatness of a grid of 48 points',
      method: 'flatness',
      layout: { kind: 'grid', xMm: steps(8, 40), yMm: steps(6, 40), reference: 'minimum-zone' },
      sketch: { scene: 'level-steps' },
    },
    {
      title: 'Roundness at 72 angles',
      method: 'roundness',
      layout: { kind: 'round-trace', anglesDeg: angles(72), surface: 'outside' },
      sketch: { scene: 'test-piece-cylinder' },
    },
    {
      title: 'Drift over two hours',
      method: 'drift',
      layout: { kind: 'time-series', minutes: steps(25, 5), temperature: true },
      sketch: { scene: 'drift-at-tool' },
    },
    {
      title: 'Diameters of a turned cylinder',
      method: 'diameter-consistency',
      layout: { kind: 'diameters', positionsMm: steps(5, 30) },
      sketch: { scene: 'test-piece-cylinder' },
    },
    {
      title: 'Reference point, target and found',
      method: 'reference-shift',
      layout: { kind: 'target-and-found', basis: 'radius' },
      sketch: { scene: 'target-and-found' },
    },
  ];
  return made.map((own, k) => ({
    ...base,
    ...own,
    id: `OWN-${k}`,
    boundTitle: own.title,
    tolerance: { ...base.tolerance!, by: 'all', allUm: '25', steps: undefined, local: undefined },
    ...(own.method === 'positioning'
      ? {
          also: also.map((one) => ({
            ...one,
            tolerance: { ...one.tolerance, by: 'all' as const, allUm: '9', steps: undefined, local: undefined },
          })),
        }
      : {}),
  }));
}

/** A function check with figures, limits and remarks. */
export function functionCheck(): TestDefinition {
  const base = currentDefinitions().find(({ layout }) => layout.kind === 'profile')!;
  return {
    ...base,
    id: 'OWN-CHECK',
    title: 'Safety and supplies before the first movement',
    boundTitle: 'Safety and supplies before the first movement',
    method: 'function-check',
    appliesTo: { kind: 'machine' },
    dependsOn: { components: [], moved: [], positioned: [] },
    setUpTogether: undefined,
    tolerance: null,
    shownIn: 'items',
    judgedFigure: 'every item in order',
    sketch: { scene: 'checklist' },
    layout: {
      kind: 'check-list',
      items: [
        { id: 'stop', question: 'Every emergency stop stops every movement.' },
        { id: 'door', question: 'The door cannot be opened while the spindle turns.' },
        {
          id: 'air',
          question: 'The compressed air has its pressure behind the filter.',
          value: { label: 'pressure', unit: 'bar', lower: '4', upper: '6' },
        },
        { id: 'bush', question: 'The guide bush is lubricated.' },
        { id: 'lamp', question: 'The working light comes on.' },
      ],
    },
  };
}
