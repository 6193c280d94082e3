/**
 * Solves a small linear system in place by elimination with row exchange.
 * `augmented` holds n rows of n + 1 numbers, the right side last; the solution replaces the right side.
 * Range: n up to about 20, regular matrices. Cost: n³/3 multiplications.
 */
export function solveDense(augmented: Float64Array, n: number): void {
  const width = n + 1;
  for (let column = 0; column < n; column++) {
    let best = column;
    for (let row = column + 1; row < n; row++) {
      if (Math.abs(augmented[row * width + column]) > Math.abs(augmented[best * width + column])) best = row;
    }
    if (best !== column) {
      for (let k = column; k < width; k++) {
        const kept = augmented[column * width + k];
        augmented[column * width + k] = augmented[best * width + k];
        augmented[best * width + k] = kept;
      }
    }
    const pivot = augmented[column * width + column];
    for (let row = column + 1; row < n; row++) {
      const factor = augmented[row * width + column] / pivot;
      if (factor === 0) continue;
      for (let k = column; k < width; k++)
        augmented[row * width + k] -= factor * augmented[column * width + k];
    }
  }
  for (let row = n - 1; row >= 0; row--) {
    let sum = augmented[row * width + n];
    for (let k = row + 1; k < n; k++) sum -= augmented[row * width + k] * augmented[k * width + n];
    augmented[row * width + n] = sum / augmented[row * width + row];
  }
}
