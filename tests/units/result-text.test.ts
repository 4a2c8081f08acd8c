import { describe, expect, it } from 'vitest';
import { resultWords } from '@/components/sheet/result-words';
import {
  becauseOf,
  furtherFigures,
  judgedFigureText,
  limitText,
  passResultText,
  ruleDeviation,
  summaryTolerance,
  verdictText,
} from '@/lib/reporting/result-text';
import { toleranceWords } from '@/lib/reporting/test-block';
import { judgeSheet } from '@/lib/sheet/judge-sheet';
import { shownUnit, toleranceShown, withUnit } from '@/lib/sheet/shown-unit';
import type { Judgement } from '@/lib/sheet/types';
import type { PlannedTolerance, TestDefinition } from '@/standards/types';
import { functionCheck } from '../helpers/every-layout';

const judgement = (more: Partial<Judgement> = {}): Judgement => ({
  verdict: 'within-tolerance',
  signed: false,
  toleranceUm: '20',
  toleranceArithmetic: null,
  limitUm: '20',
  marginUm: '7.5',
  direction: 'either',
  local: null,
  ...more,
});

/** π·10⁶/648000 µm/m are a second of arc: five seconds to 30 digits. */
const fiveSeconds = '24.2406840554768022';

describe('a tolerance in the unit of its result', () => {
  it('is in mm unless the result says otherwise', () => {
    expect(shownUnit({})).toBe('mm');
    expect(shownUnit(null)).toBe('mm');
    expect(shownUnit({ unit: '″' })).toBe('″');
  });

  it('loses nothing in mm and mm/m, and comes back whole in seconds', () => {
    expect(toleranceShown('7.25', 'mm')).toBe('0.00725');
    expect(toleranceShown('40', 'mm/m')).toBe('0.04');
    expect(toleranceShown(fiveSeconds, '″')).toBe('5');
    expect(toleranceShown('484.813681109536044', '″')).toBe('100');
    expect(toleranceShown('3', 'items')).toBe('3');
  });

  it('stands with its unit; a count alone', () => {
    expect(['mm', 'mm/m', '″', 'items'].map((unit) => withUnit('5', unit as 'mm'))).toEqual([
      '5 mm',
      '5 mm/m',
      '5″',
      '5',
    ]);
  });

  it('is put in words in that unit, further limits behind it', () => {
    const provenance = { kind: 'from-memory' as const, text: 'starter value' };
    const tolerance: PlannedTolerance = {
      baseUm: '40',
      foundBy: 'one figure',
      provenance,
      perLength: { baseLengthMm: '300', minimumUm: '10' },
      also: [{ figure: 'R', label: 'repeatability', toleranceUm: '6', foundBy: '', provenance }],
    };
    expect(toleranceWords(tolerance, 'mm/m')).toBe(
      '0.04 mm/m over 300 mm, never below 0.01 mm/m, repeatability 0.006 mm/m',
    );
    expect(toleranceWords({ ...tolerance, perLength: undefined, baseUm: fiveSeconds, also: [] }, '″')).toBe('5″');
    expect(toleranceWords(null, 'items')).toBe('every item in order');
  });
});

describe('a result in words', () => {
  const pass = { resultMm: '0.0042', resultUm: '4.2', judgement: judgement() };

  it('has its unit and its verdict', () => {
    expect(passResultText(pass)).toBe('0.0042 mm, within tolerance');
    expect(passResultText({ ...pass, resultUnit: 'mm/m' })).toBe('0.0042 mm/m, within tolerance');
    expect(passResultText({ ...pass, resultMm: '3.5', resultUnit: '″' })).toBe('3.5″, within tolerance');
    expect(passResultText({ ...pass, resultMm: null, judgement: null })).toBe('no result');
  });

  it('of a function check is in order or not', () => {
    const check = { resultUm: '0', resultUnit: 'items' as const };
    expect(passResultText({ ...check, resultMm: '0', judgement: judgement() })).toBe('in order');
    const out = judgement({ verdict: 'out-of-tolerance' });
    expect(passResultText({ ...check, resultMm: '1', judgement: out })).toBe('1 item not in order');
    expect(passResultText({ ...check, resultMm: '3', judgement: out })).toBe('3 items not in order');
    expect(passResultText({ ...check, resultMm: null, judgement: null })).toBe('not done');
    expect(verdictText('within-tolerance', 'items', true)).toBe('in order');
  });

  it('has its margin in µm, of angles in their own unit', () => {
    expect(judgedFigureText('7.55', pass)).toBe('7.6 µm');
    expect(judgedFigureText('-3', { resultMm: '0.043', resultUm: '43', resultUnit: 'mm/m' })).toBe('−0.003 mm/m');
    expect(judgedFigureText(fiveSeconds, { resultMm: '1.25', resultUm: '1.25', resultUnit: '″' })).toBe('5.00″');
    expect(limitText('6.66666')).toBe('6.6 µm');
    expect(limitText('60', 'mm/m')).toBe('0.06 mm/m');
  });

  it('goes to the limit rule in µm, of seconds in µm/m', () => {
    expect(ruleDeviation({ resultUm: '−4.2' })).toBe('-4.2');
    expect(Number(ruleDeviation({ resultUm: '5', resultUnit: '″' }))).toBeCloseTo(24.24068, 4);
    expect(ruleDeviation({ resultUm: null })).toBeNull();
  });
});

