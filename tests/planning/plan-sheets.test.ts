import { describe, expect, it } from 'vitest';
import { componentIds } from '@/lib/planning/component-words';
import { withContractTolerance } from '@/lib/planning/contract-tolerance';
import { groupProposals } from '@/lib/planning/group-proposals';
import { planSheets } from '@/lib/planning/plan-sheets';
import { startingMakeUps } from '@/lib/schemas/starting-make-ups';
import type { PlannedSheet } from '@/standards/types';
import { newestDefinitions } from './data/newest-definitions';
import { workedSheets } from './data/worked-job';
import { workedMachine } from './data/worked-machine';

const plan = planSheets(workedMachine, newestDefinitions);
const byKey = (key: string): PlannedSheet => {
  const found = plan.find((sheet) => sheet.key === key);
  if (!found) throw new Error(`no sheet ${key}`);
  return found;
};

describe('plan of the worked machine', () => {
  it('holds all 17 sheets of the worked job, in its order', () => {
    const wanted = workedSheets.map(({ key }) => key);
    expect(wanted).toHaveLength(17);
    expect(plan.map(({ key }) => key).filter((key) => wanted.includes(key))).toEqual(wanted);
  });

  it.each(workedSheets)('$key: component, what it rests on, direction', (worked) => {
    const { component, dependsOn, direction } = byKey(worked.key);
    expect({ component, dependsOn, direction }).toEqual({
      component: worked.component,
      dependsOn: worked.dependsOn,
      direction: worked.direction,
    });
  });

  it.each(workedSheets.filter(({ tolerance }) => tolerance.kind === 'shop'))(
    '$key: tolerance by the sizes',
    (worked) => {
      const { tolerance } = byKey(worked.key);
      expect(tolerance?.baseUm).toBe(worked.tolerance.base);
      expect(tolerance?.perLength?.baseLengthMm ?? null).toBe(worked.tolerance.baseLength);
      expect(tolerance?.perLength?.minimumUm ?? null).toBe(worked.tolerance.minimum);
      const local = tolerance?.local && { value: tolerance.local.toleranceUm, length: tolerance.local.lengthMm };
      expect(local ?? null).toEqual(worked.tolerance.local);
      expect(tolerance?.foundBy).not.toBe('');
    },
  );

  it('says how a tolerance was found', () => {
    expect(byKey('SP-1a:S1').tolerance?.foundBy).toBe('size class 2 (nominal bar diameter 32 mm: over 25 up to 63)');
    expect(byKey('AX-5:Z1:ZX').tolerance?.foundBy).toBe('travel of Z1 500 mm: up to 500');
    expect(byKey('PO-B:X1').tolerance).toBeNull();
  });

  it('names components in plain words', () => {
    expect(byKey('AX-2:X2:S2').title).toBe('X2 motion square to the axis of sub-spindle S2');
    expect(byKey('SS-1:S2:S1').title).toBe('Main spindle S1 and sub-spindle S2: coaxiality');
    expect(byKey('AX-5:Z1:YZ').title).toBe('Straightness of the Z1 motion, in YZ');
  });

  it('proposes what the worked job set up', () => {
    const { setUp } = byKey('AX-5:Z1:ZX');
    expect(Object.keys(setUp)).toHaveLength(11);
    expect(setUp['/points/10/position']).toEqual({ text: '500', unit: 'mm' });
    expect(byKey('TU-3:T1:S1').setUp['/radii/2']?.text).toBe('16');
    expect(byKey('AX-4:Y1:X1').setUp['/first/measuredArm/points/2/position']?.text).toBe('70');
  });

  it('measures against the sub-spindle only after the sub-spindle itself', () => {
    const place = (key: string) => plan.findIndex((sheet) => sheet.key === key);
    expect(place('SS-3a:S2')).toBeLessThan(place('SS-1:S2:S1'));
    expect(place('SS-1:S2:S1')).toBeLessThan(place('AX-2:X2:S2'));
    expect(place('TU-3:T2:S1')).toBeLessThan(place('TU-3:T2:S2'));
  });
});

