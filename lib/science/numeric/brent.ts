/**
 * Root of a continuous function inside a bracket, by Brent's method (Brent 1973, chapter 4).
 * `f(low)` and `f(high)` must differ in sign or one of them be zero. Returns the abscissa to within
 * `tolerance` plus a few units in the last place.
 */
export function brent(f: (x: number) => number, low: number, high: number, tolerance = 1e-12): number {
  let a = low
  let b = high
  let fa = f(a)
  let fb = f(b)
  if (fa === 0) return a
  if (fb === 0) return b
  if (fa > 0 === fb > 0) throw new RangeError('No sign change in the bracket')
  let c = a
  let fc = fa
  let step = b - a
  let before = step
  for (let i = 0; i < 200; i += 1) {
    if (fb > 0 === fc > 0) {
      c = a
      fc = fa
      step = b - a
      before = step
    }
    if (Math.abs(fc) < Math.abs(fb)) {
      a = b
      b = c
      c = a
      fa = fb
      fb = fc
      fc = fa
    }
    const limit = 2 * Number.EPSILON * Math.abs(b) + 0.5 * tolerance
    const half = 0.5 * (c - b)
    if (Math.abs(half) <= limit || fb === 0) return b
    if (Math.abs(before) >= limit && Math.abs(fa) > Math.abs(fb)) {
      const s = fb / fa
      let p: number
      let q: number
      if (a === c) {
        p = 2 * half * s
        q = 1 - s
      } else {
        const u = fa / fc
        const v = fb / fc
        p = s * (2 * half * u * (u - v) - (b - a) * (v - 1))
        q = (u - 1) * (v - 1) * (s - 1)
      }
      if (p > 0) q = -q
      else p = -p
      if (2 * p < Math.min(3 * half * q - Math.abs(limit * q), Math.abs(before * q))) {
        before = step
        step = p / q
      } else {
        step = half
        before = half
      }
    } else {
      step = half
      before = half
    }
    a = b
    fa = fb
    b += Math.abs(step) > limit ? step : Math.sign(half) * limit
    fb = f(b)
  }
  return b
}
