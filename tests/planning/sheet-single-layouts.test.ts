import { describe, expect, it } from 'vitest';
import { defaultSetUp } from '@/lib/sheet/default-set-up';
import { figures } from '@/lib/sheet/figures';
import { sheetFields } from '@/lib/sheet/sheet-fields';
import type { Layout } from '@/standards/types';
import { cellsOf, judged, limit, list, orderOf, outcomeOf, ownDefinition, reasonOf } from './data/own-sheet';
import { workedMachine } from './data/worked-machine';

describe('stations', () => {
  const layout: Layout = { kind: 'stations', stations: null, repeats: 2, radiusMm: '100' };
  const definition = ownDefinition('indexing', layout);
  const typed = {
    '/radius': '100',
    ...list('/stations', ['1', '4', '7'], '/name'),
    ...list('/stations/0/readings', ['0', '2']),
    ...list('/stations/1/readings', ['1', '2']),
    ...list('/stations/2/readings', ['4', '4']),
  };

  it('goes round all stations, then round again', () => {
    expect(orderOf(definition, typed).slice(0, 4)).toEqual([
      '/stations/0/readings/0',
      '/stations/1/readings/0',
      '/stations/2/readings/0',
      '/stations/0/readings/1',
    ]);
  });

  it('gives the worst station, departures, and both as angles', () => {
    const outcome = judged(outcomeOf(definition, typed, limit('2')));
    expect(outcome.result).toMatchObject({ worst: '2', worstStation: '1', worstAngle: '20', deviation: '2' });
    expect(figures(outcome)[0]).toEqual({ label: 'largest range', value: '2.0 µm at 1, 20.0 µm/m' });
    expect(figures(outcome)[4]).toEqual({ label: 'station 7', value: 'range 0.0 µm, departure 1.8 µm' });
    const accuracy = judged(outcomeOf({ ...definition, judge: 'accuracy' }, typed));
    expect(accuracy.displayed.textUm).toBe('1.8');
  });

  it('leaves out a station without all its readings', () => {
    const outcome = judged(outcomeOf(definition, { ...typed, '/stations/0/readings/1': '' }));
    expect([outcome.basedOn, outcome.result.deviation]).toEqual(['by 2 of 3 stations', '1']);
    const one = { '/stations/0/name': '1', ...list('/stations/0/readings', ['0', '2']) };
    expect(judged(outcomeOf(definition, one)).state).toBe('complete');
    expect(reasonOf(outcomeOf({ ...definition, judge: 'accuracy' }, one))).toMatch(/^Two stations .* 1 so far\.$/);
  });

  it('proposes every station up to twelve, and every second of more', () => {
    const names = (stations: number) => {
      const [T1, ...others] = workedMachine.turrets;
      const makeUp = { ...workedMachine, turrets: [{ ...T1!, stations }, ...others] };
      const cells = defaultSetUp(definition, { turret: 'T1' }, makeUp);
      return Object.entries(cells).flatMap(([pointer, { text }]) => (pointer.endsWith('/name') ? [text] : []));
    };
    expect(names(12)).toHaveLength(12);
    expect(names(16)).toEqual(['1', '3', '5', '7', '9', '11', '13', '15']);
    expect(names(8).at(-1)).toBe('8');
  });
});

describe('diameters along a piece', () => {
  const layout: Layout = { kind: 'diameters', positionsMm: ['0', '100', '200'] };
  const definition = ownDefinition('diameter-consistency', layout);
  const typed = {
    ...list('/sections', ['0', '100', '200'], '/position'),
    ...list('/sections', ['40,010', '40.006', '40.004'], '/diameter'),
  };

  it('gives range, taper and slope, the limit for the length really measured', () => {
    const perLength = { baseLengthMm: '300', minimumUm: '5' };
    const outcome = judged(outcomeOf(definition, typed, limit('15', { perLength })));
    expect(outcome.result).toMatchObject({
      deviation: '6',
      taper: '6',
      slope: '15',
      direction: 'larger-near-headstock',
    });
    expect(outcome.judgement).toMatchObject({ toleranceUm: '10', verdict: 'within-tolerance' });
    expect(outcome.plot?.points.map(({ y }) => y)).toEqual(['0', '-4', '-6']);
    expect(figures(outcome).map(({ value }) => value)).toEqual(['6.0 µm', '15.0 µm/m']);
  });

  it('leaves out a section without a diameter', () => {
    expect(judged(outcomeOf(definition, { ...typed, '/sections/1/diameter': ' ' })).basedOn).toBe('by 2 of 3 sections');
    expect(reasonOf(outcomeOf(definition, { '/sections/0/position': '0', '/sections/0/diameter': '40' }))).toMatch(
      /Two sections/,
    );
  });
});

