import { describe, expect, it } from 'vitest';
import { type EvaluationInput, evaluate } from '@/lib/evaluation';
import { Dec } from '@/lib/units/decimal';
import { expectAgreement } from './agree';

/** One case a method, worked by hand from the formula in its description. */
describe('methods by hand', () => {
  it('straightness: local windows begin and end at points', () => {
    const points = ['0', '0', '4', '0', '0', '0', '1', '0'].map((reading, k) => ({
      position: String(10 * k),
      reading,
    }));
    const result = evaluate({ method: 'straightness', reference: 'end-points', points, localLength: '20' });
    expect(result).toMatchObject({ deviation: '4', local: '4', localAt: '10' });
    const long = evaluate({ method: 'straightness', reference: 'least-squares', points, localLength: '70' });
    expect(long.local).toBe(long.deviation);
    const none = evaluate({ method: 'straightness', reference: 'minimum-zone', points, localLength: '15' });
    expect(none).toMatchObject({ local: '0' });
    expect(none).not.toHaveProperty('localAt');
  });

  it('straightness: slope in µm/m and intercept at position 0, in any order of positions', () => {
    const points = [
      { position: '300', reading: '8' },
      { position: '100', reading: '4' },
      { position: '200', reading: '9' },
    ];
    const result = evaluate({ method: 'straightness', reference: 'end-points', points });
    expect(result).toMatchObject({ slope: '20', intercept: '2', residuals: ['0', '0', '3'], deviation: '3' });
    const zone = evaluate({ method: 'straightness', reference: 'minimum-zone', points });
    expect(zone).toMatchObject({ slope: '20', intercept: '3.5', residuals: ['-1.5', '-1.5', '1.5'], deviation: '3' });
  });

  it('straightness reversal tells machine and straightedge apart', () => {
    const result = evaluate({
      method: 'straightness-reversal',
      positions: ['0', '100', '200'],
      first: ['0', '1', '0'],
      second: ['0', '3', '0'],
    });
    expect(result).toMatchObject({
      machine: ['0', '1', '0'],
      straightedge: ['0', '2', '0'],
      machineStraightness: '1',
      straightedgeStraightness: '2',
      deviation: '1',
    });
  });

  it('flatness of a square with one corner up', () => {
    const points = [
      { x: '0', y: '0', reading: '0' },
      { x: '100', y: '0', reading: '0' },
      { x: '0', y: '100', reading: '0' },
      { x: '100', y: '100', reading: '4' },
    ];
    expect(evaluate({ method: 'flatness', reference: 'minimum-zone', points }).deviation).toBe('2');
    expect(evaluate({ method: 'flatness', reference: 'least-squares', points })).toMatchObject({
      deviation: '2',
      a: '-1',
      b: '20',
      c: '20',
      residuals: ['1', '-1', '-1', '1'],
    });
    expect(evaluate({ method: 'flatness', reference: 'three-points', three: [0, '1', 2], points })).toMatchObject({
      deviation: '4',
      a: '0',
      b: '0',
      c: '0',
    });
  });

  it('parallelism: sag, measuring length, range', () => {
    const input = {
      method: 'parallelism',
      positions: ['0', '100', '200'],
      readings: { '0': ['0', '1', '5'] },
      sag: ['0', '1', '1'],
    } satisfies EvaluationInput;
    expect(evaluate({ ...input, measuringLength: '100' })).toMatchObject({
      means: ['0', '2', '6'],
      fitSlope: '30',
      difference: '6',
      range: '6',
      deviation: '3',
      reversed: false,
    });
    expect(evaluate({ ...input, measuringLength: '100', judge: 'range' })).toMatchObject({
      deviation: '6',
      signed: false,
    });
  });

  it('squareness without turning the square takes its known error off', () => {
    const result = evaluate({
      method: 'squareness',
      first: { measuredArm: { slope: '30' } },
      squareError: '10',
      measuringLength: '200',
    });
    expect(result).toMatchObject({ s1: '30', squareness: '20', deviation: '4' });
    expect(result).not.toHaveProperty('s2');
    expect(result).not.toHaveProperty('squareError');
  });

  it('run-out without angles has no phase; a centred circle has phase 0', () => {
    const bare = evaluate({ method: 'run-out', insertions: [{ readings: ['0', '3', '-1'] }] });
    expect(bare.perInsertion).toEqual([{ totalIndicatorReading: '4' }]);
    expect(bare).not.toHaveProperty('phase');
    const angles = ['0', '45', '90', '135', '180', '225', '270', '315'];
    const round = evaluate({ method: 'run-out', angles, insertions: [{ readings: angles.map(() => '7') }] });
    expect(round).toMatchObject({ eccentricity: '0', phase: '0', deviation: '0' });
    const oval = evaluate({
      method: 'run-out',
      angles,
      insertions: [{ readings: ['1', '0', '-1', '0', '1', '0', '-1', '0'] }],
    });
    expect(oval).toMatchObject({ eccentricity: '0', phase: '0', deviation: '2' });
  });

  it('run-out: the mandrel’s own part cancels over four insertions', () => {
    const angles = ['0', '90', '180', '270'];
    const spindle = ['2', '0', '-2', '0'];
    const insertions = [0, 1, 2, 3].map((turn) => ({
      readings: spindle.map((value, k) => String(Number(value) + [3, 0, -3, 0][(k + turn) % 4]!)),
    }));
    const result = evaluate({ method: 'run-out', angles, insertions });
    expect(result).toMatchObject({
      eccentricity: '2',
      phase: '0',
      largest: '10',
      judgedBy: expect.stringContaining('mean'),
    });
    expect(evaluate({ method: 'run-out', angles, insertions, judge: 'largest' }).deviation).toBe('10');
  });

  it.each([
    ['0', '1', '0', '-1', '90'],
    ['1', '0', '-1', '0', '0'],
    ['0', '-1', '0', '1', '270'],
    ['-1', '0', '1', '0', '180'],
    ['1', '1', '-1', '-1', '45'],
    ['2', '1', '-2', '-1', '26.5650511770779893515721937205'],
    ['1', '-1e-40', '-1', '1e-40', '0'],
  ])('phase of readings %s, %s, %s, %s is %s°', (r0, r90, r180, r270, phase) => {
    const angles = ['0', '90', '180', '270'];
    const result = evaluate({ method: 'run-out', angles, insertions: [{ readings: [r0, r90, r180, r270] }] });
    expect(new Dec(result.phase!).minus(phase).abs().lt('1e-27')).toBe(true);
  });

  it('phase stays below 360', () => {
    const result = evaluate({
      method: 'run-out',
      angles: ['0', '90', '180', '270'],
      insertions: [{ readings: ['1', '-1', '-1', '1'] }],
    });
    expect(result.phase).toBe('315');
  });

  it('axial run-out takes the worst circle', () => {
    const circles = [{ readings: ['0', '2', '1'] }, { name: 'rim', readings: ['0', '5'] }];
    expect(evaluate({ method: 'axial-run-out', circles })).toMatchObject({
      perCircle: ['2', '5'],
      largest: '5',
      deviation: '5',
    });
  });

  it('coaxiality: bore, sag, total reading', () => {
    const sections = [{ position: '0', readings: { '0': '10', '90': '4', '180': '2', '270': '8' } }];
    const bore = evaluate({ method: 'coaxiality', surface: 'bore', sag: '1', sections });
    expectAgreement(bore.sections[0], { ex: '-4', ey: '1' });
    const sideways = evaluate({ method: 'coaxiality', surface: 'outside', sag: '1', up: '180', plane: 'x', sections });
    expect(sideways.deviation).toBe('5');
    const total = evaluate({
      method: 'coaxiality',
      surface: 'outside',
      basis: 'total-indicator-reading',
      plane: 'y',
      sections,
    });
    expect(total.deviation).toBe('4');
  });

  it('centre height by top and bottom', () => {
    const form = { method: 'centre-height', top: '10', bottom: '4' } as const;
    expect(evaluate({ ...form, surface: 'outside' }).ey).toBe('3');
    expect(evaluate({ ...form, surface: 'bore', sag: '1.5' }).ey).toBe('-4.5');
  });

  it('angular deviation and hysteresis', () => {
    const result = evaluate({
      method: 'angular-deviation',
      positions: ['200', '100', '0'],
      forward: ['6', '4', '0'],
      backward: ['8', '6', '1'],
      kind: 'yaw',
    });
    expect(result).toMatchObject({ deviation: '8', hysteresis: '2', hysteresisAt: '100' });
  });

  it('positioning: one cycle leaves s, R and A out; one direction gives forward figures only', () => {
    const one = evaluate({
      method: 'positioning',
      kind: 'linear',
      targets: ['0', '100'],
      forward: [['1'], ['4']],
      backward: [['0'], ['1']],
    });
    expect(one).toMatchObject({
      E: '4',
      Eforward: '3',
      Ebackward: '1',
      M: '2',
      B: '3',
      meanB: '2',
      deviation: '4',
      cycles: '1',
    });
    for (const key of ['A', 'Aforward', 'R', 'Rbackward']) expect(one).not.toHaveProperty(key);
    expect(one.positions[0]).toEqual({ target: '0', meanForward: '1', meanBackward: '0', mean: '0.5', B: '1' });
    const forward = evaluate({
      method: 'positioning',
      kind: 'rotary',
      targets: ['0', '90'],
      forward: [
        ['0', '2'],
        ['1', '3'],
      ],
    });
    expect(
      Object.keys(forward)
        .filter((key) => /^[AERBM]/.test(key))
        .sort(),
    ).toEqual(['Aforward', 'Eforward', 'Rforward']);
    expect(forward.deviation).toBe(forward.Aforward);
  });

  it('positioning: readings are brought to 20 °C about the zero given', () => {
    const result = evaluate({
      method: 'positioning',
      kind: 'linear',
      targets: ['100', '600'],
      forward: [['0'], ['0']],
      temperature: { celsius: '22', alpha: '11.5', zero: '100' },
    });
    expect(result.positions.map((p) => p.meanForward)).toEqual(['0', '-11.5']);
  });

  it('positioning: B is an amount, meanB keeps its sign', () => {
    const result = evaluate({
      method: 'positioning',
      kind: 'linear',
      targets: ['0', '100'],
      forward: [['0'], ['0']],
      backward: [['3'], ['1']],
      judge: 'meanB',
    });
    expect(result).toMatchObject({ B: '3', meanB: '-2', deviation: '2' });
    expect(result.positions.map((p) => p.B)).toEqual(['-3', '-1']);
  });

  it('axis of rotation', () => {
    const radial = evaluate({
      method: 'axis-of-rotation',
      direction: 'radial',
      turns: [
        ['0', '1', '0', '-1'],
        ['0', '1', '0', '-1'],
      ],
    });
    expect(radial).toMatchObject({
      total: '0',
      synchronous: '0',
      asynchronous: '0',
      eccentricity: '1',
      deviation: '0',
    });
    const axial = evaluate({
      method: 'axis-of-rotation',
      direction: 'axial',
      turns: [
        ['0', '1', '0', '-1'],
        ['2', '1', '0', '-1'],
      ],
      judge: 'synchronous',
    });
    // Means 1, 1, 0, −1: a = 0.5, b = 1, c = 0.25; residuals ±0.25.
    expectAgreement(axial, {
      synchronous: '2',
      total: '3',
      asynchronous: '2',
      fundamental: '2.23606797749978969640917366873',
      residualSynchronous: '0.5',
      deviation: '2',
    });
  });

  it('indexing', () => {
    const stations = [
      { name: '1', readings: ['0', '2'] },
      { name: '2', readings: ['5', '6'] },
    ];
    expect(evaluate({ method: 'indexing', stations, radius: '100' })).toMatchObject({
      ranges: ['2', '1'],
      worst: '2',
      worstStation: '1',
      departures: ['-2.25', '2.25'],
      largestDeparture: '2.25',
      worstAngle: '20',
      largestDepartureAngle: '22.5',
      deviation: '2',
    });
    expect(evaluate({ method: 'indexing', stations, judge: 'accuracy' }).deviation).toBe('2.25');
  });

  it('roundness of an oval, and the side of the centre in a bore', () => {
    const points = ['2', '-1', '0', '-1'].map((reading, k) => ({ angle: String(90 * k), reading }));
    const outside = evaluate({ method: 'roundness', points });
    expectAgreement(outside, { minimumZone: '2', leastSquares: '2', centre: { x: '1', y: '0' }, deviation: '2' });
    const bore = evaluate({ method: 'roundness', points, surface: 'bore', reference: 'least-squares' });
    expectAgreement(bore, { centre: { x: '-1', y: '0' }, deviation: '2' });
  });

  it('diameter consistency has the sign of the two-collar test', () => {
    const result = evaluate({
      method: 'diameter-consistency',
      sections: [
        { position: '120', diameter: '30.004' },
        { position: '20', diameter: '30.010' },
      ],
    });
    expect(result).toMatchObject({ deviation: '6', taper: '6', slope: '30', direction: 'larger-near-headstock' });
    const collar = evaluate({ method: 'two-collar', D1: '30.010', D2: '30.004', distance: '100' });
    expect(collar.slope).toBe(result.slope);
  });

  it('drift', () => {
    const points = [
      { minutes: '120', reading: '3', temperature: '21.5' },
      { minutes: '0', reading: '0', temperature: '20' },
      { minutes: '60', reading: '2' },
    ];
    expect(evaluate({ method: 'drift', points })).toMatchObject({
      firstHour: '2',
      range: '3',
      rate: '1.5',
      temperatureRange: '1.5',
    });
  });

  it('lost motion: what + does to the plunger turns the sign', () => {
    const places = [{ feed: 'rapid' as const, pairs: [{ forward: '0', backward: '-2' }] }];
    const result = evaluate({ method: 'lost-motion', places });
    expect(result).toMatchObject({ rapid: { mean: '2', lostMotion: '-2', spread: '0' }, deviation: '2' });
    expect(result).not.toHaveProperty('cuttingFeed');
    expect(result.places[0]).toEqual({ feed: 'rapid', mean: '2', spread: '0' });
    expect(evaluate({ method: 'lost-motion', places, sense: 'plus-releases' }).rapid?.lostMotion).toBe('2');
  });

  it('tolerance: floor and cap', () => {
    const input = { method: 'tolerance', base: '15', baseLength: '300', length: '100' } as const;
    expect(evaluate(input).tolerance).toBe('5');
    expect(evaluate({ ...input, length: '50', minimum: '5' }).tolerance).toBe('5');
    expect(evaluate({ ...input, length: '3000', minimum: '5', maximum: '20' }).tolerance).toBe('20');
  });
});

