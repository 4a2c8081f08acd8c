import { describe, expect, it } from 'vitest';
import { allDefinitions } from '@/standards/registry';

/** Every test of the fact base that the catalogue was written from, by the code that holds it; a range of ids is written out. */
const wanted: Record<string, string[]> = {
  'ISO 13041-1:2020': [
    ...['SP-1a', 'SP-1b', 'SP-1c', 'SP-2a', 'SP-2b', 'AX-1a', 'AX-1b', 'AX-2', 'AX-3', 'AX-4'],
    ...['AX-5', 'AX-5x', 'AX-5y', 'AX-5s', 'AX-5r', 'AX-6a', 'AX-6b', 'AX-6c', 'AX-7a', 'AX-7b', 'AX-7c'],
    ...['AX-8a', 'AX-8b', 'AX-8c', 'SS-1', 'SS-2a', 'SS-2b', 'SS-3a', 'SS-3b', 'SS-3c', 'SS-3d', 'SS-3e'],
    ...['TS-1a', 'TS-1b', 'TS-2a', 'TS-2b', 'TS-3a', 'TS-3b', 'TS-4a', 'TS-4b'],
    ...['TU-1', 'TU-2a', 'TU-2b', 'TU-3', 'TU-4', 'TU-5', 'TU-6a', 'TU-6b', 'TU-6c', 'TU-6d'],
    ...['TU-7a', 'TU-7b', 'TU-7c', 'TU-7d', 'TU-7e', 'TU-7f', 'TU-7g', 'TU-7h', 'TU-8a', 'TU-8b'],
    ...['TU-9a', 'TU-9b', 'TU-9c', 'TU-9d', 'B-1', 'B-2', 'B-3a', 'B-3b'],
  ],
  'ISO 1708:1989': [
    ...['BD-1a', 'BD-1b', 'SP-1a', 'SP-1b', 'SP-1c', 'SP-2a', 'SP-2b', 'SP-3', 'AX-5', 'AX-1a', 'AX-1b', 'AX-2'],
    ...['TS-1a', 'TS-1b', 'TS-2a', 'TS-2b', 'TS-3a', 'TS-3b', 'TS-4b', 'LS-1', 'LS-2'],
  ],
  'ISO 13041-4:2004': ['PO-A', 'C-1', 'B-4'],
  'ISO 13041-5:2006': ['K-1', 'K-2', 'K-3', 'K-4a', 'K-4b'],
  'ISO 13041-6:2009': ['WP-1', 'WP-1a', 'WP-1b', 'WP-2', 'WP-2b', 'WP-3', 'WP-4', 'WP-5', 'WP-6', 'WP-7'],
  'ISO 13041-7:2004': ['CI-1', 'CI-2', 'CI-3'],
  'ISO 13041-8:2004': ['TH-1', 'TH-2x', 'TH-2y', 'TH-2z', 'TH-3'],
  'ISO 230-7:2015': ['RO-1', 'RO-2', 'RO-3'],
  'common practice': [
    ...['LV-1', 'LV-2', 'LV-3', 'MT-1', 'PO-B', 'TU-3x', 'RP-Z', 'RP-Y', 'RP-S', 'TC-1a', 'TC-1b', 'TC-2'],
    ...['GT-1', 'GT-2', 'GB-1', 'GB-2', 'GB-3a', 'GB-3b', 'GX-1', 'TCH-1', 'SW-1'],
  ],
  'function checks': Array.from({ length: 16 }, (_, k) => `FC-${String(k + 1).padStart(2, '0')}`),
};

const titled = (code: string, edition: string) => (edition ? `${code}:${edition}` : code);

describe('the catalogue holds every test of its fact base', () => {
  it.each(Object.entries(wanted))('%s', (code, ids) => {
    const held = allDefinitions().filter((one) => titled(one.code, one.edition) === code);
    expect(ids.filter((id) => !held.some((one) => one.id === id))).toEqual([]);
  });

  it('ISO 13041-1:2004 has the same tests as the edition of 2020, numbers only where one is remembered', () => {
    const of = (edition: string) =>
      allDefinitions().filter((one) => one.code === 'ISO 13041-1' && one.edition === edition);
    expect(of('2004').map(({ id }) => id)).toEqual(of('2020').map(({ id }) => id));
    expect(of('2020').every(({ testNumber }) => testNumber === undefined)).toBe(true);
    expect(of('2004').filter(({ testNumber }) => testNumber !== undefined).length).toBeGreaterThan(20);
  });

  it('every method of evaluation serves a test', () => {
    const methods = new Set(allDefinitions().map(({ method }) => method));
    expect(methods).toEqual(
      new Set([
        ...[
          'flatness',
          'straightness',
          'straightness-from-angles',
          'straightness-reversal',
          'parallelism',
          'squareness-to-axis',
        ],
        ...[
          'squareness',
          'run-out',
          'axial-run-out',
          'coaxiality',
          'centre-height',
          'angular-deviation',
          'positioning',
        ],
        ...['circular', 'axis-of-rotation', 'indexing', 'lost-motion', 'reference-shift', 'roundness'],
        ...['diameter-consistency', 'drift', 'two-collar', 'function-check'],
      ]),
    );
  });
});
