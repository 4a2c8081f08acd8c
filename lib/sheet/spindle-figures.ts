import type { ResultOf } from '@/lib/evaluation';
import { Fraction } from '@/lib/units/fraction';
import { type Figure, shown, slope, um } from './figure-text';
import type { Judgement } from './types';

export function runOutFigures(result: ResultOf<'run-out'>, judgement: Judgement): Figure[] {
  const { perInsertion, eccentricity, phase, spread } = result;
  const list: Figure[] = [];
  if (eccentricity !== undefined && phase !== undefined)
    list.push({ label: 'eccentricity', value: `${um(eccentricity)} at ${shown(phase, '1')}°` });
  if (perInsertion.length === 1) return list;
  const totals = perInsertion.map(({ totalIndicatorReading }) => shown(totalIndicatorReading, '0.1')).join(', ');
  const wide = judgement.toleranceUm !== null && times(spread, 4).compare(Fraction.from(judgement.toleranceUm)) > 0;
  return [
    { label: 'total readings', value: `${totals} µm` },
    {
      label: 'spread of the insertions',
      value: `${um(spread)}${wide ? ', more than a quarter of the tolerance' : ''}`,
    },
    ...list,
  ];
}

export function coaxialityFigures(result: ResultOf<'coaxiality'>, input: unknown): Figure[] {
  const positions = sectionPositions(input);
  const sections = result.sections.map(({ ex, ey, offset, closure }, k) => ({
    label: `section at ${positions[k]} mm`,
    value: `offset ${um(offset)}, ex ${um(ex)}, ey ${um(ey)}, closure ${um(closure)}`,
  }));
  if (result.tilt === undefined || result.tiltX === undefined || result.tiltY === undefined) return sections;
  const tilt = `${slope(result.tilt)} (x ${slope(result.tiltX)}, y ${slope(result.tiltY)})`;
  return [...sections, { label: 'tilt between the sections', value: tilt }];
}

export function rotationFigures(result: ResultOf<'axis-of-rotation'>, tilt: boolean): Figure[] {
  const text = (value: string) => (tilt ? slope(value) : um(value, '0.01'));
  const names: [label: string, value: string | undefined][] = [
    ['total', result.total],
    ['synchronous', result.synchronous],
    ['asynchronous', result.asynchronous],
    ['once per turn', 'fundamental' in result ? result.fundamental : undefined],
    ['synchronous without once per turn', 'residualSynchronous' in result ? result.residualSynchronous : undefined],
    ['eccentricity, taken out', 'eccentricity' in result ? result.eccentricity : undefined],
  ];
  return names.flatMap(([label, value]) => (value === undefined ? [] : [{ label, value: text(value) }]));
}

export const axialRunOutFigures = (result: ResultOf<'axial-run-out'>, input: unknown): Figure[] =>
  circleNames(input).map((label, k) => ({ label, value: um(result.perCircle[k]!) }));

const circleNames = (input: unknown): string[] =>
  (input as { circles: { name?: string }[] }).circles.map(({ name }, k) => name ?? `circle ${k + 1}`);

function sectionPositions(input: unknown): string[] {
  const { sections } = input as { sections: { position: string }[] };
  return sections.map(({ position }) => position);
}

function times(value: string, factor: number): Fraction {
  return Fraction.from(value).times(Fraction.of(factor));
}
