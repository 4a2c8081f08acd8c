import type { PassBlock, ReportModel, SummaryRow, TestBlock } from '@/lib/reporting/report-model';
import type { PlotSeries, Verdict } from '@/lib/sheet/types';
import type { SketchSpec } from '@/standards/types';

/** Invented companies, people, machine and figures; the shape of a whole report with every section filled. */
export function sampleReportModel(change: Partial<ReportModel> = {}): ReportModel {
  const blocks = sampleBlocks();
  return {
    schemaVersion: 1,
    language: 'en',
    paper: 'A4',
    document: {
      number: 'QMF-2026-000214',
      revision: 1,
      state: 'signed-with-remarks',
      issuedAt: '2026-03-12T11:30:00+01:00',
      issuedBy: 'J. Penhale',
      checkedBy: 'J. Penhale',
      programVersion: '0.1.0',
    },
    letterhead: {
      name: 'Quillmere Machine Fitting',
      addressLines: ['Unit 4, Tarn Road', 'Quillmere'],
      contact: 'office@quillmere.example · +00 1632 960 214',
    },
    machine: {
      manufacturer: 'Larkfield',
      model: 'SL-32 II',
      serialNumber: 'LK32-0O81-B',
      year: 2011,
      control: 'Ferrand TC-4',
      hours: '38412',
      kind: 'turning centre with sub-spindle and two turrets',
      sizeClass: 'nominal bar diameter 32 mm',
      site: 'Ashdown works, bay 3',
      components: [
        { id: 'S1', what: 'main spindle, channel 1' },
        { id: 'S2', what: 'sub-spindle, channel 2' },
        { id: 'T1', what: 'turret, 12 stations, X1 Y1 Z1, channel 1' },
        { id: 'T2', what: 'turret, 8 stations, X2 Z2, channel 2', condition: 'removed and refitted, casting scraped' },
        { id: 'Z1', what: 'axis Z1, travel 500 mm' },
      ],
    },
    customer: { name: 'Ashdown Turned Parts', engineer: 'C. Vale', order: '7714' },
    job: {
      reference: 'QMF-2041',
      purpose: 'after overhaul',
      scope: 'ball screws X1 and X2 replaced, casting of T2 removed and refitted, everything else untouched',
      from: '2026-03-10',
      to: '2026-03-12',
      codes: ['ISO 13041-1:2020', 'ISO 230-1:2012'],
      decisionRule: 'simple acceptance, uncertainty stated',
      people: [
        { name: 'T. Orrell', role: 'inspector' },
        { name: 'J. Penhale', role: 'reviewer' },
      ],
    },
    conditions: {
      place: 'Ashdown works, bay 3',
      lines: [
        {
          label: 'Warm-up',
          value: 'day 1 cold drift run, then 60 min of axis and spindle exercise; days 2 and 3: 30 min',
        },
        { label: 'Compensation', value: 'lost-motion values active; thermal compensation off' },
        { label: 'Level', value: 'within 0.02 mm/m, checked on day 1' },
      ],
      temperatures: [
        { at: '2026-03-10 07:30', air: '18.4', machine: '18.5' },
        { at: '2026-03-10 10:00', air: '19.6', machine: '19.1' },
        { at: '2026-03-10 14:00', air: '20.9', machine: '20.7' },
        { at: '2026-03-11 08:00', air: '18.9', machine: '19.2' },
        { at: '2026-03-12 08:00', air: '19', machine: null },
      ],
      airRange: 'air 18.4 to 20.9 °C',
    },
    instruments: [
      instrument(
        'IN-01',
        'digital lever indicator',
        '1 µm',
        'HR-5521',
        '2025-09-29',
        '2026-09-30',
        'U = 1.6 µm, k = 2',
      ),
      instrument(
        'IN-03',
        'test mandrel ⌀40 × 300 with spindle taper',
        null,
        'HR-5188',
        '2025-01-31',
        '2027-01-31',
        'U = 1 µm, k = 2',
      ),
      {
        ...instrument(
          'IN-04',
          'granite square 250 × 160',
          null,
          'HR-4967',
          '2024-03-11',
          '2026-03-10',
          'U = 1.5 µm, k = 2',
        ),
        override:
          'test 8: used after its due date, allowed by J. Penhale: new certificate on its way, square compared with IN-07',
      },
    ],
    headline:
      '20 of 21 judged tests within tolerance; 1 out of tolerance, accepted with remark; 1 left out by agreement.',
    counts: {
      asFound: {
        planned: 23,
        within: 15,
        out: 6,
        undecided: 0,
        forInformation: 1,
        leftOut: 1,
        notMeasured: 0,
        judged: 21,
      },
      asLeft: {
        planned: 23,
        within: 20,
        out: 1,
        undecided: 0,
        forInformation: 1,
        leftOut: 1,
        notMeasured: 0,
        judged: 21,
      },
    },
    summary: blocks.map(summaryRow),
    notInPlan: [{ title: 'Tailstock quill parallel to Z', reason: 'not applicable: the machine has no tailstock' }],
    blocks,
    remarks: [
      {
        no: 1,
        sheetOrder: 8,
        text: 'Y1 against X1 is 0.04 µm over its limit; the customer accepts it until the guideway is scraped at the next stop.',
        owner: 'T. Orrell',
        due: '2026-09-30',
        closed: null,
      },
    ],
    signatures: [
      signature(
        'inspector',
        'Inspector',
        'T. Orrell',
        'field service',
        'Quillmere Machine Fitting',
        'measured',
        'T. Orrell',
      ),
      signature(
        'reviewer',
        'Checked by',
        'J. Penhale',
        'lead engineer',
        'Quillmere Machine Fitting',
        'checked',
        'J. Penhale',
      ),
      {
        ...signature(
          'customer',
          'Customer',
          'C. Vale',
          'production',
          'Ashdown Turned Parts',
          'accepted with remarks',
          null,
        ),
        reason: null,
        strokes: [
          'M40 140C80 20 120 20 130 120C150 170 170 60 200 70C230 80 210 150 250 130C290 100 300 60 330 110',
          'M330 110L420 60L400 150L520 80',
        ],
      },
    ],
    statement:
      'The verdicts hold for the machine, the set-ups and the conditions recorded here. They replace no legal inspection. Tolerances from memory are named as such.',
    ...change,
  };
}

