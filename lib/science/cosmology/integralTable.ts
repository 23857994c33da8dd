import { slot } from '../numeric/slot'
import { chebyshevFit, ORDER } from '../numeric/chebyshevFit'
import { ScienceError } from '../ScienceError'

/**
 * A running integral F(s) = integral of g from the table's low end to s, ready to be read many times.
 *
 * Each piece holds g as a polynomial, fitted at Chebyshev points and halved until it converges, and the
 * exact integral of that polynomial. On a piece, F = F_low + (s - s_low) P(t), so that a reading next to the
 * low end of the table keeps its full relative accuracy. A reading costs one search and one Horner sum.
 */
export interface IntegralTable {
  readonly low: number
  readonly high: number
  /** F at the high end. */
  readonly total: number
  /** F(s) for low <= s <= high; s outside is clamped by less than rounding, never extrapolated. */
  read(s: number): number
}

/** Halvings of a piece before its fit is taken as it is: what is left then is rounding. */
const DEEPEST = 10
const CONVERGED = 2e-14

interface Piece {
  readonly low: number
  readonly width: number
  readonly mean: Float64Array
}

function collect(g: (s: number) => number, low: number, high: number, depth: number): Piece[] {
  const { coefficients, tail, largest } = chebyshevFit(g, low, high)
  if (!Number.isFinite(largest))
    throw new ScienceError('bad-parameter', 'These parameters are too extreme to compute with.')
  if (tail <= CONVERGED * largest || depth >= DEEPEST) {
    // Integral of sum b_j t^j over [0, t] is t times sum b_j/(j+1) t^j: the mean of g, times t.
    return [{ low, width: high - low, mean: coefficients.map((b, j) => b / (j + 1)) }]
  }
  const middle = 0.5 * (low + high)
  return [...collect(g, low, middle, depth + 1), ...collect(g, middle, high, depth + 1)]
}

/** Table of the running integral of g between the first and last knot, started from the pieces between knots. */
export function createIntegralTable(g: (s: number) => number, knots: readonly number[]): IntegralTable {
  const low = knots[0] ?? 0
  const high = knots.at(-1) ?? low
  const pieces = knots.slice(1).flatMap((to, i) => collect(g, knots[i] ?? low, to, 0))
  const n = pieces.length
  const lows = Float64Array.from(pieces, (piece) => piece.low)
  const inverseWidths = Float64Array.from(pieces, (piece) => 1 / piece.width)
  const starts = new Float64Array(n)
  const means = new Float64Array(n * ORDER)
  let sum = 0
  for (const [i, piece] of pieces.entries()) {
    starts[i] = sum
    means.set(piece.mean, i * ORDER)
    sum += piece.width * piece.mean.reduce((total, b) => total + b, 0)
  }
  let last = 0

  return {
    low,
    high,
    total: sum,
    read(s) {
      const x = s < low ? low : s > high ? high : s
      let i = last
      if (x < slot(lows, i) || (i + 1 < n && x >= slot(lows, i + 1))) {
        let upper = n
        i = 0
        while (upper - i > 1) {
          const middle = (i + upper) >> 1
          if (slot(lows, middle) <= x) i = middle
          else upper = middle
        }
        last = i
      }
      const offset = x - slot(lows, i)
      const t = offset * slot(inverseWidths, i)
      const base = i * ORDER
      let mean = slot(means, base + ORDER - 1)
      for (let j = ORDER - 2; j >= 0; j -= 1) mean = mean * t + slot(means, base + j)
      return slot(starts, i) + offset * mean
    },
  }
}
