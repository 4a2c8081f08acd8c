import { describe, expect, it } from 'vitest';
import { bind } from '@/lib/planning/bind';
import { boundTitle, componentWords } from '@/lib/planning/component-words';
import { resolveDependsOn } from '@/lib/planning/depends-on';
import { planSheets, sheetKey } from '@/lib/planning/plan-sheets';
import type { MachineKind, MakeUp } from '@/lib/schemas/make-up';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import type { AppliesTo, TestDefinition } from '@/standards/types';
import { newestDefinitions } from './data/newest-definitions';
import { workedMachine } from './data/worked-machine';

const machine = (kind: MachineKind): MakeUp => startingMakeUps.find((start) => start.kind === kind)!.makeUp;
const channels = machine('multi-channel-turning-centre');
const slidingHead = machine('sliding-head-lathe');
const engineLathe = machine('engine-lathe');
const withChanger: MakeUp = { ...channels, toolChanger: { id: 'TC1', channel: 3 } };

const first = newestDefinitions[0]!;
const definition = (appliesTo: AppliesTo, change: Partial<TestDefinition> = {}): TestDefinition => ({
  ...first,
  id: 'T',
  machineKinds: {},
  boundTitle: 'Something',
  dependsOn: { components: ['bed'], moved: [], positioned: [] },
  setUpTogether: undefined,
  appliesTo,
  ...change,
});
const keys = (appliesTo: AppliesTo, makeUp: MakeUp) =>
  bind(appliesTo, makeUp).map((component) => sheetKey(definition(appliesTo), component));

describe('what a test is bound to', () => {
  it.each<[AppliesTo, MakeUp, string[]]>([
    [{ kind: 'machine' }, channels, ['T']],
    [{ kind: 'channel' }, channels, ['T:ch1', 'T:ch2', 'T:ch3']],
    [{ kind: 'tool-spindle' }, channels, ['T:T3:S3']],
    [{ kind: 'tool-spindle-and-spindle' }, channels, ['T:T3:S3:S1', 'T:T3:S3:S2']],
    [
      { kind: 'linear-axis-in-planes', letters: ['X', 'Y', 'Z'], planes: ['ZX', 'YZ', 'XY'] },
      slidingHead,
      ['T:X1:ZX', 'T:X1:XY', 'T:Y1:YZ', 'T:Y1:XY', 'T:Z1:ZX', 'T:Z1:YZ', 'T:X2:ZX', 'T:X2:XY', 'T:Z2:ZX', 'T:Z2:YZ'],
    ],
    [{ kind: 'vertical-axis-and-spindle' }, channels, ['T:Y1:S1', 'T:Y1:S2', 'T:Y3:S1', 'T:Y3:S2']],
    [{ kind: 'sub-spindle-and-its-axis', plane: 'ZX' }, channels, ['T:Z4:S2']],
    [{ kind: 'sub-spindle-and-its-axis', plane: 'ZX' }, engineLathe, []],
    [{ kind: 'tailstock-and-axis', plane: 'YZ' }, engineLathe, ['T:Z1:TS1']],
    [{ kind: 'tailstock-and-spindle' }, engineLathe, ['T:Z1:S1:TS1']],
    [{ kind: 'tailstock' }, channels, []],
    [{ kind: 'turret', types: ['gang-slide'] }, channels, ['T:T3']],
    [{ kind: 'turret-and-axis', role: 'cross' }, channels, ['T:T1:X1', 'T:T2:X2', 'T:T3:X3']],
    // The gang slide has no Z of its own: the headstock moves. The post has no axis at all: the sub-spindle comes to it.
    [{ kind: 'turret-and-axis', role: 'longitudinal' }, slidingHead, ['T:T1:Z1', 'T:T2:Z2']],
    [{ kind: 'turret-axis-and-spindle', role: 'cross' }, slidingHead, ['T:T1:X1:S1', 'T:T2:X2:S2']],
    [
      { kind: 'station-and-spindle', types: ['gang-slide'] },
      slidingHead,
      ['T:T1:S1:st1', 'T:T1:S1:st2', 'T:T1:S1:st3', 'T:T1:S1:st4', 'T:T1:S1:st5', 'T:T1:S1:st6'],
    ],
    [{ kind: 'driven-tools' }, channels, ['T:T1', 'T:T2', 'T:T3']],
    [{ kind: 'driven-tools', points: 'axial' }, channels, ['T:T1', 'T:T2']],
    [{ kind: 'driven-tools', points: 'radial' }, channels, ['T:T1', 'T:T3']],
    [{ kind: 'driven-tools-and-spindle' }, machine('turning-centre-sub-spindle'), ['T:T1:S1', 'T:T1:S2']],
    // A make-up that was stored before driven tools were asked for.
    [{ kind: 'driven-tools' }, workedMachine, []],
    [{ kind: 'rotary-axis', letters: ['B', 'C'] }, channels, ['T:S1:C1', 'T:S2:C2', 'T:S3:B1']],
    [{ kind: 'guide-bush-and-spindle' }, slidingHead, ['T:S1:GB1']],
    [{ kind: 'guide-bush-and-axis', plane: 'ZX' }, slidingHead, ['T:Z1:GB1']],
    [{ kind: 'guide-bush' }, channels, []],
    [{ kind: 'axis-pair', plane: 'ZX' }, slidingHead, ['T:T1:X1:Z1', 'T:T2:X2:Z2']],
    [{ kind: 'axis-pair', plane: 'XY' }, channels, ['T:T1:X1:Y1', 'T:T3:X3:Y3']],
    [{ kind: 'axis-pair', plane: 'YZ' }, channels, ['T:T1:Y1:Z1', 'T:T3:Y3:Z3']],
    [{ kind: 'tool-changer' }, withChanger, ['T:TC1']],
    [{ kind: 'tool-changer' }, workedMachine, []],
  ])('%j', (appliesTo, makeUp, wanted) => {
    expect(keys(appliesTo, makeUp)).toEqual(wanted);
  });

  it('keeps engine lathes and turning centres apart', () => {
    const only = definition({ kind: 'machine' }, { machineKinds: { only: ['engine-lathe'] } });
    const not = definition({ kind: 'machine' }, { id: 'N', machineKinds: { not: ['engine-lathe'] } });
    expect(planSheets(engineLathe, [only, not]).map(({ key }) => key)).toEqual(['T']);
    expect(planSheets(channels, [only, not]).map(({ key }) => key)).toEqual(['N']);
  });

  it('gives two codes that share an id a key each', () => {
    const one = definition({ kind: 'machine' });
    expect(planSheets(channels, [one, { ...one, code: 'another' }]).map(({ key }) => key)).toEqual(['T', 'T:another']);
  });
});