describe.each(startingMakeUps)('plan of a $kind', ({ kind, makeUp }) => {
  const sheets = planSheets(makeUp, newestDefinitions);

  it('has distinct keys, in working order', () => {
    expect(new Set(sheets.map(({ key }) => key)).size).toBe(sheets.length);
    const steps = sheets.map(({ workingStep }) => workingStep);
    expect(steps).toEqual([...steps].sort((a, b) => a - b));
  });

  it('names only components that the machine has', () => {
    const axes = [...makeUp.linearAxes, ...makeUp.rotaryAxes].map(({ id }) => id);
    const single = [makeUp.tailstock, makeUp.guideBush, makeUp.toolChanger].flatMap((one) => one?.id ?? []);
    const known = new Set([...axes, ...single, ...[...makeUp.spindles, ...makeUp.turrets].map(({ id }) => id)]);
    for (const { key, component, dependsOn, title, setUpTogether } of sheets) {
      for (const id of componentIds(component)) expect(known, key).toContain(id);
      for (const id of dependsOn.components) expect([...known, 'bed'], key).toContain(id);
      for (const id of [...dependsOn.moved, ...dependsOn.positioned]) expect(axes, key).toContain(id);
      if (component.channel !== undefined) expect(makeUp.channels, key).toContain(component.channel);
      const turret = makeUp.turrets.find(({ id }) => id === component.turret);
      if (component.station !== undefined) expect(component.station, key).toBeLessThanOrEqual(turret?.stations ?? 0);
      expect(`${title} ${setUpTogether}`).not.toMatch(/[{}]|undefined/);
    }
  });

  it('keeps what is set up together together, within its step', () => {
    const runs: string[] = [];
    for (const { workingStep, setUpTogether } of sheets) {
      const run = `${workingStep} ${setUpTogether}`;
      if (setUpTogether !== null && runs.at(-1) !== run) {
        expect(runs, run).not.toContain(run);
        runs.push(run);
      }
      if (setUpTogether === null) runs.push('');
    }
  });

  it('gives each test its minutes', () => {
    for (const { key, minutes } of sheets) {
      expect(Number.isInteger(minutes), key).toBe(true);
      expect(minutes, key).toBeGreaterThan(0);
    }
  });

  it('finds a tolerance wherever the catalogue has a figure for a machine of this size', () => {
    for (const { key, definition, tolerance } of sheets) {
      const rule = newestDefinitions.find(
        ({ id, code, version }) => id === definition.id && code === definition.code && version === definition.version,
      )?.tolerance;
      if (!rule || rule.by === 'all') expect(tolerance === null, key).toBe(!rule);
      if (tolerance) expect(Number(tolerance.baseUm), key).toBeGreaterThan(0);
    }
  });

  it('is the same every time, and has what this kind of machine needs', () => {
    expect(planSheets(makeUp, newestDefinitions)).toEqual(sheets);
    const ids = new Set(sheets.map(({ definition }) => definition.id));
    // An engine lathe has a code of its own, with run-outs and slides of its own names.
    const always =
      kind === 'engine-lathe' ? ['PO-B'] : ['SP-1a', 'SP-2a', 'AX-1a', 'AX-1b', 'AX-2', 'AX-5', 'TU-3', 'PO-B'];
    for (const id of always) expect(ids, kind).toContain(id);
    const hasSub = makeUp.spindles.some(({ type }) => type === 'sub');
    for (const id of ['SS-1', 'SS-3a', 'SS-3b', 'SS-3c']) expect(ids.has(id), `${kind} ${id}`).toBe(hasSub);
    expect(ids.has('AX-4')).toBe(makeUp.linearAxes.some(({ letter }) => letter === 'Y'));
  });
});

describe('working order', () => {
  const place = (key: string) => plan.findIndex((sheet) => sheet.key === key);
  const keysOf = (id: string) => plan.filter(({ definition }) => definition.id === id).map(({ key }) => key);

  it('sets the angle of the sub-spindle before its offset', () => {
    const angles = [...keysOf('SS-2a'), ...keysOf('SS-2b')];
    expect(angles.length).toBeGreaterThan(1);
    for (const key of [...angles, ...keysOf('SS-3a')]) {
      expect(place(key), key).toBeGreaterThanOrEqual(0);
      expect(place(key), key).toBeLessThan(place('SS-1:S2:S1'));
    }
    for (const key of keysOf('AX-2').filter((one) => one.endsWith(':S2')))
      expect(place(key), key).toBeGreaterThan(place('SS-1:S2:S1'));
  });

  it('looks at the mandrel before whatever uses it in the same spindle', () => {
    const mandrels = plan.filter(({ definition }) => definition.id === 'MT-1');
    expect(mandrels.length).toBeGreaterThan(0);
    for (const mandrel of mandrels) {
      const together = plan.filter(
        ({ setUpTogether, workingStep }) =>
          setUpTogether === mandrel.setUpTogether && workingStep === mandrel.workingStep,
      );
      expect(together[0]?.key, mandrel.key).toBe(mandrel.key);
      expect(together.length, mandrel.key).toBeGreaterThan(1);
    }
  });
});

describe('choosing', () => {
  it('keeps every proposal under the headings of the working order', () => {
    expect(groupProposals(plan).flatMap(({ sheets }) => sheets)).toEqual(plan);
    expect(groupProposals(plan).every(({ title }) => title !== 'Other tests')).toBe(true);
  });

  it('takes a tolerance from the contract', () => {
    const { tolerance } = withContractTolerance(byKey('PO-B:X1'), { baseUm: '5', text: 'order 7714, item 6a' });
    expect(tolerance).toEqual({
      baseUm: '5',
      foundBy: 'contract',
      provenance: { kind: 'contract', text: 'order 7714, item 6a' },
    });
    const scaled = withContractTolerance(byKey('AX-5:Z1:ZX'), {
      baseUm: '8',
      text: 'item 2',
      perLength: { baseLengthMm: '500', minimumUm: '4' },
      local: { toleranceUm: '4', lengthMm: '200' },
    });
    expect(scaled.tolerance?.local?.provenance).toEqual({ kind: 'contract', text: 'item 2' });
    expect(withContractTolerance(byKey('SS-1:S2:S1'), { baseUm: '10', text: 'item 3' }).tolerance?.basis).toBe(
      'offset',
    );
  });

  it('keeps the limits of further figures beside a tolerance of the contract', () => {
    const proposed = plan.find(({ tolerance }) => (tolerance?.also ?? []).length > 0)!;
    const { tolerance } = withContractTolerance(proposed, { baseUm: '9', text: 'item 4' });
    expect(tolerance).toMatchObject({ baseUm: '9', foundBy: 'contract', also: proposed.tolerance!.also });
  });
});