/** One test after another with names and orders of their own, for reports of any length. */
export function manyBlocks(count: number): TestBlock[] {
  const blocks = sampleBlocks();
  return Array.from({ length: count }, (_, index) => ({
    ...(blocks[index % blocks.length] as TestBlock),
    order: index + 1,
  }));
}

export function summaryRow(block: TestBlock): SummaryRow {
  const of = (kind: PassBlock['kind']) => block.passes.find((pass) => pass.kind === kind);
  const toleranceUm = block.passes.at(-1)?.judgement?.toleranceUm ?? null;
  return {
    order: block.order,
    key: `${block.reference.split(' ')[0]}:${block.order}`,
    title: block.title,
    component: block.componentWords,
    asFound: of('as-found')?.resultMm ?? null,
    asFoundUm: of('as-found')?.resultUm?.replace('−', '-') ?? null,
    asFoundVerdict: of('as-found')?.judgement?.verdict ?? null,
    asLeft: of('as-left')?.resultMm ?? null,
    asLeftUm: of('as-left')?.resultUm?.replace('−', '-') ?? null,
    asLeftVerdict: of('as-left')?.judgement?.verdict ?? null,
    linked: of('as-left')?.linkedWords != null,
    toleranceMm: toleranceUm && (Number(toleranceUm) / 1000).toFixed(3),
    leftOut: block.leftOut?.reason ?? null,
    remarkNo: block.remark ? 1 : null,
  };
}