describe('words', () => {
  const titled = (text: string, appliesTo: AppliesTo, makeUp: MakeUp) => {
    const test = definition(appliesTo, { boundTitle: text });
    return bind(appliesTo, makeUp).map((component) => boundTitle(test, component, makeUp))[0];
  };

  it('name each part once', () => {
    expect(titled('{tailstock} to {axis}', { kind: 'tailstock-and-axis' }, engineLathe)).toBe('Tailstock TS1 to Z1');
    const stations: AppliesTo = { kind: 'station-and-spindle', types: ['gang-slide'] };
    expect(titled('Height of {station} of {turret}', stations, slidingHead)).toBe(
      'Height of station 1 of gang slide T1',
    );
    expect(titled('Station {station}', stations, slidingHead)).toBe('Station 1');
    expect(titled('{guideBush} on {spindle}', { kind: 'guide-bush-and-spindle' }, slidingHead)).toBe(
      'Guide bush GB1 on main spindle S1',
    );
    expect(titled('{toolChanger}', { kind: 'tool-changer' }, withChanger)).toBe('Tool changer TC1');
    expect(titled('{rotary} of {spindle}', { kind: 'rotary-axis', letters: ['C'] }, channels)).toBe(
      'C1 of main spindle S1',
    );
    expect(titled('Dry run of {channel}', { kind: 'channel' }, channels)).toBe('Dry run of channel 1');
    expect(() => titled('{turret}', { kind: 'machine' }, channels)).toThrow(/\{turret\}/);
  });

  it('say what a sheet is bound to', () => {
    expect(componentWords({}, channels)).toBe('whole machine');
    expect(componentWords({ channel: 2 }, channels)).toBe('channel 2');
    expect(componentWords({ turret: 'T3', station: 4, spindle: 'S1' }, channels)).toBe(
      'gang slide T3, station 4, main spindle S1',
    );
    expect(componentWords({ rotary: 'B1', spindle: 'S3' }, channels)).toBe('tool spindle S3, axis B1');
  });
});

describe('what a result rests on', () => {
  const rests = (appliesTo: AppliesTo, dependsOn: TestDefinition['dependsOn'], makeUp: MakeUp) => {
    const test = definition(appliesTo, { dependsOn });
    return resolveDependsOn(test, bind(appliesTo, makeUp)[0]!, makeUp);
  };

  it('finds the new parts', () => {
    expect(
      rests(
        { kind: 'tailstock-and-spindle' },
        { components: ['tailstock', 'spindle', 'bed'], moved: ['axis'], positioned: [] },
        engineLathe,
      ),
    ).toEqual({ components: ['TS1', 'S1', 'bed'], moved: ['Z1'], positioned: [] });
    expect(
      rests(
        { kind: 'guide-bush-and-axis', plane: 'ZX' },
        { components: ['guide-bush'], moved: ['axis'], positioned: [] },
        slidingHead,
      ),
    ).toEqual({ components: ['GB1'], moved: ['Z1'], positioned: [] });
    expect(
      rests({ kind: 'tool-changer' }, { components: ['tool-changer'], moved: [], positioned: [] }, withChanger),
    ).toEqual({ components: ['TC1'], moved: [], positioned: [] });
    expect(
      rests(
        { kind: 'rotary-axis', letters: ['B'] },
        { components: ['spindle', 'turret'], moved: ['rotary'], positioned: ['rotary'] },
        channels,
      ),
    ).toEqual({ components: ['S3'], moved: ['B1'], positioned: ['B1'] });
  });

  it('places a tool spindle by the axes of what it rides on, and a work spindle by those that carry it', () => {
    expect(
      rests(
        { kind: 'tool-spindle-and-spindle' },
        { components: ['spindle', 'turret', 'reference'], moved: ['spindle-axis'], positioned: ['turret-axes'] },
        { ...channels, turrets: channels.turrets.map((one) => ({ ...one, worksAt: ['S2'] })) },
      ),
    ).toEqual({ components: ['S3', 'T3', 'S2'], moved: ['Z4'], positioned: ['X3', 'Y3', 'Z3'] });
    expect(
      rests({ kind: 'turret' }, { components: ['turret'], moved: [], positioned: ['turret-cross-axis'] }, channels),
    ).toEqual({ components: ['T1'], moved: [], positioned: ['X1'] });
  });

  it('says which part is missing', () => {
    expect(() => rests({ kind: 'machine' }, { components: ['turret'], moved: [], positioned: [] }, channels)).toThrow(
      /its turret/,
    );
  });
});
