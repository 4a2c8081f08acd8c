import { describe, expect, it } from 'vitest';
import { figures } from '@/lib/sheet/figures';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Layout } from '@/standards/types';
import { cellsOf, judged, limit, list, orderOf, outcomeOf, ownDefinition, reasonOf } from './data/own-sheet';

describe('foot by foot', () => {
  const layout = {
    kind: 'angle-steps',
    stepLengthMm: '100',
    steps: 5,
    returnRun: true,
    reference: 'minimum-zone',
  } as const;
  const definition = ownDefinition('straightness-from-angles', layout);
  const foot = { '/stepLength': '100' };
  const out = list('/angles', ['30', '20', '-10', '20', '-10']);
  const back = list('/returnAngles', ['28', '18', '-10', '20', '-12']);

  it('goes out from the first step, and back from the last', () => {
    const order = orderOf(definition, foot);
    expect(order).toHaveLength(10);
    expect([order[0], order[4], order[5], order[9]]).toEqual([
      '/angles/0',
      '/angles/4',
      '/returnAngles/4',
      '/returnAngles/0',
    ]);
  });

  it('adds up heights of the mean angles, and gives the closure', () => {
    const outcome = judged(outcomeOf(definition, { ...foot, ...out, ...back }, limit('5')));
    expect(outcome.state).toBe('complete');
    expect(outcome.result).toMatchObject({ heights: ['0', '2.9', '4.8', '3.8', '5.8', '4.7'], closure: '0.6' });
    expect(figures(outcome)).toContainEqual({ label: 'closure of the two runs', value: '0.6 µm' });
    expect(outcome.plot?.points.at(-1)).toEqual({ x: '500', y: '4.7' });
  });

  it('says that the way back is missing, and evaluates the way out alone', () => {
    const outcome = judged(outcomeOf(definition, { ...foot, ...out, '/returnAngles/4': '-12' }, limit('5')));
    expect([outcome.state, outcome.basedOn]).toEqual(['partial', 'the way out alone']);
    expect(outcome.result).toMatchObject({ heights: ['0', '3', '5', '4', '6', '5'], deviation: '3' });
    expect(outcome.input).not.toHaveProperty('returnAngles');
  });

  it('stops at a step that is missing: heights after it would be wrong', () => {
    const { '/angles/2': _, ...gap } = out;
    const outcome = judged(outcomeOf(definition, { ...foot, ...gap }, limit('5')));
    expect(outcome.basedOn).toBe('by the first 2 of 5 steps');
    expect(outcome.result).toMatchObject({ heights: ['0', '3', '5'] });
    expect(reasonOf(outcomeOf(definition, { ...foot, '/angles/1': '3' }))).toMatch(/from the first on; 0 so far/);
    expect(reasonOf(outcomeOf(definition, out))).toBe('The length of a step is needed.');
  });

  it('takes as many steps as a travel holds, scales the limit with them, and reads seconds of arc', () => {
    const perLength = { baseLengthMm: '300', minimumUm: '1' };
    const one = { ...definition, layout: { ...layout, returnRun: false } };
    const typed = { ...foot, '/steps': '3', ...list('/angles', ['30', '20']), '/angles/2': ['-2', 'arcsec'] as const };
    const outcome = judged(outcomeOf(one, typed, limit('9', { perLength })));
    expect([outcome.state, outcome.filled, outcome.total]).toEqual(['complete', 3, 3]);
    expect(outcome.judgement.toleranceUm).toBe('9');
    expect(outcome.input).toMatchObject({
      angles: ['30', '20', expect.stringMatching(/^-9\.6962736221907198717982820471/)],
    });
    expect(reasonOf(outcomeOf(one, { ...typed, '/steps': '2,5' }))).toMatch(/whole number/);
  });
});