function instrument(
  number: string,
  name: string,
  resolution: string | null,
  certificate: string,
  calibrated: string,
  due: string,
  uncertainty: string,
) {
  return { number, name, resolution, certificate, calibrated, due, uncertainty, override: null };
}

function signature(
  role: 'inspector' | 'reviewer' | 'customer',
  roleWords: string,
  name: string,
  functionTitle: string,
  company: string,
  outcome: string,
  typed: string | null,
): ReportModel['signatures'][number] {
  const signedAt = '2026-03-12T11:30:00+01:00';
  return {
    role,
    roleWords,
    name,
    function: functionTitle,
    company,
    signedAt,
    outcome,
    reason: null,
    typed,
    strokes: null,
  };
}

interface PassFigures {
  kind: PassBlock['kind'];
  resultUm: string;
  verdict: Verdict;
  words?: string | null;
  toleranceUm: string | null;
  marginUm: string | null;
  tables?: PassBlock['tables'];
  plot?: PlotSeries | null;
  more?: Partial<PassBlock>;
}

const KIND_WORDS = { 'as-found': 'as found', adjusting: 'adjusting 1', 'as-left': 'as left' };
const TAKEN = { 'as-found': '2026-03-10 10:55', adjusting: '2026-03-11 09:40', 'as-left': '2026-03-11 14:10' };

function pass(figures: PassFigures): PassBlock {
  const { kind, resultUm, verdict, words = null, toleranceUm, marginUm, tables = [], plot = null, more } = figures;
  return {
    kind,
    kindWords: KIND_WORDS[kind],
    takenAt: TAKEN[kind],
    by: 'T. Orrell',
    temperature: '20.1 °C',
    linkedWords: null,
    setUp: [],
    tables,
    resultMm: (Number(resultUm) / 1000).toFixed(4).replace('-', '−'),
    resultUm: resultUm.replace('-', '−'),
    resultWords: words,
    judgement: {
      verdict,
      signed: words !== null || resultUm.startsWith('-'),
      toleranceUm,
      toleranceArithmetic: null,
      limitUm: toleranceUm,
      marginUm,
      direction: 'either',
      local: null,
    },
    plot,
    figures: [],
    corrections: [],
    ...more,
  };
}

function block(
  order: number,
  reference: string,
  title: string,
  words: string,
  scene: SketchSpec['scene'],
  more: Partial<TestBlock>,
): TestBlock {
  return {
    order,
    reference,
    title,
    component: { spindle: 'S1', axis: 'Z1', turret: 'T1', plane: 'ZX' },
    componentWords: words,
    sketch: { scene, plane: 'ZX' },
    toleranceWords: '0.015 mm over 300 mm, never below 0.005 mm',
    toleranceSource:
      'from memory, to be confirmed: starter value, low confidence (size class 2: bar diameter 32 mm, over 25 up to 63)',
    directionWords: null,
    judgedFigure: 'slope of the fitted line over the measuring length',
    instruments: ['IN-01 digital lever indicator', 'IN-03 test mandrel ⌀40 × 300 with spindle taper'],
    cautions: ['Isolate before touching the mandrel.'],
    passes: [],
    leftOut: null,
    remark: null,
    ...more,
  };
}

const PLACES = ['0', '60', '120', '180', '240'];

function meansTable(at0: string[], at180: string[], means: string[]): PassBlock['tables'] {
  const rows = PLACES.map((place, index) => ({
    label: place,
    cells: [at0[index] ?? '', at180[index] ?? '', means[index] ?? ''],
  }));
  return [{ title: null, columns: ['z, mm', '0°, µm', '180°, µm', 'mean, µm'], rows }];
}

function line(means: string[], fit?: [string, string]): PlotSeries {
  const points = PLACES.map((x, index) => ({ x, y: (means[index] ?? '0').replace('−', '-') }));
  const ends = fit && { x1: '0', y1: fit[0], x2: '240', y2: fit[1] };
  return { kind: 'line', xLabel: 'z, mm', yLabel: 'reading, µm', points, ...(ends ? { fit: ends } : {}) };
}

