import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import type { ExplainedStep } from './explanation';
import { alike, extremes, fig, negative, um, umPerM } from './figures';
import { maximum } from './run-outs';

type Quarter = '0' | '90' | '180' | '270';
type Sweep = Record<Quarter, string>;
interface Taken {
  surface?: string;
  sag?: string;
  up?: string;
}

const isZero = (text: string) => Fraction.from(text).sign() === 0;

/** ex or ey of one sweep, with the part of the bracket's sag along it. */
function offsetStep(sweep: Sweep, axis: 'ex' | 'ey', taken: Taken, value: string, what: string): ExplainedStep {
  const [plus, minus]: [Quarter, Quarter] = axis === 'ex' ? ['0', '180'] : ['90', '270'];
  const { surface, sag = '0', up = '90' } = taken;
  const turn = surface === 'bore' ? '−1 · ' : '';
  const along = axis === 'ex' ? 'cos' : 'sin';
  const upright = Fraction.from(up).equals(Fraction.of(90));
  // With the indicator on top at 90° all of the sag lies along ey.
  const hangs = !isZero(sag) && !(upright && axis === 'ex');
  const symbol = !hangs ? '' : upright ? ' − sag' : ` − sag · ${along} up`;
  const number = !hangs ? '' : ` − ${fig(sag)}${upright ? '' : ` · ${along}(${fig(up)}°)`}`;
  return {
    what: `${what}${hangs ? ', sag of the bracket taken off' : ''}`,
    formula: `${axis} = ${turn}(r${plus} − r${minus}) / 2${symbol}`,
    withNumbers: `${turn}(${fig(sweep[plus])} − ${negative(sweep[minus])}) / 2${number}`,
    value: um(value),
  };
}

function sectionSteps(
  section: { position: string; readings: Sweep },
  centre: { ex: string; ey: string; offset: string; closure: string },
  input: Taken,
): ExplainedStep[] {
  const at = ` at ${fig(section.position)} mm`;
  const { readings: r } = section;
  return [
    offsetStep(r, 'ex', input, centre.ex, `Offset along the first axis${at}`),
    offsetStep(r, 'ey', input, centre.ey, `Offset along the second axis${at}`),
    {
      what: `Closure${at}: 0 where the surface is round and nothing moved`,
      formula: '(r0 + r180) − (r90 + r270)',
      withNumbers: `(${fig(r['0'])} + ${negative(r['180'])}) − (${fig(r['90'])} + ${negative(r['270'])})`,
      value: um(centre.closure),
    },
    {
      what: `Distance of the axes${at}`,
      formula: 'e = √(ex² + ey²)',
      withNumbers: `√(${negative(centre.ex)}² + ${negative(centre.ey)}²)`,
      value: um(centre.offset),
    },
  ];
}

export function coaxialitySteps(
  input: Taken & { sections: { position: string; readings: Sweep }[]; basis?: string; plane?: string },
  result: ResultOf<'coaxiality'>,
): ExplainedStep[] {
  const amounts = result.sections.map(({ ex, ey, offset }) =>
    input.plane === 'x' || input.plane === 'y'
      ? Fraction.from(input.plane === 'x' ? ex : ey)
          .abs()
          .toText()
      : offset,
  );
  const { atLargest } = extremes(amounts);
  const shown = [...new Set([0, 1, 2, atLargest])].filter((k) => k < amounts.length);
  const total = input.basis === 'total-indicator-reading';
  const name = input.plane === 'x' ? '|ex|' : input.plane === 'y' ? '|ey|' : 'e';
  return [
    ...shown.flatMap((k) => sectionSteps(input.sections[k]!, result.sections[k]!, input)),
    ...alike(amounts.length - shown.length),
    ...tiltSteps(result),
    {
      what: `Largest of the sections${total ? ', twice: the total indicator reading' : ''}`,
      formula: total ? `2 · max ${name}` : `max ${name}`,
      withNumbers: `${total ? '2 · ' : ''}${maximum(amounts)}`,
      value: um(result.deviation),
    },
  ];
}

function tiltSteps({ tilt, tiltX, tiltY }: ResultOf<'coaxiality'>): ExplainedStep[] {
  if (tilt === undefined || tiltX === undefined || tiltY === undefined) return [];
  return [
    {
      what: 'Tilt of one axis to the other over the sections, for information',
      formula: '√(tiltX² + tiltY²), slopes of ex and ey by least squares',
      withNumbers: `√(${negative(tiltX)}² + ${negative(tiltY)}²)`,
      value: umPerM(tilt),
    },
  ];
}

export function centreHeightSteps(
  input: Taken & {
    sweep?: Sweep;
    top?: string;
    bottom?: string;
    toolHeight?: string;
    spindleHeight?: string;
    radii?: string[];
  },
  result: ResultOf<'centre-height'>,
): ExplainedStep[] {
  const { sweep, top, bottom } = input;
  const what = 'Height of the tool over the spindle axis';
  const effects: ExplainedStep[] = (result.diameterEffects ?? []).map((effect, k) => ({
    what: `What it does to a diameter turned at radius ${fig(input.radii?.[k] ?? '0')} mm, for information`,
    formula: '2 · (√(r² + ey²) − r), r in µm',
    withNumbers: `2 · (√((1000 · ${fig(input.radii?.[k] ?? '0')})² + ${negative(result.ey)}²) − 1000 · ${fig(input.radii?.[k] ?? '0')})`,
    value: um(effect),
  }));
  if (sweep) {
    const across = offsetStep(sweep, 'ex', input, result.ex ?? '0', 'Offset along X, for information');
    return [across, ...effects, offsetStep(sweep, 'ey', input, result.ey, what)];
  }
  if (top !== undefined && bottom !== undefined) {
    const readings = { '0': '0', '90': top, '180': '0', '270': bottom };
    const step = offsetStep(readings, 'ey', { surface: input.surface, sag: input.sag }, result.ey, what);
    return [...effects, { ...step, formula: step.formula.replace('r90', 'top').replace('r270', 'bottom') }];
  }
  return [
    ...effects,
    {
      what,
      formula: 'ey = height of the tool − height of the spindle',
      withNumbers: `${fig(input.toolHeight ?? '0')} − ${negative(input.spindleHeight ?? '0')}`,
      value: um(result.ey),
    },
  ];
}
