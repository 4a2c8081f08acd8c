import { describe, expect, it } from 'vitest';
import { Fraction } from '@/lib/units/fraction';
import { liesWithin } from '@/standards/size-classes';
import type { TestDefinition, ToleranceRule } from '@/standards/types';
import { expectProvenance } from './expect-provenance';
import { definitions, identity } from './whole-catalogue';

interface Case {
  name: string;
  definition: TestDefinition;
  rule: ToleranceRule;
  /** Null: of the judged figure itself. */
  figure: string | null;
}

const cases: Case[] = definitions.flatMap((definition) => [
  ...(definition.tolerance
    ? [{ name: identity(definition), definition, rule: definition.tolerance, figure: null }]
    : []),
  ...(definition.also ?? []).map(({ figure, tolerance }) => ({
    name: `${identity(definition)}, ${figure}`,
    definition,
    rule: tolerance,
    figure,
  })),
]);

/** Without a tolerance on purpose: by contract, for information, or a function check, which has none. */
const forInformation = ['BD-1a', 'B-2', 'PO-B'];
const wholeCode = ['ISO 13041-1', 'ISO 1708'];

const figuresOf = ({ allUm, byClassUm, steps }: ToleranceRule) => [
  ...(allUm === undefined ? [] : [allUm]),
  ...(byClassUm ?? []),
  ...(steps ?? []).map(({ toleranceUm }) => toleranceUm),
];

const isAngle = ({ layout }: TestDefinition) =>
  layout.kind === 'angular-runs' ||
  (layout.kind === 'target-cycles' && layout.quantity === 'rotary') ||
  (layout.kind === 'rotation-turns' && layout.direction === 'tilt');

it('is missing only where nothing is known that could be judged by', () => {
  const missing = definitions.filter((one) => one.tolerance === null && wholeCode.includes(one.code));
  expect([...new Set(missing.map(({ id }) => id))].sort()).toEqual(forInformation.slice(0, 2).sort());
  for (const one of definitions.filter(({ method }) => method === 'function-check')) expect(one.tolerance).toBeNull();
});

describe.each(cases)('$name', ({ definition, rule }) => {
  it('has its source, and so has a local tolerance', () => {
    expectProvenance(rule.provenance);
    if (rule.local) expectProvenance(rule.local.provenance);
  });

  it('is complete: figures of the one kind that its rule names, above 0', () => {
    const { by, allUm, byClassUm, steps } = rule;
    expect(allUm !== undefined).toBe(by === 'all');
    expect(byClassUm?.length).toBe(by === 'size-class' ? 3 : undefined);
    expect((steps?.length ?? 0) > 0).toBe(by === 'travel' || by === 'centre-distance');
    for (const figure of figuresOf(rule)) expect(Fraction.from(figure).sign()).toBe(1);
  });

  it('never falls from class to class or from step to step', () => {
    figuresOf(rule).forEach((figure, k, all) => {
      if (k > 0) expect(Fraction.from(figure).compare(Fraction.from(all[k - 1]!))).toBeGreaterThanOrEqual(0);
    });
  });

  it('has half-open steps without gap or overlap', () => {
    const steps = rule.steps ?? [];
    if (steps.length > 0) expect(steps[0]?.overMm).toBe('0');
    for (const [k, step] of steps.entries()) {
      if (k > 0) expect(step.overMm).toBe(steps[k - 1]?.upToMm);
      if (step.upToMm === null) {
        expect(k).toBe(steps.length - 1);
        continue;
      }
      const { upToMm } = step;
      const justOver = Fraction.from(upToMm).plus(Fraction.of(1, 1000)).toText();
      expect(Fraction.from(upToMm).compare(Fraction.from(step.overMm))).toBe(1);
      expect(steps.filter((one) => liesWithin(upToMm, one))).toEqual([step]);
      expect(steps.filter((one) => liesWithin(justOver, one))).toEqual(steps.slice(k + 1, k + 2));
    }
  });

  it('is worked out for another length only where the figure grows with it', () => {
    if (!rule.perLength) return;
    const { method, judge, code } = definition;
    expect([
      ...['parallelism', 'squareness-to-axis', 'squareness', 'two-collar'],
      ...['straightness', 'straightness-from-angles', 'straightness-reversal', 'diameter-consistency'],
    ]).toContain(method);
    expect(judge).not.toBe('range');
    expect(['all', 'size-class']).toContain(rule.by);
    expect(rule.perLength.minimumUm).toBe(code === 'ISO 1708' ? '10' : '5');
    expect(Fraction.from(rule.perLength.baseLengthMm).sign()).toBe(1);
    for (const figure of figuresOf(rule))
      expect(Fraction.from(rule.perLength.minimumUm).compare(Fraction.from(figure))).toBeLessThanOrEqual(0);
  });

  it('has a local part only where the method gives a local figure, and one that is not wider', () => {
    if (!rule.local) return;
    expect(['straightness', 'parallelism']).toContain(definition.method);
    for (const figure of figuresOf(rule))
      expect(Fraction.from(rule.local.toleranceUm).compare(Fraction.from(figure))).toBeLessThanOrEqual(0);
  });

  it('counts what its figure counts', () => {
    expect(rule.basis !== undefined).toBe(definition.method === 'coaxiality');
    if (isAngle(definition)) expect(['µm/m', '″']).toContain(rule.unit);
    else expect(rule.unit ?? 'µm').toBe('µm');
  });
});
