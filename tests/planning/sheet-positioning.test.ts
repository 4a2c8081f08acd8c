import { describe, expect, it } from 'vitest';
import { figures } from '@/lib/sheet/figures';
import { proposedTargets } from '@/lib/sheet/proposed-targets';
import type { Layout } from '@/standards/types';
import { judged, limit, list, orderOf, outcomeOf, ownDefinition, reasonOf, type Typed } from './data/own-sheet';

type TargetCycles = Extract<Layout, { kind: 'target-cycles' }>;
const layout: TargetCycles = { kind: 'target-cycles', quantity: 'linear', cycles: 5, targets: [] };
const definition = ownDefinition('positioning', layout, { judge: 'A' });
const provenance = { kind: 'common-practice' as const, text: 'check' };

/** Runs of a direction, target by target, cycle by cycle. */
const runs = (way: string, table: number[][]): Record<string, string> =>
  Object.assign({}, ...table.map((row, i) => list(`/${way}/${i}`, row.map(String))));

const targets = list('/targets', ['0', '105', '198', '311', '402']);
const forward = runs('forward', [
  [0.2, -0.1, 0.3, 0, 0.1],
  [1.4, 1.1, 1.6, 1.3, 1.1],
  [2.9, 2.6, 3.1, 2.8, 2.6],
  [2.2, 2.5, 2, 2.4, 2.4],
  [4.1, 3.8, 4.4, 4, 4.2],
]);
const backward = runs('backward', [
  [-1.9, -2.2, -1.8, -2.1, -2],
  [-0.6, -1, -0.7, -0.9, -0.8],
  [0.9, 0.5, 1, 0.7, 0.9],
  [0.4, 0.1, 0.6, 0.3, 0.1],
  [2.2, 1.8, 2.3, 2, 2.2],
]);
const whole: Typed = { ...targets, ...forward, ...backward };
const some = (keep: (pointer: string) => boolean): Typed =>
  Object.fromEntries(Object.entries(whole).filter(([pointer]) => pointer.startsWith('/targets') || keep(pointer)));

