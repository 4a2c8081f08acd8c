import type { Provenance, ToleranceRule } from '../types';
import { remembered } from './source';
import { minimumUm } from './tolerances';

/** Tolerances of the tailstock tests, µm; remembered starter values like all of this code. */
const local = {
  toleranceUm: '20',
  lengthMm: '500',
  provenance: remembered('.02 over any 500, remembered for the whole row, both planes', 'low'),
};

function motion(toleranceUm: string, text: string): ToleranceRule {
  return {
    by: 'centre-distance',
    steps: [{ overMm: '0', upToMm: '1000', toleranceUm }],
    local,
    provenance: remembered(`${text} up to 1000 between centres; nothing is remembered beyond`, 'low'),
  };
}

export const tailstockMotionZx = motion('20', '.020');
export const tailstockMotionYz = motion('30', '.030');

/** What ISO 1708 and an engine-lathe sheet give; that the code for NC machines has the same is not certain. */
const asEngineLathe = (text: string): Provenance =>
  remembered(
    `${text}, as remembered for ISO 1708 and printed in the accuracy sheet of an engine-lathe manual; not certain for this code`,
    'low',
  );

const over = (allUm: string, baseLengthMm: string, provenance: Provenance): ToleranceRule => ({
  by: 'all',
  allUm,
  perLength: { baseLengthMm, minimumUm },
  provenance,
});

export const quillMotionZx = over('15', '100', asEngineLathe('.015 over 100'));
export const quillMotionYz = over('20', '100', asEngineLathe('.020 over 100'));
export const quillTaper = over('20', '300', remembered('.020 over 300', 'low'));

/** End difference of a mandrel between centres: never worked out for another length. */
export const centresZx: ToleranceRule = { by: 'all', allUm: '20', provenance: remembered('.020', 'low') };
export const centresYz: ToleranceRule = {
  by: 'all',
  allUm: '40',
  provenance: asEngineLathe('.040, tailstock higher only'),
};
