import { describe, expect, it } from 'vitest';
import { type MakeUp, makeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import { workedMachine } from './data/worked-machine';

function problems(change: (value: MakeUp) => void) {
  const value = structuredClone(workedMachine);
  change(value);
  const parsed = makeUp.safeParse(value);
  return parsed.success ? [] : parsed.error.issues.map(({ path, message }) => [path.join('.'), message]);
}

describe('make-up', () => {
  it.each(startingMakeUps)('starts from a valid $kind', ({ kind, makeUp: start }) => {
    expect(makeUp.parse(start)).toEqual(start);
    expect(start.kind).toBe(kind);
  });

  it('takes the worked machine as it is', () => {
    expect(makeUp.parse(workedMachine)).toEqual(workedMachine);
  });

  it('takes sizes with a comma and ids in any case, and keeps them plain', () => {
    const value = structuredClone(workedMachine);
    value.linearAxes[0]!.travelMm = ' 152,5 ';
    value.linearAxes[0]!.id = 'x1';
    const parsed = makeUp.parse(value);
    expect(parsed.linearAxes[0]).toMatchObject({ id: 'X1', travelMm: '152.5' });
    expect(makeUp.parse({ ...value, swingOverBedMm: '' }).swingOverBedMm).toBeNull();
  });

  it.each<[string, (value: MakeUp) => void, string, RegExp]>([
    [
      'an id twice',
      (m) => {
        m.turrets[1]!.id = 'T1';
      },
      'turrets.1.id',
      /T1 is already taken/,
    ],
    [
      'an axis that carries nothing known',
      (m) => {
        m.linearAxes[5]!.carries = 'S9';
      },
      'linearAxes.5.carries',
      /S9, which the machine does not have/,
    ],
    [
      'an axis of a turret that is none',
      (m) => void m.turrets[0]!.axes.push('V1'),
      'turrets.0.axes',
      /V1, which is no axis/,
    ],
    [
      'an axis of another turret',
      (m) => void m.turrets[0]!.axes.push('X2'),
      'turrets.0.axes',
      /X2 is said to carry T2/,
    ],
    [
      'a turret at no spindle',
      (m) => {
        m.turrets[0]!.worksAt = [];
      },
      'turrets.0.worksAt',
      /Name the work spindle/,
    ],
    [
      'a turret at an unknown spindle',
      (m) => {
        m.turrets[0]!.worksAt = ['S7'];
      },
      'turrets.0.worksAt',
      /S7/,
    ],
    [
      'a spindle on a wrong axis',
      (m) => {
        m.spindles[1]!.carriedBy = 'Z2';
      },
      'spindles.1.carriedBy',
      /Z2 is said to carry T2, not S2/,
    ],
    [
      'a tool spindle on a turret that is none',
      (m) => void m.spindles.push({ id: 'S3', type: 'tool', channel: 1, carriedBy: null, onTurret: 'T9' }),
      'spindles.2.onTurret',
      /T9, which is no turret/,
    ],
    [
      'a work spindle on a turret',
      (m) => {
        m.spindles[1]!.onTurret = 'T2';
      },
      'spindles.1.onTurret',
      /only a tool spindle/,
    ],
    [
      'a tool changer by a name that is taken',
      (m) => {
        m.toolChanger = { id: 'T1', channel: 1 };
      },
      'toolChanger.id',
      /T1 is already taken/,
    ],
    [
      'a tool changer on an unknown channel',
      (m) => {
        m.toolChanger = { id: 'TC1', channel: 7 };
      },
      'toolChanger.channel',
      /no channel 7/,
    ],
    [
      'an unknown channel',
      (m) => {
        m.spindles[0]!.channel = 3;
      },
      'spindles.0.channel',
      /no channel 3/,
    ],
    [
      'an id against letter and number',
      (m) => {
        m.linearAxes[0]!.number = 4;
      },
      'linearAxes.0.id',
      /not letter X with number 4/,
    ],
    [
      'no main spindle',
      (m) => {
        m.spindles[0]!.type = 'sub';
      },
      'spindles',
      /main spindle/,
    ],
    [
      'a travel of zero',
      (m) => {
        m.linearAxes[0]!.travelMm = '0';
      },
      'linearAxes.0.travelMm',
      /above zero/,
    ],
    [
      'a travel that is none',
      (m) => {
        m.linearAxes[0]!.travelMm = 'long';
      },
      'linearAxes.0.travelMm',
      /millimetres/,
    ],
  ])('refuses %s at its field', (_, change, path, message) => {
    const found = problems(change).find(([at]) => at === path);
    expect(found?.[1]).toMatch(message);
  });
});