describe('runs over targets, up and down', () => {
  it('reads up the targets, then down, run by run, whatever order they are written in', () => {
    const order = orderOf(definition, list('/targets', ['198', '0', '105,5']));
    expect(order.slice(0, 7)).toEqual([
      '/forward/1/0',
      '/forward/2/0',
      '/forward/0/0',
      '/backward/0/0',
      '/backward/2/0',
      '/backward/1/0',
      '/forward/1/1',
    ]);
    expect(order).toHaveLength(30);
  });

  it('gives all parameters of a measurement worked out by hand', () => {
    const outcome = judged(outcomeOf(definition, whole, limit('7')));
    expect([outcome.state, outcome.total, outcome.judgement.verdict]).toEqual(['complete', 50, 'within-tolerance']);
    expect(outcome.displayed.textUm).toBe('6.9');
    const result = outcome.result as unknown as Record<string, string>;
    const hand = { B: '2.1', meanB: '2.04', E: '6.1', Eforward: '4', Ebackward: '4.1', M: '4.05' };
    expect(result).toMatchObject(hand);
    const four = (key: string) => Number(result[key]).toFixed(4);
    expect(['Rforward', 'Rbackward', 'R', 'Aforward', 'Abackward', 'A'].map(four)).toEqual([
      '0.8944',
      '0.8485',
      '2.8472',
      '4.7634',
      '4.8162',
      '6.8634',
    ]);
    const shown = figures(outcome);
    expect(shown).toHaveLength(13);
    expect(shown.find(({ label }) => label.startsWith('B,'))?.value).toBe('2.1 µm, at 0 mm');
    expect(new Set(outcome.plot?.points.map(({ series }) => series))).toHaveProperty('size', 2);
  });

  it('judges the limits of other parameters too: the worst verdict counts', () => {
    const further = (figure: string, toleranceUm: string) => ({
      figure,
      label: figure,
      toleranceUm,
      foundBy: '',
      provenance,
    });
    const tolerance = limit('7', { also: [further('R', '3'), further('meanB', '2.04'), further('B', '2')] });
    const { judgement } = judged(outcomeOf(definition, whole, tolerance));
    expect(judgement.also?.map(({ verdict }) => verdict)).toEqual([
      'within-tolerance',
      'within-tolerance',
      'out-of-tolerance',
    ]);
    expect(judgement.verdict).toBe('out-of-tolerance');
    const negative = Object.fromEntries(
      Object.entries(whole).map(([pointer, text]) => [
        pointer.replace(/^\/(for|back)ward/, (way) => (way === '/forward' ? '/backward' : '/forward')),
        text,
      ]),
    );
    const mean = judged(outcomeOf(definition, negative, tolerance));
    expect(mean.result).toMatchObject({ meanB: '-2.04' });
    expect(mean.judgement.also?.[1]).toMatchObject({ deviationUm: '2.04', verdict: 'within-tolerance' });
  });

  it('says which runs it rests on, and lets a run that has no way back wait', () => {
    const three = some((pointer) => Number(pointer.at(-1)) < (pointer.startsWith('/forward') ? 3 : 2));
    const outcome = judged(outcomeOf(definition, three));
    expect([outcome.state, outcome.basedOn]).toEqual(['partial', 'by 2 of 5 runs']);
    expect(outcome.result).toMatchObject({ cycles: '2' });
  });

  it('judges E after a single run, without A and R, and skips their limits', () => {
    const one = some((pointer) => pointer.endsWith('/0'));
    const also = [{ figure: 'R', label: 'R', toleranceUm: '1', foundBy: '', provenance }];
    const outcome = judged(outcomeOf(definition, one, limit('7', { also })));
    expect(outcome.basedOn).toBe('by 1 of 5 runs');
    expect(outcome.result).toMatchObject({ deviation: '6', judgedBy: expect.stringContaining('E') });
    expect(outcome.judgement).not.toHaveProperty('also');
    const single = ownDefinition('positioning', { ...layout, cycles: 1 }, { judge: 'A' });
    expect(judged(outcomeOf(single, one)).state).toBe('complete');
  });

  it('leaves out a target that was not read, and never reads it as 0', () => {
    const outcome = judged(
      outcomeOf(
        definition,
        some((pointer) => !pointer.startsWith('/forward/2')),
      ),
    );
    expect(outcome.basedOn).toBe('by 4 of 5 targets');
    expect(outcome.input).toMatchObject({ targets: ['0', '105', '311', '402'] });
    expect(reasonOf(outcomeOf(definition, { ...targets, '/forward/0/0': '1' }))).toMatch(/1 of 5 targets/);
  });

  it('takes one direction alone where the parameter knows one, and asks for the other where it does not', () => {
    const up = some((pointer) => pointer.startsWith('/forward'));
    const outcome = judged(outcomeOf(definition, up));
    expect(outcome.basedOn).toBe('the + direction alone');
    expect(outcome.result.deviation).toMatch(/^4\.7634/);
    for (const judge of ['B', 'M', 'meanB'])
      expect(reasonOf(outcomeOf({ ...definition, judge }, up))).toBe(`${judge} needs readings in the − direction too.`);
    const oneWay = ownDefinition('positioning', { ...layout, oneWay: true }, { judge: 'R' });
    const complete = judged(outcomeOf(oneWay, up));
    expect([complete.state, complete.total]).toEqual(['complete', 25]);
    expect(complete.result.deviation).toMatch(/^0\.8944/);
  });

  it('brings lengths to 20 °C only where temperature and expansion are both written', () => {
    const warm = { '/temperature/celsius': '24', '/temperature/alpha': '10' };
    const outcome = judged(outcomeOf(definition, { ...whole, ...warm }));
    expect(outcome.input).toMatchObject({ temperature: { celsius: '24', alpha: '10' } });
    // 402 mm, 4 K, 10 µm/(m·K): 16.08 µm less at the far end.
    expect(outcome.result).toMatchObject({ positions: { 4: { meanForward: '-11.98' } } });
    for (const missing of ['/temperature/celsius', '/temperature/alpha'])
      expect(reasonOf(outcomeOf(definition, { ...whole, ...warm, [missing]: '' }))).toMatch(/belong together/);
  });

  it('asks about one reading among fifty that was slipped, and about none of the others', () => {
    const at = (outcome: ReturnType<typeof outcomeOf>) => outcome.problems.map(({ pointer }) => pointer);
    expect(at(outcomeOf(definition, whole, limit('7')))).toEqual([]);
    const slipped = outcomeOf(definition, { ...whole, '/backward/2/3': '700' }, limit('7'));
    expect(at(slipped)).toEqual(['/backward/2/3']);
    expect(slipped.problems[0]).toMatchObject({ severity: 'unusual', message: expect.stringContaining('20 times') });
  });
});