describe('readings over time', () => {
  const layout: Layout = { kind: 'time-series', minutes: ['0', '30', '60', '90'], temperature: true };
  const definition = ownDefinition('drift', layout);
  const typed = {
    ...list('/points', ['0', '30', '60', '90'], '/minutes'),
    ...list('/points', ['0', '2', '3', '5'], '/reading'),
    ...list('/points', ['20', '20,5', '21', '21.5'], '/temperature'),
  };

  it('takes reading and temperature together, and gives range, first hour and rate', () => {
    expect(orderOf(definition, typed).slice(0, 3)).toEqual([
      '/points/0/reading',
      '/points/0/temperature',
      '/points/1/reading',
    ]);
    const outcome = judged(outcomeOf(definition, typed));
    expect([outcome.state, outcome.judgement.verdict]).toEqual(['complete', 'for-information']);
    expect(outcome.result).toMatchObject({ firstHour: '3', range: '5', rate: '3.2', temperatureRange: '1.5' });
    expect(figures(outcome).map(({ value }) => value)).toEqual(['3.0 µm', '3.20 µm/h', '1.5 °C']);
  });

  it('still counts a reading whose temperature is missing, and says so', () => {
    const outcome = judged(outcomeOf(definition, { ...typed, '/points/3/temperature': '' }));
    expect([outcome.state, outcome.basedOn]).toEqual(['partial', '1 of them without a temperature']);
    expect(outcome.result).toMatchObject({ range: '5', temperatureRange: '1' });
    expect(judged(outcomeOf(definition, { ...typed, '/points/3/reading': '' })).basedOn).toBe('by 3 of 4 readings');
    const one = { '/points/0/minutes': '0', '/points/0/reading': '1' };
    expect(reasonOf(outcomeOf(definition, one))).toBe('Two readings are needed; 1 so far.');
  });

  it('reads the time in minutes, with or without the unit', () => {
    const outcome = judged(outcomeOf(definition, { ...typed, '/points/1/minutes': '30 min' }));
    expect(outcome.input).toMatchObject({ points: { 1: { minutes: '30' } } });
    expect(reasonOf(outcomeOf(definition, { ...typed, '/points/1/minutes': '30 mm' }))).toMatch(/does not fit here/);
  });
});

describe('where it should be and where it was found', () => {
  const layout: Layout = { kind: 'target-and-found', basis: null };
  const definition = ownDefinition('reference-shift', layout);

  it('proposes the way in which the axis is programmed', () => {
    const proposed = (axis: string) => {
      const cells = defaultSetUp(definition, { axis }, workedMachine);
      return [cells['/basis']?.text, cells['/controlFactor']?.text];
    };
    expect(proposed('X2')).toEqual(['diameter', '2']);
    expect(proposed('Z1')).toEqual(['radius', '1']);
  });

  it('halves a diameter, keeps a radius, and asks which it is', () => {
    const found = { '/target': '40', '/found': '40,010' };
    const diameter = judged(
      outcomeOf(definition, { ...found, '/basis': 'diameter', '/controlFactor': '2' }, limit('5')),
    );
    expect(diameter.result).toMatchObject({ shift: '-5', controlShift: '-10', deviation: '5' });
    expect(diameter.judgement.verdict).toBe('within-tolerance');
    expect(figures(diameter).map(({ value }) => value)).toEqual(['−5.0 µm', '−10.0 µm']);
    expect(judged(outcomeOf(definition, { ...found, '/basis': 'radius' })).result.deviation).toBe('10');
    expect(reasonOf(outcomeOf(definition, found))).toMatch(/Choose whether/);
    expect(reasonOf(outcomeOf(definition, { '/target': '40' }))).toMatch(/Both figures are needed/);
    expect(sheetFields(definition, cellsOf(found)).setUp).toHaveLength(2);
  });
});
