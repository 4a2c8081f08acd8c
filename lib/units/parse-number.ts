import type { Unit } from './unit';

export type ParsedNumber =
  | { ok: true; value: string; unit: Unit | null; decimals: number }
  | { ok: false; problem: string };

const SPELLINGS: Readonly<Record<string, Unit>> = {
  mm: 'mm',
  µm: 'µm',
  um: 'µm',
  in: 'in',
  '"': 'in',
  '°C': '°C',
  '°': '°',
  'µm/m': 'µm/m',
  'um/m': 'µm/m',
  'mm/m': 'mm/m',
  arcsec: 'arcsec',
  min: 'min',
};

const MAX_LENGTH = 60;
/** What nearly every reading looks like; all other rules only decide about the rest. */
const PLAIN = /^([-+\u2212\u2013]?)(\d{1,25})(?:[.,](\d{1,25}))?$/;
// Format characters and control characters an instrument's cable or the clipboard leaves behind.
const INVISIBLE = /(?![\t-\r\u0085])[\p{Cc}\p{Cf}]/gu;
// Line and column breaks separate values: they count as a space, so that two pasted values never melt into one.
const SPACE = /[\s\u0085]/g;
const GROUP_SPACE = /(?<=\d)[\u00a0\u2007\u2009\u202f](?=\d)/;
const GROUPED = /^(\d{1,3})((?:[\u00a0\u2007\u2009\u202f]\d{3})+)(?![\u00a0\u2007\u2009\u202f]?\d)/;
const SHAPE = /^([+-]?) *([\d.,]*)(.*)$/s;

/**
 * What a person typed or an instrument sent → decimal string, one rule for browser and server.
 *
 * One decimal mark, point or comma; minus as U+002D, U+2212 or U+2013; a leading plus; any spaces around; a unit
 * behind. Whatever could be read in two ways is refused, never guessed: a single comma is always the decimal
 * mark, two marks are an error. No-break and thin spaces between groups of three digits are grouping, an ordinary
 * space between digits is not. Typed trailing zeros are kept; there is no minus zero.
 *
 * @param text as typed, kept elsewhere unchanged
 * @param opts.defaultUnit unit of the field, used where none was typed
 * @example parseNumber('−0,003mm') → { ok: true, value: '-0.003', unit: 'mm', decimals: 3 }
 */
export function parseNumber(text: string, opts: { defaultUnit?: Unit } = {}): ParsedNumber {
  const usual = PLAIN.exec(text);
  if (usual) return asRead(usual[1]!, usual[2]!, usual[3] ?? '', opts.defaultUnit ?? null);
  const visible = text.replace(INVISIBLE, '');
  const trimmed = visible.replace(/^[\s\u0085]+|[\s\u0085]+$/g, '');
  if (trimmed === '') return { ok: false, problem: 'Nothing is written here.' };
  if (trimmed.length > MAX_LENGTH) return { ok: false, problem: `Longer than ${MAX_LENGTH} characters.` };

  const ascii = trimmed
    .replace(/[\u2212\u2013]/g, '-')
    .replace(/\u03bc/g, 'µ')
    .replace(/\u2103/g, '°C');
  const ungrouped = removeGrouping(ascii);
  if (ungrouped === null) {
    return {
      ok: false,
      problem: 'The spaces do not stand between groups of three digits. Write the number without spaces.',
    };
  }
  const [, sign = '', digits = '', rest = ''] = SHAPE.exec(ungrouped.replace(SPACE, ' '))!;
  const problem = problemWith(digits, rest);
  if (problem) return { ok: false, problem };

  const unitText = rest.trim();
  const unit = unitText === '' ? (opts.defaultUnit ?? null) : SPELLINGS[unitText];
  if (unit === undefined) return { ok: false, problem: unitProblem(unitText) };

  const [whole = '', fraction = ''] = digits.split(/[.,]/);
  return asRead(sign, whole, fraction, unit);
}

function asRead(sign: string, whole: string, fraction: string, unit: Unit | null): ParsedNumber {
  const plainWhole = whole.replace(/^0+(?=\d)/, '') || '0';
  const unsigned = fraction ? `${plainWhole}.${fraction}` : plainWhole;
  const negative = sign !== '' && sign !== '+' && /[1-9]/.test(unsigned);
  return { ok: true, value: negative ? `-${unsigned}` : unsigned, unit, decimals: fraction.length };
}

/** Grouping spaces taken out; null where they stand elsewhere than between groups of three. */
function removeGrouping(text: string): string | null {
  const start = text.search(/\d/);
  if (start < 0 || !GROUP_SPACE.test(text)) return text;
  const head = text.slice(0, start);
  const tail = text.slice(start);
  const match = GROUPED.exec(tail);
  if (!match || /[.,]/.test(head)) return null;
  const joined = match[0].replace(/\D/g, '') + tail.slice(match[0].length);
  return GROUP_SPACE.test(joined) ? null : head + joined;
}

function problemWith(digits: string, rest: string): string | null {
  const points = digits.split('.').length - 1;
  const commas = digits.split(',').length - 1;
  if (points > 0 && commas > 0) {
    return 'There is a point and a comma: it is not clear which is the decimal mark. Write one only, without a thousands mark.';
  }
  if (points > 1 || commas > 1) return 'There is more than one decimal mark. Write one only, without a thousands mark.';
  if (!/\d/.test(digits)) return noDigitsProblem(digits, rest);
  if (/^ *[+-]/.test(rest)) return 'A sign stands behind the number. Write it in front.';
  if (/^[eE][+-]?\d/.test(rest)) return 'Powers of ten are not read here. Write the number in full.';
  if (/^ *['’]\d/.test(rest))
    return 'An apostrophe stands between the digits. Write the number without a thousands mark.';
  if (/^ +[\d.,]/.test(rest))
    return 'There are two numbers here, or a space inside one. Write one number without spaces.';
  if (/\d/.test(rest)) return 'There is something else among the digits. Write one number, then its unit.';
  return null;
}

function noDigitsProblem(digits: string, rest: string): string {
  if (/^[+-]/.test(rest.trim())) return 'There is more than one sign. Write one in front of the number.';
  if (/\d/.test(rest)) return 'The number must come first, then its unit.';
  return digits === '' && rest.trim() !== '' ? 'This is not a number.' : 'The digits are missing.';
}

function unitProblem(unit: string): string {
  if (unit === '″' || unit === "''") return 'This sign can mean inch or seconds of arc. Write in or arcsec.';
  return `The unit “${unit}” is not known here. Known: mm, µm, in, °C, °, µm/m, mm/m, arcsec.`;
}