describe('circular test by true geometry', () => {
  const RADIUS_UM = 100_000;
  /** Points of an ellipse-like path about a centre, in floating point: a check, not the product's arithmetic. */
  const path = (shape: (t: number) => [number, number], count = 72) =>
    Array.from({ length: count }, (_, k) => {
      const [x, y] = shape((2 * Math.PI * k) / count);
      const angle = ((Math.atan2(y, x) * 180) / Math.PI + 360) % 360;
      return { angle: angle.toFixed(13), radius: (Math.hypot(x, y) - RADIUS_UM).toFixed(9) };
    });
  const circle =
    (cx: number, cy: number, radius: number) =>
    (t: number): [number, number] => [cx + radius * Math.cos(t), cy + radius * Math.sin(t)];
  const near = (text: string | undefined, value: number, within: number) =>
    expect(new Dec(text!).minus(value).abs().lt(within), `${text} against ${value}`).toBe(true);

  it('a true circle far off centre is round', () => {
    const result = evaluate({
      method: 'circular',
      nominalRadius: '100',
      clockwise: path(circle(200, -150, RADIUS_UM + 3)),
      counterclockwise: path(circle(200, -150, RADIUS_UM + 5)),
    });
    near(result.clockwise?.G, 0, 1e-6);
    near(result.clockwise?.GLeastSquares, 0, 1e-6);
    near(result.Gb, 2, 1e-6);
    near(result.D, 4, 1e-6);
    near(result.centre.x, 200, 1e-6);
    near(result.centre.y, -150, 1e-6);
    near(result.squareness, 0, 1e-6);
    near(result.scaleDifference, 0, 1e-6);
    expect(result.deviation).toBe(result.Gb);
  });

  it('squareness: more than 90° is positive; a longer first axis is positive', () => {
    const lean = 30e-6;
    const leaning = path((t) => [RADIUS_UM * (Math.cos(t) - lean * Math.sin(t)), RADIUS_UM * Math.sin(t)]);
    const square = evaluate({ method: 'circular', nominalRadius: '100', counterclockwise: leaning });
    near(square.squareness, 30, 0.01);
    expect(square).not.toHaveProperty('Gb');
    expect(square).not.toHaveProperty('D');
    expect(square.deviation).toBe(square.counterclockwise?.G);
    const longer = path((t) => [RADIUS_UM * (1 + 20e-6) * Math.cos(t), RADIUS_UM * Math.sin(t)]);
    near(evaluate({ method: 'circular', nominalRadius: '100', clockwise: longer }).scaleDifference, 20, 0.01);
  });

  it('lag turns with the direction and leaves the squareness alone', () => {
    const wave = (q: number) =>
      Array.from({ length: 36 }, (_, k) => ({
        angle: String(10 * k),
        radius: (q * Math.sin((k * 20 * Math.PI) / 180)).toFixed(12),
      }));
    const result = evaluate({
      method: 'circular',
      nominalRadius: '100',
      clockwise: wave(-2),
      counterclockwise: wave(2),
    });
    near(result.lagDifference, 40, 0.01);
    near(result.squareness, 0, 1e-6);
  });

  it('a partial arc says so and gives no squareness', () => {
    const arc = path(circle(5, 0, RADIUS_UM)).slice(0, 20);
    const result = evaluate({ method: 'circular', nominalRadius: '100', arc: '95', clockwise: arc });
    expect(result.partialArc).toBe(true);
    expect(result).not.toHaveProperty('squareness');
    near(result.centre.x, 5, 1e-4);
  });
});

