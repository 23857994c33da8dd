import { at } from './at'

/** Number of coefficients of a fit. */
export const ORDER = 14

/** Powers of t of the shifted Chebyshev polynomials T_k(2t - 1), row by row. */
const powers: readonly Float64Array[] = (() => {
  const rows: Float64Array[] = []
  for (let k = 0; k < ORDER; k += 1) {
    const row = new Float64Array(ORDER)
    if (k === 0) row[0] = 1
    else if (k === 1) row.set([-1, 2])
    else {
      const previous = rows[k - 1] ?? row
      const before = rows[k - 2] ?? row
      for (let j = 0; j < ORDER; j += 1) {
        row[j] = 4 * (j > 0 ? at(previous, j - 1) : 0) - 2 * at(previous, j) - at(before, j)
      }
    }
    rows.push(row)
  }
  return rows
})()

const nodes = Float64Array.from({ length: ORDER }, (_, i) => Math.cos((Math.PI * (i + 0.5)) / ORDER))
const cosines = Float64Array.from({ length: ORDER * ORDER }, (_, index) =>
  Math.cos((Math.PI * Math.floor(index / ORDER) * ((index % ORDER) + 0.5)) / ORDER),
)

/**
 * Polynomial through f at the Chebyshev points of [low, high], as powers of t = (s - low) / (high - low).
 * `tail` is the size of the last two Chebyshev terms, an estimate of the error; `largest` that of the largest.
 */
export function chebyshevFit(
  f: (s: number) => number,
  low: number,
  high: number,
): { coefficients: Float64Array; tail: number; largest: number } {
  const values = nodes.map((node) => f(0.5 * (low + high) + 0.5 * (high - low) * node))
  const coefficients = new Float64Array(ORDER)
  let tail = 0
  let largest = 0
  for (let k = 0; k < ORDER; k += 1) {
    let c = 0
    for (let i = 0; i < ORDER; i += 1) c += at(values, i) * at(cosines, k * ORDER + i)
    c *= (k === 0 ? 1 : 2) / ORDER
    largest = Math.max(largest, Math.abs(c))
    if (k >= ORDER - 2) tail = Math.max(tail, Math.abs(c))
    const row = powers[k]
    if (row) for (let j = 0; j <= k; j += 1) coefficients[j] = at(coefficients, j) + c * at(row, j)
  }
  return { coefficients, tail, largest }
}
