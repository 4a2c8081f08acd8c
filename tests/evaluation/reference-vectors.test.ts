import { describe, expect, it } from 'vitest';
import { evaluate } from '@/lib/evaluation';
import { roundToDecimals } from '@/lib/units/round';
import { expectAgreement } from './agree';

/** Vectors derived by hand from the formulas; invented readings. */
const rounded = (text: string | undefined, decimals: number) => roundToDecimals(text ?? '', decimals);

describe('reference vectors', () => {
  it('positioning of five targets, five cycles each way', () => {
    const result = evaluate({
      method: 'positioning',
      kind: 'linear',
      targets: ['0', '105', '198', '311', '402'],
      forward: [
        ['.2', '-.1', '.3', '0', '.1'],
        ['1.4', '1.1', '1.6', '1.3', '1.1'],
        ['2.9', '2.6', '3.1', '2.8', '2.6'],
        ['2.2', '2.5', '2', '2.4', '2.4'],
        ['4.1', '3.8', '4.4', '4', '4.2'],
      ],
      backward: [
        ['-1.9', '-2.2', '-1.8', '-2.1', '-2'],
        ['-.6', '-1', '-.7', '-.9', '-.8'],
        ['.9', '.5', '1', '.7', '.9'],
        ['.4', '.1', '.6', '.3', '.1'],
        ['2.2', '1.8', '2.3', '2', '2.2'],
      ],
    });
    expect(result).toMatchObject({ B: '2.1', meanB: '2.04', Eforward: '4', Ebackward: '4.1', E: '6.1', M: '4.05' });
    expect(rounded(result.Rforward, 4)).toBe('0.8944');
    expect(rounded(result.Rbackward, 4)).toBe('0.8485');
    expect(rounded(result.R, 4)).toBe('2.8472');
    expect(rounded(result.Aforward, 4)).toBe('4.7634');
    expect(rounded(result.Abackward, 4)).toBe('4.8162');
    expect(rounded(result.A, 4)).toBe('6.8634');
    expect(result.deviation).toBe(result.A);
    expect(result.at.E).toEqual({ max: '402', min: '0' });
  });

  it('straightness about three lines', () => {
    const points = ['0', '3', '5', '4', '6', '5'].map((reading, k) => ({ position: String(100 * k), reading }));
    const deviation = (reference: 'end-points' | 'least-squares' | 'minimum-zone') =>
      evaluate({ method: 'straightness', reference, points }).deviation;
    expect(deviation('end-points')).toBe('3');
    expect(deviation('least-squares')).toBe('3.11428571428571428571428571429');
    expect(deviation('minimum-zone')).toBe('3');
  });

  it('heights from angles', () => {
    const result = evaluate({
      method: 'straightness-from-angles',
      reference: 'end-points',
      stepLength: '100',
      angles: ['30', '20', '-10', '20', '-10'],
      returnAngles: ['30', '20', '-10', '20', '-8'],
    });
    expect(result.heights).toEqual(['0', '3', '5', '4', '6', '5.1']);
    expect(result.closure).toBe('-0.2');
  });

  it('coaxiality of one sweep', () => {
    const result = evaluate({
      method: 'coaxiality',
      surface: 'outside',
      sections: [{ position: '0', readings: { '0': '10', '90': '4', '180': '2', '270': '8' } }],
    });
    expectAgreement(result.sections[0], { ex: '4', ey: '-2', closure: '0', offset: '4.47213595499957939281834733746' });
    expect(result).not.toHaveProperty('tilt');
  });

  it('parallelism by two angles', () => {
    const result = evaluate({
      method: 'parallelism',
      positions: ['0', '300'],
      readings: { '0': ['0', '12'], '180': ['4', '-2'] },
    });
    expect(result).toMatchObject({ means: ['2', '5'], deviation: '3', fitSlope: '10', reversed: true, signed: true });
  });

  it('squareness to the axis, concave', () => {
    const result = evaluate({
      method: 'squareness-to-axis',
      positions: ['20', '170'],
      readings: { '0': ['0', '-8'] },
      measuringLength: '150',
    });
    expect(result).toMatchObject({ e: '8', deviation: '8', direction: 'concave' });
  });

  it('sag of a solid steel bar ⌀40 × 300', () => {
    const result = evaluate({ method: 'correction', kind: 'mandrel-sag', length: '300', diameter: '40' });
    expect(rounded('sag' in result ? result.sag : '', 4)).toBe('3.7837');
  });

  it('effect of a centre height of 0.1 mm on the diameter', () => {
    const result = evaluate({
      method: 'centre-height',
      toolHeight: '100',
      spindleHeight: '0',
      radii: ['1', '5', '25'],
    });
    expect(result.diameterEffects!.map((effect) => roundToDecimals(effect, 1))).toEqual(['10.0', '2.0', '0.4']);
  });

  it('probability of conformity, guarded acceptance', () => {
    const result = evaluate({
      method: 'conformity',
      deviation: '18',
      signed: false,
      tolerance: '20',
      direction: 'either',
      rule: 'guarded',
      guard: 'U',
      standardUncertainty: '1',
    });
    expect(result.verdict).toBe('within-tolerance');
    expect(result.probability).toBe('0.977249868051820792799717362833');
  });

  it('rounding', () => {
    const round = (value: string, rule: 'half-even' | 'half-away-from-zero') =>
      evaluate({ method: 'rounding', value, resolution: '0.001', rule }).rounded;
    expect(round('0.0125', 'half-even')).toBe('0.012');
    expect(round('0.0125', 'half-away-from-zero')).toBe('0.013');
    expect(round('-0.0004', 'half-even')).toBe('0.000');
  });

  it('coverage factors after the effective degrees of freedom are cut down', () => {
    const factor = (degreesOfFreedom: string, coverage: '0.95' | '0.99') =>
      evaluate({
        method: 'uncertainty',
        coverage,
        components: [{ name: 'one', value: '1', distribution: 'normal', degreesOfFreedom }],
      }).coverageFactor;
    expect(roundToDecimals(factor('18.9987', '0.95'), 3)).toBe('2.093');
    expect(roundToDecimals(factor('16.76', '0.99'), 3)).toBe('2.921');
    expect(roundToDecimals(factor('0.3', '0.95'), 3)).toBe('12.706');
  });
});
