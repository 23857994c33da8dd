import { slot } from './slot'

/** A polynomial as powers of t = (s - low) / (high - low), with what its last Chebyshev terms say of its error. */
export interface Fit {
  readonly coefficients: Float64Array
  /** Size of the last two Chebyshev terms, an estimate of the error. */
  readonly tail: number
  /** Size of the largest term. */
  readonly largest: number
}

/** Interpolation at the Chebyshev points of an interval by polynomials of `order` coefficients. */
export interface ChebyshevBasis {
  readonly order: number
  /** The points on [0, 1]. */
  readonly nodes: Float64Array
  /** Polynomial through the values at the nodes, read from `values` at `offset` on. */
  through(values: Float64Array, offset?: number): Fit
}

/** Powers of t of the shifted Chebyshev polynomials T_k(2t - 1), row by row. */
function powersOf(order: number): Float64Array {
  const rows = new Float64Array(order * order)
  const get = (k: number, j: number): number => (j < 0 ? 0 : slot(rows, k * order + j))
  rows[0] = 1
  if (order > 1) rows.set([-1, 2], order)
  for (let k = 2; k < order; k += 1) {
    for (let j = 0; j <= k; j += 1) {
      rows[k * order + j] = 4 * get(k - 1, j - 1) - 2 * get(k - 1, j) - get(k - 2, j)
    }
  }
  return rows
}

export function createChebyshevBasis(order: number): ChebyshevBasis {
  const powers = powersOf(order)
  const nodes = Float64Array.from(
    { length: order },
    (_, i) => 0.5 + 0.5 * Math.cos((Math.PI * (i + 0.5)) / order),
  )
  const cosines = Float64Array.from({ length: order * order }, (_, index) =>
    Math.cos((Math.PI * Math.floor(index / order) * ((index % order) + 0.5)) / order),
  )
  return {
    order,
    nodes,
    through(values, offset = 0) {
      const coefficients = new Float64Array(order)
      let tail = 0
      let largest = 0
      for (let k = 0; k < order; k += 1) {
        let c = 0
        for (let i = 0; i < order; i += 1) c += slot(values, offset + i) * slot(cosines, k * order + i)
        c *= (k === 0 ? 1 : 2) / order
        largest = Math.max(largest, Math.abs(c))
        if (k >= order - 2) tail = Math.max(tail, Math.abs(c))
        for (let j = 0; j <= k; j += 1)
          coefficients[j] = slot(coefficients, j) + c * slot(powers, k * order + j)
      }
      return { coefficients, tail, largest }
    },
  }
}

/** Number of coefficients of an ordinary fit. */
export const ORDER = 14
const ordinary = createChebyshevBasis(ORDER)

/** Polynomial through f at the Chebyshev points of [low, high]. */
export function chebyshevFit(f: (s: number) => number, low: number, high: number): Fit {
  const values = new Float64Array(ORDER)
  for (let i = 0; i < ORDER; i += 1) values[i] = f(low + (high - low) * slot(ordinary.nodes, i))
  return ordinary.through(values)
}