describe('corrections by hand', () => {
  it('lost motion on radius and diameter', () => {
    const input = {
      method: 'correction',
      kind: 'lost-motion',
      unit: '0.5',
      cuttingFeed: { present: '10', lostMotion: '4' },
    } as const;
    expect(evaluate({ ...input, basis: 'radius' })).toMatchObject({
      cuttingFeed: { change: '8', newValue: '18', newCount: '18' },
    });
    expect(evaluate({ ...input, basis: 'diameter', limit: '3' })).toMatchObject({
      cuttingFeed: { newCount: '26' },
      mechanicsFirst: true,
    });
  });

  it('pitch table, absolute and incremental, without drift of the rounding', () => {
    const input = {
      method: 'correction',
      kind: 'pitch-table',
      positions: ['100', '0'],
      means: ['10', '0'],
      referencePosition: '0',
      start: '-25',
      end: '130',
      interval: '25',
      unit: '1',
    } as const;
    expect(evaluate({ ...input, positions: ['100', '0'], means: ['10', '0'], form: 'absolute' })).toMatchObject({
      points: ['-25', '0', '25', '50', '75', '100', '125'],
      values: ['0', '0', '-2', '-5', '-8', '-10', '-10'],
    });
    expect(evaluate({ ...input, positions: ['100', '0'], means: ['10', '0'], form: 'incremental' })).toMatchObject({
      values: ['0', '0', '-2', '-3', '-3', '-2', '0'],
    });
  });

  it.each([
    [
      { method: 'correction', kind: 'two-jack-points', slopeChange: '-50', span: '400' },
      { raise: '20', point: 'A' },
    ],
    [
      { method: 'correction', kind: 'two-jack-points', slopeChange: '0', span: '400' },
      { raise: '0', point: 'none' },
    ],
    [
      { method: 'correction', kind: 'pivot-and-push-screw', slope: '40', distance: '500' },
      { movement: '-20', direction: 'minus' },
    ],
    [
      { method: 'correction', kind: 'shim', heightError: '12' },
      { thickness: '-12', action: 'remove' },
    ],
    [
      { method: 'correction', kind: 'shim', heightError: '-0' },
      { thickness: '0', action: 'none' },
    ],
    [
      { method: 'correction', kind: 'headstock-for-taper', D1: '30.012', D2: '30.007', length: '100', distance: '400' },
      { slope: '25', movement: '-10', direction: 'away-from-tool' },
    ],
    [{ method: 'correction', kind: 'mandrel-sag', length: '300', diameter: '40', at: '0' }, { sag: '0' }],
  ] as const)('%j', (input, expected) => {
    const result = evaluate(input);
    expectAgreement(result, expected);
    expect(result).toMatchObject({ method: 'correction', formula: expect.any(String), verify: expect.any(String) });
  });
});
