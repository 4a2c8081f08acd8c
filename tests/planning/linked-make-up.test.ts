import { describe, expect, it } from 'vitest';
import { linkMakeUp } from '@/lib/schemas/linked-make-up';
import { type MakeUpInput, makeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';

const start = (index: number): MakeUpInput => structuredClone(startingMakeUps[index]?.makeUp as MakeUpInput);

describe('linkMakeUp', () => {
  it.each(startingMakeUps)('leaves “$title” as it is', ({ makeUp: whole }) => {
    expect(makeUp.parse(linkMakeUp(whole))).toEqual(makeUp.parse(whole));
  });

  it('names axes by letter and number and lets each turret move in the axes that carry it', () => {
    const form = start(0);
    form.linearAxes.push({ ...form.linearAxes[0]!, id: '', letter: 'Y', number: ' 1 ', travelMm: '80', carries: 't1' });
    const linked = makeUp.parse(linkMakeUp(form));
    expect(linked.linearAxes.map(({ id }) => id)).toEqual(['X1', 'Z1', 'Y1']);
    expect(linked.turrets[0]?.axes).toEqual(['X1', 'Z1', 'Y1']);
  });

  it('forgets what was taken out, so that no hidden field can be wrong', () => {
    const form = start(1);
    form.spindles.splice(1, 1);
    form.rotaryAxes.splice(1, 1);
    form.linearAxes.splice(5, 1);
    form.linearAxes.splice(1, 1);
    form.turrets.splice(1, 1);
    for (const axis of form.linearAxes) axis.carries = 'T1';
    form.linearAxes = form.linearAxes.slice(0, 2);
    const linked = makeUp.parse(linkMakeUp(form));
    expect(linked.channels).toEqual([1]);
    expect(linked.turrets[0]).toMatchObject({ worksAt: ['S1'], axes: ['X1', 'Z1'] });
  });

  it('lets only a tool spindle ride on a turret, and only on one that the machine has', () => {
    const form = start(0);
    const spindle = { channel: 1, carriedBy: null };
    form.spindles[0]!.onTurret = 'T1';
    form.spindles.push(
      { ...spindle, id: 'S3', type: 'tool', onTurret: 't1' },
      { ...spindle, id: 'S4', type: 'tool', onTurret: 'T7' },
      { ...spindle, id: 'S5', type: 'tool', onTurret: '', carriedBy: 'Z1' },
      { ...spindle, id: 'S6', type: 'tool', carriedBy: 'Y9' },
    );
    const linked = makeUp.parse(linkMakeUp(form));
    expect(linked.spindles.map(({ onTurret = null, carriedBy }) => [onTurret, carriedBy])).toEqual([
      [null, null],
      ['T1', null],
      [null, null],
      [null, 'Z1'],
      [null, null],
    ]);
  });

  it('has a spindle carried by its Z-like axis first', () => {
    const linked = linkMakeUp(start(2));
    expect(linked.spindles.map(({ id, carriedBy }) => [id, carriedBy])).toEqual([
      ['S1', 'Z1'],
      ['S2', 'Z2'],
    ]);
  });
});
