import { decimalsOf } from '@/components/plots/number';
import type { PassBlock, TestBlock } from '@/lib/reporting/report-model';
import { formatDecimal } from '@/lib/units/format';

/** The pass that is judged in the end: as left, else as found. */
export function finalPass(block: TestBlock): PassBlock | null {
  const judged = block.passes.filter((pass) => pass.kind !== 'adjusting' && pass.resultMm !== null);
  return judged.findLast((pass) => pass.kind === 'as-left') ?? judged.at(-1) ?? null;
}

/** A figure of the judgement, µm, in the resolution of the result; at least a tenth, so that a small margin is not lost. */
export const inMicrometres = (um: string, pass: PassBlock): string =>
  formatDecimal(um, { decimals: Math.max(1, decimalsOf(pass.resultUm ?? '')) });
