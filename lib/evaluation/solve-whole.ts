/**
 * Exact solution of a square system of whole numbers by fraction-free elimination (Bareiss).
 * @returns x_k = numerators[k] / determinant, null where the determinant is zero
 */
export function solveWhole(
  matrix: readonly (readonly bigint[])[],
  right: readonly bigint[],
): { numerators: bigint[]; determinant: bigint } | null {
  const size = right.length;
  const rows = matrix.map((row, r) => [...row, right[r]!]);
  let previous = 1n;
  for (let k = 0; k < size; k++) {
    const pivotRow = rows.findIndex((row, r) => r >= k && row[k] !== 0n);
    if (pivotRow < 0) return null;
    [rows[k], rows[pivotRow]] = [rows[pivotRow]!, rows[k]!];
    const pivot = rows[k]![k]!;
    for (let r = 0; r < size; r++) {
      if (r === k) continue;
      const factor = rows[r]![k]!;
      for (let c = k + 1; c <= size; c++) rows[r]![c] = (rows[r]![c]! * pivot - factor * rows[k]![c]!) / previous;
      if (r < k) rows[r]![r] = (rows[r]![r]! * pivot) / previous;
      rows[r]![k] = 0n;
    }
    previous = pivot;
  }
  // Gauss–Jordan without fractions leaves the determinant (up to row swaps, which cancel) on the whole diagonal.
  return { numerators: rows.map((row) => row[size]!), determinant: rows[size - 1]![size - 1]! };
}
