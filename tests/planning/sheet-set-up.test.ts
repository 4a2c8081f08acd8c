import { describe, expect, it } from 'vitest';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { defaultSetUp } from '@/lib/sheet/default-set-up';
import type { BoundComponent, Layout } from '@/standards/types';
import { ownDefinition } from './data/own-sheet';
import { workedMachine } from './data/worked-machine';

const texts = (layout: Layout, component: BoundComponent, start: string, makeUp = workedMachine) =>
  Object.entries(defaultSetUp(ownDefinition('straightness', layout), component, makeUp)).flatMap(
    ([pointer, { text }]) => (pointer.startsWith(start) ? [text] : []),
  );
const profile = (positionsMm: string[]): Layout => ({ kind: 'profile', positionsMm, reference: 'minimum-zone' });
const tens = ['0', '10', '20', '30', '40', '50', '60', '70', '80', '90', '100'];

describe('set-up that is proposed', () => {
  it('reads a slide over all of its travel, the far end included', () => {
    expect(texts(profile(tens), { axis: 'X2' }, '/points')).toEqual(['0', '20', '40', '60', '80', '100', '120', '140']);
    expect(texts(profile(tens), { axis: 'Z2' }, '/points').slice(-2)).toEqual(['300', '320']);
  });

  it('keeps the positions of a piece', () => {
    expect(texts(profile(tens), { axis: 'Z1', turret: 'T1', spindle: 'S1' }, '/points')).toEqual(tens);
  });

  it('keeps an interpolated line within both axes', () => {
    const line = profile(['0', '100', '200', '300']);
    const bound = { axis: 'Z1', reference: 'X1', turret: 'T1' };
    expect(texts(line, bound, '/points')).toEqual(['0', '50', '100', '150']);
    expect(texts(line, { ...bound, axis: 'X1', reference: 'Z1' }, '/points')).toEqual(['0', '50', '100', '150']);
  });

  it('keeps a mandrel between the centres', () => {
    const { makeUp } = startingMakeUps.find(({ kind }) => kind === 'engine-lathe')!;
    const layout: Layout = {
      kind: 'angles-by-position',
      anglesDeg: ['0'],
      positionsMm: ['0', '200', '400'],
      positionName: 'along the mandrel',
      sag: false,
    };
    const bound = { tailstock: 'TS1', axis: makeUp.linearAxes.find(({ letter }) => letter === 'Z')!.id };
    expect(texts(layout, bound, '/positions', makeUp)).toEqual(['0', '200', '400']);
    const short = { ...makeUp, distanceBetweenCentresMm: '250' };
    expect(texts(layout, bound, '/positions', short)).toEqual(['0', '125', '250']);
  });

  it('takes fewer steps of a foot on a short slide, and the usual number on a long one', () => {
    const steps: Layout = {
      kind: 'angle-steps',
      stepLengthMm: '100',
      steps: 6,
      returnRun: true,
      reference: 'minimum-zone',
    };
    expect(texts(steps, { axis: 'Z2' }, '/')).toEqual(['100', '3']);
    expect(texts(steps, { axis: 'X2' }, '/')).toEqual(['100', '2']);
    const long = workedMachine.linearAxes.map((axis) => ({ ...axis, travelMm: '600' }));
    expect(texts(steps, { axis: 'Z2' }, '/', { ...workedMachine, linearAxes: long })).toEqual(['100']);
  });

  it('keeps a circle within both travels', () => {
    const circle = (nominalRadiusMm: string): Layout => ({
      kind: 'circle-trace',
      anglesDeg: ['0', '90'],
      nominalRadiusMm,
      arcDeg: '360',
    });
    const bound = { axis: 'X2', reference: 'Z2' };
    expect(texts(circle('50'), bound, '/nominalRadius')).toEqual(['50']);
    expect(texts(circle('100'), bound, '/nominalRadius')).toEqual(['70']);
    expect(texts(circle('150'), { ...bound, axis: 'Y1' }, '/nominalRadius')).toEqual(['40']);
  });

  it('keeps targets that are given within the travel, and proposes others', () => {
    const targets = (given: string[]): Layout => ({
      kind: 'target-cycles',
      quantity: 'linear',
      cycles: 1,
      targets: given,
    });
    expect(texts(targets(['0', '50', '100']), { axis: 'X2' }, '/targets')).toEqual(['0', '50', '100']);
    expect(texts(targets(['0', '100', '200']), { axis: 'X2' }, '/targets')).toEqual(['0', '70', '140']);
    expect(texts(targets([]), { axis: 'X2' }, '/targets')).toHaveLength(5);
  });
});