describe('rotary axes', () => {
  const rotary = ownDefinition(
    'positioning',
    { ...layout, quantity: 'rotary', cycles: 1, oneWay: true },
    { judge: 'E', shownIn: '″', resolution: { valueUm: '0.1', rule: 'half-even' } },
  );
  const arcsec = (texts: string[]): Typed =>
    Object.fromEntries(texts.map((text, k) => [`/forward/${k}/0`, [text, 'arcsec'] as const]));
  const at = list('/targets', ['0', '90', '180']);
  /** 5″ and 9″ as a plan keeps them, µm/m. */
  const [five, nine] = ['24.2406840554767996794957051179', '43.633231299858239423092269212'];

  it('reads seconds of arc and shows them', () => {
    const outcome = judged(outcomeOf(rotary, { ...at, ...arcsec(['0', '2', '4,8']) }, limit(five!)));
    expect(outcome.displayed).toEqual({ textUm: '4.8', textMm: '4.8', unit: '″', extraDigits: 0 });
    expect(outcome.judgement.verdict).toBe('within-tolerance');
    expect(figures(outcome)[0]).toEqual({ label: 'E in the + direction', value: '4.8″, between 0° and 180°' });
  });

  it.each(['0', '2.3', '-7', '0.1'])('is within a limit that it reaches exactly, counted from %s', (from) => {
    for (const [limitUm, seconds] of [
      [five, 5],
      [nine, 9],
    ] as const) {
      const readings = [from, from, (Number(from) + seconds).toFixed(1)];
      const outcome = judged(outcomeOf(rotary, { ...at, ...arcsec(readings) }, limit(limitUm!)));
      expect([outcome.judgement.verdict, outcome.displayed.textMm]).toEqual(['within-tolerance', seconds.toFixed(1)]);
    }
  });

  it('adds a digit where a limit is passed by less than is shown', () => {
    const outcome = judged(outcomeOf(rotary, { ...at, ...arcsec(['0', '2', '5.04']) }, limit(five!)));
    expect(outcome.judgement.verdict).toBe('out-of-tolerance');
    expect(outcome.displayed).toEqual({ textUm: '5.04', textMm: '5.04', unit: '″', extraDigits: 1 });
  });
});

describe('targets that are proposed', () => {
  const axes = ['X1', 'X2', 'X3', 'Y1', 'Y2', 'Z1', 'Z2', 'Z3', 'Z4', 'W1'];
  const cases = axes.flatMap((axis) =>
    ['60', '150', '500', '1200', '2000', '3150'].map((travel) => ({ axis, travel })),
  );

  it.each(cases)('$axis, travel $travel mm', ({ axis, travel }) => {
    const places = proposedTargets(travel, axis).map(Number);
    expect(places.length).toBe(Math.max(5, Math.ceil((Number(travel) * 5) / 1000)));
    expect(places[0]).toBeGreaterThan(0);
    expect(places.at(-1)).toBeLessThan(Number(travel));
    const room = Math.max(1, Math.floor(Number(travel) * 0.02));
    const pitch = (Number(travel) - 2 * room) / (places.length - 1);
    const offsets = places.map((place, i) => place - room - i * pitch);
    for (const offset of offsets) expect(Math.abs(offset)).toBeLessThanOrEqual(0.3 * pitch);
    expect(new Set(offsets.map((offset) => offset.toFixed(3))).size).toBe(offsets.length);
    expect(places).toEqual([...places].sort((a, b) => a - b));
    expect(places.every(Number.isInteger)).toBe(true);
    expect(proposedTargets(travel, axis).map(Number)).toEqual(places);
  });
});