function runOut(): { tables: PassBlock['tables']; plot: PlotSeries } {
  const insertions = [
    ['−1', '2', '5', '6', '3', '1', '−3', '−4'],
    ['2', '4', '4', '3', '1', '−2', '−3', '0'],
    ['1', '6', '6', '4', '−1', '−5', '−6', '−3'],
    ['−3', '2', '6', '5', '0', '−5', '−7', '−8'],
  ];
  const totals = ['10', '7', '12', '14'];
  const angles = Array.from({ length: 8 }, (_, index) => `${index * 45}`);
  const rows = angles.map((angle, index) => ({
    label: `${angle}°`,
    cells: insertions.map((readings) => readings[index] ?? ''),
  }));
  const points = insertions.flatMap((readings, insertion) =>
    readings.map((y, index) => ({
      x: angles[index] ?? '0',
      y: y.replace('−', '-'),
      series: `insertion ${insertion + 1}`,
    })),
  );
  return {
    tables: [
      {
        title: null,
        columns: insertions.map((_, index) => `insertion ${index + 1}, µm`),
        rows: [...rows, { label: 'total reading', cells: totals }],
      },
    ],
    plot: { kind: 'polar', xLabel: 'spindle angle, °', yLabel: 'reading, µm', points },
  };
}

function pairsPlot(forward: string[], backward: string[]): PlotSeries {
  const points = forward.flatMap((y, index) => [
    { x: `${index + 1}`, y, series: 'approach in +' },
    { x: `${index + 1}`, y: backward[index] ?? '0', series: 'approach in −' },
  ]);
  return { kind: 'pairs', xLabel: 'place: 1–3 cutting feed, 4–6 rapid', yLabel: 'mean reading, µm', points };
}

