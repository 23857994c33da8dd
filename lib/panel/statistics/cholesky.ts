import { at } from '@/lib/science/numeric/at'

/** Square matrix, row by row. */
export interface Matrix {
  size: number
  values: Float64Array
}

export const zeros = (size: number): Matrix => ({ size, values: new Float64Array(size * size) })

/** Lower factor L of a symmetric positive definite matrix, A = L Lᵀ; null where it is not one. */
export function cholesky({ size, values }: Matrix): Matrix | null {
  const factor = zeros(size)
  const l = factor.values
  for (let row = 0; row < size; row += 1)
    for (let column = 0; column <= row; column += 1) {
      let sum = at(values, row * size + column)
      for (let k = 0; k < column; k += 1) sum -= at(l, row * size + k) * at(l, column * size + k)
      if (row !== column) l[row * size + column] = sum / at(l, column * size + column)
      else if (sum <= 1e-12 * Math.abs(at(values, row * size + row))) return null
      else l[row * size + row] = Math.sqrt(sum)
    }
  return factor
}

/** Solves L u = b. */
export function forward({ size, values }: Matrix, b: ArrayLike<number>): Float64Array {
  const u = new Float64Array(size)
  for (let row = 0; row < size; row += 1) {
    let sum = at(b, row)
    for (let k = 0; k < row; k += 1) sum -= at(values, row * size + k) * at(u, k)
    u[row] = sum / at(values, row * size + row)
  }
  return u
}

/** Solves Lᵀ x = u. */
export function backward({ size, values }: Matrix, u: ArrayLike<number>): Float64Array {
  const x = new Float64Array(size)
  for (let row = size - 1; row >= 0; row -= 1) {
    let sum = at(u, row)
    for (let k = row + 1; k < size; k += 1) sum -= at(values, k * size + row) * at(x, k)
    x[row] = sum / at(values, row * size + row)
  }
  return x
}

/** log |A| from the factor. */
export function logDeterminant({ size, values }: Matrix): number {
  let sum = 0
  for (let row = 0; row < size; row += 1) sum += 2 * Math.log(at(values, row * size + row))
  return sum
}

/** vᵀ A⁻¹ v from the factor. */
export function quadratic(factor: Matrix, v: ArrayLike<number>): number {
  return forward(factor, v).reduce((sum, value) => sum + value * value, 0)
}
