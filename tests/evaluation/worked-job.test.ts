import { describe, expect, it } from 'vitest';
import { type EvaluationInput, evaluate, evaluateUnknown, type PermissibleDirection } from '@/lib/evaluation';
import { convert } from '@/lib/units/convert';
import { Dec } from '@/lib/units/decimal';
import { parseNumber } from '@/lib/units/parse-number';
import { displayRounded, type RoundingRule } from '@/lib/units/round';
import type { Unit } from '@/lib/units/unit';
import { expectAgreement } from './agree';
import job from './data/worked-job.json';

/** The reference job QMF-2041: all figures derived by hand from invented readings, checked a second way. */
type Check = { request: EvaluationInput; expected: Record<string, unknown> };
type Pass = Partial<Check> & {
  id: string;
  readings?: { at: string; text: string; unit: string }[];
  alsoEvaluate?: Check[];
  conformity?: Check;
  conformityLocal?: Check;
  display?: { value: string; extraDigits: number };
  verdict?: string;
  linkTo?: string;
};
type Sheet = {
  id: string;
  direction: PermissibleDirection | null;
  tolerance: ({ value: string } & Partial<Check>) | null;
  resolution: { value: string; rounding: string };
  passes: Pass[];
};
const plan = job.plan as unknown as Sheet[];
const passes = plan.flatMap((sheet) => sheet.passes.map((pass) => ({ sheet, pass })));
const measured = passes.filter(({ pass }) => pass.request);
const LOOSE = {
  phase: '1e-12',
  standard: '1e-12',
  degreesOfFreedom: '1e-12',
  coverageFactor: '1e-12',
  expanded: '1e-12',
};

function expectAnswer({ request, expected }: Check) {
  const answer = evaluateUnknown(request);
  expectAgreement(answer, expected, '', LOOSE);
  return answer as { deviation: string; signed: boolean };
}

function at(document: unknown, pointer: string): unknown {
  return pointer
    .split('/')
    .slice(1)
    .reduce<unknown>((value, key) => (value as Record<string, unknown>)[key], document);
}

describe('worked job', () => {
  it('has 23 sheets, one of them left out', () => {
    expect(plan).toHaveLength(23);
    expect(plan.filter((sheet) => sheet.passes.some((pass) => pass.request))).toHaveLength(22);
  });

  it.each(measured.map(({ pass }) => [pass.id, pass] as const))('%s: readings give the expected result', (_, pass) => {
    expectAnswer(pass as Check);
    for (const other of pass.alsoEvaluate ?? []) expectAnswer(other);
  });

  it.each(measured.map(({ pass }) => [pass.id, pass] as const))('%s: texts as typed give the readings', (_, pass) => {
    expect(pass.readings!.length).toBeGreaterThan(0);
    for (const { at: pointer, text, unit } of pass.readings!) {
      const parsed = parseNumber(text, { defaultUnit: unit as Unit });
      if (!parsed.ok) throw new Error(`${pointer} ${text}: ${parsed.problem}`);
      const field = at(pass.request, pointer) as string;
      const isLength = pass.request!.method === 'reference-shift' || pass.request!.method === 'two-collar';
      const value = unit === 'mm' && !isLength ? convert(parsed.value, parsed.unit!, 'µm') : parsed.value;
      expect(new Dec(value).eq(field), `${pointer}: ${text} gives ${value}, not ${field}`).toBe(true);
    }
  });

  const judged = measured.filter(({ pass }) => pass.conformity);
  it.each(judged.map(({ sheet, pass }) => [pass.id, sheet, pass] as const))('%s: verdict', (_, sheet, pass) => {
    expectAnswer(pass.conformity!);
    if (pass.conformityLocal) expectAnswer(pass.conformityLocal);
    const result = evaluateUnknown(pass.request) as { deviation: string; signed: boolean };
    const own = evaluate({
      method: 'conformity',
      deviation: result.deviation,
      signed: result.signed,
      tolerance: sheet.tolerance!.value,
      direction: sheet.direction!,
      rule: 'simple',
    });
    expect(own.verdict).toBe(pass.verdict);
  });

  it.each(measured.map(({ sheet, pass }) => [pass.id, sheet, pass] as const))(
    '%s: figure as shown',
    (_, sheet, pass) => {
      const { deviation } = evaluateUnknown(pass.request) as { deviation: string };
      const shown = displayRounded({
        value: deviation,
        resolution: sheet.resolution.value,
        rule: sheet.resolution.rounding as RoundingRule,
        limit: sheet.tolerance?.value,
      });
      expect({ value: shown.text, extraDigits: shown.extraDigits }).toEqual({
        value: pass.display!.value,
        extraDigits: pass.display!.extraDigits,
      });
    },
  );

  const scaled = plan.filter((sheet) => sheet.tolerance?.request);
  it.each(scaled.map((sheet) => [sheet.id, sheet] as const))('%s: tolerance', (_, sheet) => {
    expectAnswer(sheet.tolerance as unknown as Check);
    expect(new Dec(sheet.tolerance!.value).eq(sheet.tolerance!.expected!.tolerance as string)).toBe(true);
  });

  const advice = (job.events as unknown as { id?: string; advice?: Check[] }[]).flatMap((event) =>
    (event.advice ?? []).map((check) => [event.id ?? '', check] as const),
  );
  it.each(advice)('correction %s: advice', (_, check) => {
    expectAnswer(check);
  });

  it('covers every part of the job', () => {
    expect(measured.length).toBe(passes.filter(({ pass }) => !pass.linkTo).length);
    expect(judged.length).toBeGreaterThan(30);
    expect(scaled.length).toBeGreaterThan(7);
    expect(advice).toHaveLength(5);
  });
});