describe('straightedge turned over', () => {
  const layout: Layout = { kind: 'two-runs', positionsMm: ['0', '100', '200'], reference: 'minimum-zone' };
  const definition = ownDefinition('straightness-reversal', layout);
  const places = list('/positions', ['0', '100', '200']);
  const first = list('/first', ['0', '-1', '0']);
  const second = list('/second', ['0', '3', '0']);

  it('takes the whole first run, then the second, and parts slide from straightedge', () => {
    expect(orderOf(definition, places)).toEqual([...Object.keys(first), ...Object.keys(second)]);
    const outcome = judged(outcomeOf(definition, { ...places, ...first, ...second }, limit('2')));
    expect(outcome.result).toMatchObject({ machine: ['0', '2', '0'], straightedge: ['0', '1', '0'], deviation: '2' });
    expect(figures(outcome).map(({ value }) => value)).toEqual(['2.0 µm', '1.0 µm']);
    expect(new Set(outcome.plot?.points.map(({ series }) => series))).toEqual(new Set(['slide', 'straightedge']));
  });

  it('leaves out a position that was read once only', () => {
    const more = { ...places, '/positions/3': '300', ...first, ...second, '/first/3': '4' };
    expect(judged(outcomeOf(definition, more)).basedOn).toBe('by 3 of 4 positions');
    expect(reasonOf(outcomeOf(definition, { ...places, ...first }))).toMatch(/read in both runs are needed; 0 so far/);
  });
});

describe('points of a face', () => {
  const layout: Layout = { kind: 'grid', xMm: ['0', '100'], yMm: ['0', '100'], reference: 'minimum-zone' };
  const definition = ownDefinition('flatness', layout);
  const places = {
    ...list('/points', ['0', '100', '0', '100', '50'], '/x'),
    ...list('/points', ['0', '0', '100', '100', '50'], '/y'),
  };

  it('takes the plane out: four corners on a slope, the middle 4 µm above it', () => {
    const readings = list('/points', ['0', '1', '2', '3', '5.5'], '/reading');
    const outcome = judged(outcomeOf(definition, { ...places, ...readings }, limit('4')));
    expect([outcome.state, outcome.result.deviation, outcome.judgement.verdict]).toEqual([
      'complete',
      '4',
      'within-tolerance',
    ]);
    expect(figures(outcome)).toEqual([{ label: 'slope of the plane', value: 'x 10.0 µm/m, y 20.0 µm/m' }]);
  });

  it('leaves out points that were not read, and asks for four', () => {
    const readings = list('/points', ['0', '1', '2', '3'], '/reading');
    expect(judged(outcomeOf(definition, { ...places, ...readings })).basedOn).toBe('by 4 of 5 points');
    const { '/points/3/reading': _, ...three } = readings;
    expect(reasonOf(outcomeOf(definition, { ...places, ...three }))).toBe(
      'Four points with a reading are needed; 3 so far.',
    );
    expect(sheetFields(definition, cellsOf(places)).tables[0]!.rows).toHaveLength(6);
  });
});

describe('angles of a slide', () => {
  const layout: Layout = {
    kind: 'angular-runs',
    positionsMm: ['0', '50', '100'],
    quantity: 'yaw',
    bothDirections: true,
  };
  const definition = ownDefinition('angular-deviation', layout, { shownIn: 'mm/m' });
  const typed = {
    ...list('/positions', ['0', '50', '100']),
    ...list('/forward', ['0', '4', '10']),
    ...list('/backward', ['1', '6', '10']),
  };

  it('goes out and back, and is shown in mm/m', () => {
    expect(orderOf(definition, typed).slice(2, 4)).toEqual(['/forward/2', '/backward/2']);
    const outcome = judged(outcomeOf(definition, typed, limit('40')));
    expect(outcome.result).toMatchObject({ deviation: '10', hysteresis: '2', hysteresisAt: '50' });
    expect(outcome.displayed).toEqual({ textUm: '10.0', textMm: '0.0100', unit: 'mm/m', extraDigits: 0 });
    expect(figures(outcome)[0]?.value).toBe('2.0 µm/m at 50 mm');
  });

  it('judges the way out alone while nothing was read back', () => {
    const out = Object.fromEntries(Object.entries(typed).filter(([pointer]) => !pointer.startsWith('/backward')));
    expect(judged(outcomeOf(definition, out)).basedOn).toBe('the way out alone');
    expect(reasonOf(outcomeOf(definition, { '/positions/0': '0', '/forward/0': '1' }))).toMatch(/Two positions/);
  });
});
