import type { TestDefinition, ToleranceRule } from '../types';
import { remembered } from './source';

const limitsMm = ['0', '500', '800', '1250', '2000'];

/** Four figures, µm: travels up to 500, 800, 1250 and 2000 mm. Beyond that nothing is remembered. */
function byTravel(figures: [string, string, string, string]): ToleranceRule {
  return {
    by: 'travel',
    steps: figures.map((toleranceUm, k) => ({ overMm: limitsMm[k]!, upToMm: limitsMm[k + 1]!, toleranceUm })),
    provenance: remembered(
      `${figures.map((um) => `.${um.padStart(3, '0')}`).join(' / ')} for travels up to 500 / 800 / 1250 / 2000 mm`,
    ),
  };
}

/** One figure, seconds of arc, for axes of 360°. */
const seconds = (figure: string): ToleranceRule => ({
  by: 'all',
  unit: '″',
  allUm: figure,
  provenance: remembered(`${figure}″ for a rotary axis of 360°`),
});

export const linearA = byTravel(['22', '25', '32', '42']);
export const linearAlso: NonNullable<TestDefinition['also']> = [
  { figure: 'R', label: 'R, bidirectional repeatability', tolerance: byTravel(['12', '15', '18', '20']) },
  { figure: 'Rforward', label: 'R in the + direction', tolerance: byTravel(['6', '8', '10', '13']) },
  { figure: 'Rbackward', label: 'R in the − direction', tolerance: byTravel(['6', '8', '10', '13']) },
  { figure: 'B', label: 'B, largest reversal', tolerance: byTravel(['10', '10', '12', '12']) },
  { figure: 'meanB', label: 'mean reversal', tolerance: byTravel(['6', '6', '8', '8']) },
  { figure: 'E', label: 'E, bidirectional systematic error', tolerance: byTravel(['15', '18', '23', '30']) },
  { figure: 'M', label: 'M, range of the mean bidirectional errors', tolerance: byTravel(['10', '12', '15', '20']) },
];

export const rotaryA = seconds('28');
export const rotaryAlso: NonNullable<TestDefinition['also']> = [
  { figure: 'R', label: 'R, bidirectional repeatability', tolerance: seconds('16') },
  { figure: 'Rforward', label: 'R in the + direction', tolerance: seconds('10') },
  { figure: 'Rbackward', label: 'R in the − direction', tolerance: seconds('10') },
  { figure: 'B', label: 'B, largest reversal', tolerance: seconds('12') },
  { figure: 'meanB', label: 'mean reversal', tolerance: seconds('8') },
  { figure: 'E', label: 'E, bidirectional systematic error', tolerance: seconds('20') },
  { figure: 'M', label: 'M, range of the mean bidirectional errors', tolerance: seconds('12') },
];
