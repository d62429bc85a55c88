import { nth } from '../decimals/nth';

/** A square matrix, row by row. */
export type Matrix = readonly (readonly number[])[];

/** The identity minus the derivatives of a map, by central differences; columns are directions. */
export function jacobianOfRest(
  map: (x: readonly number[]) => readonly number[],
  at: readonly number[],
  smallest: number,
): number[][] {
  const columns = at.map((value, k) => {
    // The cube root of a double's precision balances rounding against curvature.
    const step = Math.max(Math.abs(value), smallest) * 6e-6;
    const moved = (by: number) => map(at.map((other, i) => (i === k ? other + by : other)));
    const [ahead, behind] = [moved(step), moved(-step)];
    return ahead.map((y, i) => (y - nth(behind, i)) / (2 * step));
  });
  return at.map((_, i) => columns.map((column, k) => (i === k ? 1 : 0) - nth(column, i)));
}

/** Solves A x = b by elimination with partial pivoting; undefined where A is singular. */
export function solveLinear(matrix: Matrix, right: readonly number[]): number[] | undefined {
  const rows = matrix.map((row, i) => [...row, nth(right, i)]);
  const size = rows.length;
  for (let column = 0; column < size; column++) {
    let pivot = column;
    for (let i = column + 1; i < size; i++) {
      if (Math.abs(nth(nth(rows, i), column)) > Math.abs(nth(nth(rows, pivot), column))) pivot = i;
    }
    const chosen = nth(rows, pivot);
    if (!(Math.abs(nth(chosen, column)) > 0)) return undefined;
    [rows[pivot], rows[column]] = [nth(rows, column), chosen];
    for (let i = column + 1; i < size; i++) {
      const row = nth(rows, i);
      const factor = nth(row, column) / nth(chosen, column);
      if (factor === 0) continue;
      for (let k = column; k <= size; k++) row[k] = nth(row, k) - factor * nth(chosen, k);
    }
  }
  const x: number[] = Array.from({ length: size }, () => 0);
  for (let i = size - 1; i >= 0; i--) {
    const row = nth(rows, i);
    const known = x.reduce((sum, value, k) => (k > i ? sum + nth(row, k) * value : sum), 0);
    x[i] = (nth(row, size) - known) / nth(row, i);
  }
  return x.every(Number.isFinite) ? x : undefined;
}
