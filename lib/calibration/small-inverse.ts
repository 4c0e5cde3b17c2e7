/**
 * Inverse of a small square matrix by Gauss and Jordan with pivoting.
 * @param matrix rows [any]
 * @returns inverse [1/any]; undefined where the matrix is singular
 * @see G. H. Golub & C. F. Van Loan, Matrix Computations, 3rd ed. 1996, sec. 3.4 (from memory)
 */
export function smallInverse(matrix: readonly (readonly number[])[]): number[][] | undefined {
  const n = matrix.length;
  const rows = matrix.map((row, i) => [...row, ...Array.from({ length: n }, (_, j) => (i === j ? 1 : 0))]);
  for (let column = 0; column < n; column++) {
    let best = column;
    for (let i = column + 1; i < n; i++)
      if (Math.abs(rows[i]![column]!) > Math.abs(rows[best]![column]!)) best = i;
    const pivot = rows[best]!;
    rows[best] = rows[column]!;
    const head = pivot[column]!;
    if (!(Math.abs(head) > 0)) return undefined;
    rows[column] = pivot.map((value) => value / head);
    for (let i = 0; i < n; i++) {
      if (i === column) continue;
      const factor = rows[i]![column]!;
      rows[i] = rows[i]!.map((value, j) => value - factor * rows[column]![j]!);
    }
  }
  return rows.map((row) => row.slice(n));
}
