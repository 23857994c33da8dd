const SERIES_TO = 2.2
const TERMS = 60

/**
 * Error function, 2/sqrt(pi) times the integral of exp(-t^2) from 0 to x, to some 1e-15: by its Maclaurin
 * series near 0 (Abramowitz & Stegun 1964, 7.1.6) and the continued fraction of its complement beyond (7.1.14).
 */
export function erf(x: number): number {
  if (x < 0) return -erf(-x)
  if (x > 6) return 1
  if (x < SERIES_TO) {
    let term = x
    let sum = x
    for (let n = 1; n < TERMS; n += 1) {
      term *= (2 * x * x) / (2 * n + 1)
      sum += term
      if (term < 1e-17 * sum) break
    }
    return (2 / Math.sqrt(Math.PI)) * Math.exp(-x * x) * sum
  }
  let fraction = x
  for (let n = TERMS; n >= 1; n -= 1) fraction = x + n / 2 / fraction
  return 1 - Math.exp(-x * x) / (Math.sqrt(Math.PI) * fraction)
}
