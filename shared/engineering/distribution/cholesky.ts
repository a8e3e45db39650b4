/**
 * Factor of a symmetric positive definite matrix (row-major, `size x size`) scaled by its diagonal, so that displacements and
 * rotations meet on one footing. Null where a pivot vanishes: the structure can move freely.
 */
export interface CholeskyFactor {
  readonly size: number;
  readonly lower: Float64Array;
  readonly scale: Float64Array;
}

export function choleskyFactor(matrix: Float64Array, size: number): CholeskyFactor | null {
  const scale = new Float64Array(size);
  for (let row = 0; row < size; row += 1) {
    const diagonal = matrix[row * size + row] ?? 0;
    if (!(diagonal > 0)) return null;
    scale[row] = 1 / Math.sqrt(diagonal);
  }
  const lower = new Float64Array(size * size);
  for (let row = 0; row < size; row += 1) {
    for (let column = 0; column <= row; column += 1) {
      let sum = (matrix[row * size + column] ?? 0) * (scale[row] ?? 0) * (scale[column] ?? 0);
      for (let index = 0; index < column; index += 1) {
        sum -= (lower[row * size + index] as number) * (lower[column * size + index] as number);
      }
      if (row === column) {
        if (!(sum > 1e-14)) return null;
        lower[row * size + row] = Math.sqrt(sum);
      } else lower[row * size + column] = sum / (lower[column * size + column] as number);
    }
  }
  return { size, lower, scale };
}

/** Solves with the factor; `right` is left as it is. */
export function choleskySolve({ size, lower, scale }: CholeskyFactor, right: Float64Array): Float64Array {
  const result = new Float64Array(size);
  for (let row = 0; row < size; row += 1) {
    let sum = (right[row] as number) * (scale[row] as number);
    for (let column = 0; column < row; column += 1)
      sum -= (lower[row * size + column] as number) * (result[column] as number);
    result[row] = sum / (lower[row * size + row] as number);
  }
  for (let row = size - 1; row >= 0; row -= 1) {
    let sum = result[row] as number;
    for (let below = row + 1; below < size; below += 1)
      sum -= (lower[below * size + row] as number) * (result[below] as number);
    result[row] = sum / (lower[row * size + row] as number);
  }
  for (let row = 0; row < size; row += 1) result[row] = (result[row] as number) * (scale[row] as number);
  return result;
}