describe('further limits', () => {
  const also = [
    { figure: 'R', label: 'R', deviationUm: '6.0004', toleranceUm: '6', verdict: 'out-of-tolerance' as const },
    { figure: 'B', label: 'B', deviationUm: '1.23456', toleranceUm: '5', verdict: 'within-tolerance' as const },
  ];

  it('are as fine as the result, and finer where rounding would hide that one is passed', () => {
    expect(furtherFigures(judgement({ also }), { text: '0.012' })).toMatchObject([
      { label: 'R', value: '0.0060004 mm', limit: '0.006 mm', words: 'out of tolerance' },
      { label: 'B', value: '0.001 mm', limit: '0.005 mm', words: 'within tolerance' },
    ]);
    const angles = [{ ...also[1]!, deviationUm: '9.5', toleranceUm: fiveSeconds }];
    expect(furtherFigures(judgement({ also: angles }), { text: '3.5', unit: '″' })).toMatchObject([
      { value: '2.0″', limit: '5″' },
    ]);
    expect(furtherFigures(judgement(), { text: '0.012' })).toEqual([]);
    expect(furtherFigures(null, { text: null })).toEqual([]);
  });

  it('are named where one of them decides against a result that is within its own limit', () => {
    expect(becauseOf(judgement({ verdict: 'out-of-tolerance', also }))).toBe('because of R');
    expect(becauseOf(judgement({ verdict: 'out-of-tolerance', marginUm: '-1', also }))).toBe('');
    expect(becauseOf(judgement({ also: [also[1]!] }))).toBe('');
    const local = { deviationUm: '9', toleranceUm: '6', lengthMm: '300', verdict: 'out-of-tolerance' as const };
    expect(becauseOf(judgement({ verdict: 'out-of-tolerance', local }))).toBe('because of the local limit over 300 mm');
  });
});

it('names the unit of a tolerance in the summary only where it is not that of the column', () => {
  expect(summaryTolerance({ toleranceMm: '0.015' })).toBe('0.015');
  expect(summaryTolerance({ toleranceMm: '0.06', unit: 'mm/m' })).toBe('0.06 mm/m');
  expect(summaryTolerance({ toleranceMm: '8', unit: '″' })).toBe('8″');
  expect(summaryTolerance({ toleranceMm: null, unit: '″' })).toBe('– ″');
  expect(summaryTolerance({ toleranceMm: null, unit: 'items' })).toBe('–');
});

describe('the line below a function check', () => {
  const definition: TestDefinition = functionCheck();
  const rules = { definition, tolerance: null, direction: 'either' as const, decisionRule: 'simple' as const };
  const words = (entries: Record<string, string>) => {
    const cells = Object.fromEntries(
      Object.entries(entries).map(([pointer, text]) => [`/items/${pointer}`, { text, unit: null }]),
    );
    return resultWords(judgeSheet(rules, definition, cells), 5);
  };

  it('counts what is answered and what is not in order', () => {
    expect(words({})).toMatchObject({ mark: 'not-measured', verdict: 'not done' });
    expect(words({ 'stop/answer': 'yes', 'door/answer': 'not-fitted' })).toMatchObject({
      mark: 'within-tolerance',
      verdict: '2 of 5 answered, all in order',
    });
    const all = { 'stop/answer': 'no', 'door/answer': 'yes', 'bush/answer': 'yes', 'lamp/answer': 'yes' };
    expect(words({ ...all, 'air/answer': 'yes', 'air/value': '7' })).toMatchObject({
      mark: 'out-of-tolerance',
      verdict: '5 of 5 answered, 2 not in order',
    });
    expect(words({ 'air/answer': 'yes', 'air/value': 'much' }).mark).toBe('not-measured');
  });
});
