import { slot } from './slot'
import { chebyshevFit, ORDER } from './chebyshevFit'

/**
 * A smooth function kept as polynomials on even pieces of [low, high]; outside it is computed. Made for
 * functions whose nearest singularity lies some seven piece-widths off: no check of convergence is made.
 */
export function createSmoothTable(
  f: (x: number) => number,
  low: number,
  high: number,
  width: number,
): (x: number) => number {
  const count = Math.ceil((high - low) / width)
  const coefficients = new Float64Array(count * ORDER)
  for (let i = 0; i < count; i += 1) {
    const from = low + i * width
    coefficients.set(chebyshevFit(f, from, from + width).coefficients, i * ORDER)
  }
  return (x) => {
    const s = (x - low) / width
    if (!(s >= 0 && s < count)) return f(x)
    const i = Math.floor(s)
    const t = s - i
    const base = i * ORDER
    let value = slot(coefficients, base + ORDER - 1)
    for (let j = ORDER - 2; j >= 0; j -= 1) value = value * t + slot(coefficients, base + j)
    return value
  }
}