/** Ten tests with all kinds of passes, plots, verdicts and sketches. */
function sampleBlocks(): TestBlock[] {
  const bore = runOut();
  const found = ['0', '1.5', '3.5', '4.5', '6'];
  const left = ['0', '0.5', '2', '2.5', '4'];
  const corrected = {
    field: 'z 180 mm, spindle at 180°',
    was: '-35',
    now: '-3.5',
    by: 'T. Orrell',
    at: '2026-03-10 11:02',
    reason: 'typed without its decimal mark',
  };
  return [
    block(1, 'SP-1a · ISO 13041-1:2020', 'Nose run-out', 'spindle S1', 'spindle-nose', {
      sketch: { scene: 'spindle-nose', anglesDeg: ['0', '45', '90', '135', '180', '225', '270', '315'] },
      judgedFigure: 'total reading over one turn',
      passes: [
        pass({
          kind: 'as-found',
          resultUm: '3',
          verdict: 'within-tolerance',
          toleranceUm: '8',
          marginUm: '5',
          tables: [
            {
              title: null,
              columns: ['turn 1, µm'],
              rows: bore.tables[0]?.rows.map((row) => ({ label: row.label, cells: row.cells.slice(0, 1) })) ?? [],
            },
          ],
          plot: { ...bore.plot, points: bore.plot.points.slice(0, 8).map(({ x, y }) => ({ x, y })) },
        }),
        pass({
          kind: 'as-left',
          resultUm: '3',
          verdict: 'within-tolerance',
          toleranceUm: '8',
          marginUm: '5',
          more: { linkedWords: 'As left is as found: nothing was done that could change it.' },
        }),
      ],
    }),
    block(3, 'SP-2b · ISO 13041-1:2020', 'Bore run-out at 300 mm', 'spindle S1', 'spindle-bore-mandrel', {
      sketch: { scene: 'spindle-bore-mandrel', anglesDeg: ['0', '90', '180', '270'], atMm: '300' },
      judgedFigure: 'mean of four insertions',
      passes: [
        pass({
          kind: 'as-found',
          resultUm: '10.75',
          verdict: 'within-tolerance',
          toleranceUm: '20',
          marginUm: '9.25',
          ...bore,
          more: {
            figures: [
              { label: 'largest', value: '14 µm' },
              { label: 'spread', value: '7 µm' },
            ],
          },
        }),
        pass({
          kind: 'as-left',
          resultUm: '10.75',
          verdict: 'within-tolerance',
          toleranceUm: '20',
          marginUm: '9.25',
          more: { linkedWords: 'As left is as found: nothing was done that could change it.' },
        }),
      ],
    }),
    block(
      5,
      'AX-1a · ISO 13041-1:2020',
      'Z motion parallel to spindle axis, ZX',
      'axis Z1, spindle S1',
      'mandrel-along-motion',
      {
        sketch: {
          scene: 'mandrel-along-motion',
          anglesDeg: ['0', '180'],
          plane: 'ZX',
          positiveMeans: 'free end leans toward the tool',
        },
        passes: [
          pass({
            kind: 'as-found',
            resultUm: '31',
            verdict: 'out-of-tolerance',
            words: 'free end leans toward the tool',
            toleranceUm: '12',
            marginUm: '-19',
            tables: meansTable(
              ['0', '9', '17', '25', '33'],
              ['0', '7', '14', '21', '29'],
              ['0', '8', '15.5', '23', '31'],
            ),
            plot: line(['0', '8', '15.5', '23', '31'], ['0.2', '31']),
            more: { setUp: [{ label: 'measuring length', value: '240 mm' }], corrections: [corrected] },
          }),
          pass({
            kind: 'adjusting',
            resultUm: '18',
            verdict: 'out-of-tolerance',
            words: 'free end leans toward the tool',
            toleranceUm: '12',
            marginUm: '-6',
          }),
          pass({
            kind: 'as-left',
            resultUm: '4',
            verdict: 'within-tolerance',
            words: 'free end leans toward the tool',
            toleranceUm: '12',
            marginUm: '8',
            tables: meansTable(['0', '+1', '+3', '+4', '+6'], ['0', '0', '+1', '+1', '+2'], left),
            plot: line(left, ['-0.1', '3.8']),
            more: {
              setUp: [{ label: 'measuring length', value: '240 mm' }],
              figures: [
                { label: 'slope', value: '16.7 µm/m' },
                { label: 'range', value: '4 µm' },
              ],
              judgement: {
                verdict: 'within-tolerance',
                signed: true,
                toleranceUm: '12',
                toleranceArithmetic: '15·240/300 = 12, above the floor of 5',
                limitUm: '12',
                marginUm: '8',
                direction: 'either',
                local: null,
              },
            },
          }),
        ],
      },
    ),
    block(6, 'AX-5 · ISO 230-1:2012', 'Straightness of Z, ZX', 'axis Z1', 'straightedge-along-motion', {
      judgedFigure: 'minimum zone',
      passes: [
        pass({
          kind: 'as-found',
          resultUm: '3.4',
          verdict: 'within-tolerance',
          toleranceUm: '10',
          marginUm: '6.6',
          tables: [
            {
              title: null,
              columns: ['position, mm', 'reading, µm'],
              rows: Array.from({ length: 26 }, (_, i) => ({
                label: `${i * 20}`,
                cells: [`${['0', '0.4', '1.2', '0.8', '−0.6', '−1.4', '−2.2'][i % 7]}`],
              })),
            },
          ],
          plot: line(found),
        }),
        pass({
          kind: 'as-left',
          resultUm: '3.4',
          verdict: 'within-tolerance',
          toleranceUm: '10',
          marginUm: '6.6',
          more: { linkedWords: 'As left is as found: nothing was done that could change it.' },
        }),
      ],
    }),
    block(7, 'AX-2 · ISO 13041-1:2020', 'X square to spindle axis', 'axis X1, spindle S1', 'disc-across-motion', {
      component: { spindle: 'S1', axis: 'X1', plane: 'ZX' },
      sketch: { scene: 'disc-across-motion', anglesDeg: ['0', '180'], plane: 'ZX', positiveMeans: 'concave' },
      directionWords: 'concave only',
      passes: [
        pass({
          kind: 'as-found',
          resultUm: '-2.5',
          verdict: 'out-of-tolerance',
          words: 'convex',
          toleranceUm: '6.66666666666666666666666666667',
          marginUm: '-2.5',
          tables: meansTable(['0', '1', '1', '2', '2'], ['0', '1', '2', '2', '3'], ['0', '1', '1.5', '2', '2.5']),
          plot: line(['0', '1', '1.5', '2', '2.5']),
          more: {
            judgement: {
              verdict: 'out-of-tolerance',
              signed: true,
              toleranceUm: '6.66666666666666666666666666667',
              toleranceArithmetic: '20·100/300, cut off to 6.6',
              limitUm: '6.66666666666666666666666666667',
              marginUm: '-2.5',
              direction: 'concave-only',
              local: null,
            },
          },
        }),
        pass({
          kind: 'as-left',
          resultUm: '3.5',
          verdict: 'within-tolerance',
          words: 'concave',
          toleranceUm: '6.66666666666666666666666666667',
          marginUm: '3.16666666666666666666666666667',
          tables: meansTable(
            ['0', '−1', '−1', '−2', '−4'],
            ['0', '−1', '−2', '−3', '−3'],
            ['0', '−1', '−1.5', '−2.5', '−3.5'],
          ),
          plot: line(['0', '-1', '-1.5', '-2.5', '-3.5']),
          more: {
            judgement: {
              verdict: 'within-tolerance',
              signed: true,
              toleranceUm: '6.66666666666666666666666666667',
              toleranceArithmetic: '20·100/300, cut off to 6.6',
              limitUm: '6.66666666666666666666666666667',
              marginUm: '3.16666666666666666666666666667',
              direction: 'concave-only',
              local: null,
            },
          },
        }),
      ],
    }),
    block(8, 'AX-4 · ISO 13041-1:2020', 'Y square to X', 'axis Y1, axis X1', 'square-two-motions', {
      component: { axis: 'Y1', reference: 'X1', plane: 'XY' },
      sketch: { scene: 'square-two-motions', plane: 'XY', positiveMeans: 'angle above 90°' },
      remark: 'Accepted by C. Vale on 2026-03-12, see point 1.',
      passes: [
        pass({
          kind: 'as-found',
          resultUm: '5.25',
          verdict: 'out-of-tolerance',
          words: 'angle above 90°',
          toleranceUm: '5',
          marginUm: '-0.25',
          tables: [
            {
              title: 'first set-up',
              columns: ['place, mm', 'reading, µm'],
              rows: PLACES.slice(0, 3).map((p, i) => ({ label: p, cells: [`${i * 2}`] })),
            },
            {
              title: 'square turned over',
              columns: ['place, mm', 'reading, µm'],
              rows: PLACES.slice(0, 3).map((p, i) => ({ label: p, cells: [`${i * 3}`] })),
            },
          ],
        }),
        pass({
          kind: 'as-left',
          resultUm: '5.04',
          verdict: 'out-of-tolerance',
          words: 'angle above 90°',
          toleranceUm: '5',
          marginUm: '-0.04',
          tables: [
            {
              title: 'first set-up',
              columns: ['place, mm', 'reading, µm'],
              rows: PLACES.slice(0, 3).map((p, i) => ({ label: p, cells: [`${i * 2}`] })),
            },
            {
              title: 'square turned over',
              columns: ['place, mm', 'reading, µm'],
              rows: PLACES.slice(0, 3).map((p, i) => ({ label: p, cells: [`${i * 2.5}`] })),
            },
          ],
        }),
      ],
    }),
    block(
      13,
      'SS-1 · ISO 13041-1:2020',
      'Main to sub-spindle coaxiality',
      'spindle S2, spindle S1',
      'two-spindles-sweep',
      {
        component: { spindle: 'S1', reference: 'S2' },
        sketch: { scene: 'two-spindles-sweep', anglesDeg: ['0', '90', '180', '270'] },
        passes: [
          pass({
            kind: 'as-found',
            resultUm: '22.4',
            verdict: 'out-of-tolerance',
            toleranceUm: '15',
            marginUm: '-7.4',
            tables: [
              {
                title: null,
                columns: ['0°, µm', '90°, µm', '180°, µm', '270°, µm'],
                rows: [
                  { label: 'z 0 mm', cells: ['10', '4', '2', '8'] },
                  { label: 'z 100 mm', cells: ['24', '9', '−18', '−4'] },
                ],
              },
            ],
          }),
          pass({
            kind: 'as-left',
            resultUm: '7.1',
            verdict: 'within-tolerance',
            toleranceUm: '15',
            marginUm: '7.9',
            tables: [
              {
                title: null,
                columns: ['0°, µm', '90°, µm', '180°, µm', '270°, µm'],
                rows: [
                  { label: 'z 0 mm', cells: ['5', '4', '2', '3'] },
                  { label: 'z 100 mm', cells: ['8', '5', '−6', '−4'] },
                ],
              },
            ],
          }),
        ],
      },
    ),
    block(15, 'PO-B · common practice', 'Lost motion of X1, cutting feed and rapid', 'axis X1', 'slide-approach', {
      component: { axis: 'X1' },
      sketch: { scene: 'slide-approach' },
      judgedFigure: 'largest mean of any place',
      passes: [
        pass({
          kind: 'as-found',
          resultUm: '7.7',
          verdict: 'out-of-tolerance',
          toleranceUm: '5',
          marginUm: '-2.7',
          plot: pairsPlot(['0', '0.2', '0', '0.1', '0', '0.3'], ['-7.7', '-7.5', '-7.2', '-7.6', '-7.1', '-7']),
          tables: [
            {
              title: 'cutting feed',
              columns: ['+ 1, µm', '− 1, µm', '+ 2, µm', '− 2, µm', '+ 3, µm', '− 3, µm', 'mean, µm'],
              rows: ['near the start', 'middle', 'near the end'].map((label, i) => ({
                label,
                cells: ['0', '−8', '0', `−${7 + i}`, '0.2', '−8', '−7.7'],
              })),
            },
          ],
        }),
        pass({
          kind: 'as-left',
          resultUm: '0.8',
          verdict: 'within-tolerance',
          toleranceUm: '5',
          marginUm: '4.2',
          plot: pairsPlot(['0', '0.2', '0', '0.1', '0', '0.3'], ['-0.7', '-0.5', '-0.8', '-0.6', '-0.4', '-0.2']),
          tables: [
            {
              title: 'cutting feed',
              columns: ['+ 1, µm', '− 1, µm', '+ 2, µm', '− 2, µm', '+ 3, µm', '− 3, µm', 'mean, µm'],
              rows: ['near the start', 'middle', 'near the end'].map((label) => ({
                label,
                cells: ['0', '−1', '0', '−0.6', '0.2', '−0.8', '−0.8'],
              })),
            },
          ],
        }),
      ],
    }),
    block(
      22,
      'TH-1 · common practice',
      'Drift of turret T1 against spindle S1',
      'turret T1, spindle S1',
      'tool-hole-sweep',
      {
        toleranceWords: 'no tolerance given: for information',
        toleranceSource: '',
        passes: [
          pass({
            kind: 'as-found',
            resultUm: '14',
            verdict: 'for-information',
            toleranceUm: null,
            marginUm: null,
            plot: line(['0', '4', '9', '12', '14']),
          }),
        ],
      },
    ),
    block(23, 'CI-1 · ISO 230-4:2022', 'Circular test X1 Z1', 'axis X1, axis Z1', 'tool-hole-heights', {
      leftOut: {
        reason: 'not agreed',
        text: 'No circular-test gauge on site; positioning of Z1 and lost motion taken instead.',
      },
    }),
  ];
}
