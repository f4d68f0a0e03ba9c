/** Coefficients that minimise the squared misfit of rows . coefficients = values (normal equations; few unknowns). */
export function leastSquares(rows: number[][], values: number[]): number[] {
  const unknowns = rows[0].length;
  const matrix = Array.from({ length: unknowns }, (_, i) => [
    ...Array.from({ length: unknowns }, (_, j) => rows.reduce((sum, row) => sum + row[i] * row[j], 0)),
    rows.reduce((sum, row, index) => sum + row[i] * values[index], 0),
  ]);
  for (let pivot = 0; pivot < unknowns; pivot++) {
    for (let row = pivot + 1; row < unknowns; row++) {
      const factor = matrix[row][pivot] / matrix[pivot][pivot];
      for (let column = pivot; column <= unknowns; column++) matrix[row][column] -= factor * matrix[pivot][column];
    }
  }
  const solution = new Array<number>(unknowns).fill(0);
  for (let row = unknowns - 1; row >= 0; row--) {
    const known = solution.reduce((sum, value, column) => (column > row ? sum + value * matrix[row][column] : sum), 0);
    solution[row] = (matrix[row][unknowns] - known) / matrix[row][row];
  }
  return solution;
}
