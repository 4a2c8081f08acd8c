import type { PassBlock, TestBlock } from '@/lib/reporting/report-model';

/** The pass that is judged in the end: as left, else as found. */
export function finalPass(block: TestBlock): PassBlock | null {
  const judged = block.passes.filter((pass) => pass.kind !== 'adjusting' && pass.resultMm !== null);
  return judged.findLast((pass) => pass.kind === 'as-left') ?? judged.at(-1) ?? null;
}
