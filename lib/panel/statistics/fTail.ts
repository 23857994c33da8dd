const lanczos = [
  676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059, 12.507343278686905,
  -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
]

/** ln Γ(x), x > 0, by the approximation of Lanczos (1964); good to some 1e-14. */
export function logGamma(x: number): number {
  if (x < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * x)) - logGamma(1 - x)
  const shifted = x - 1
  const sum = lanczos.reduce(
    (total, coefficient, index) => total + coefficient / (shifted + index + 1),
    0.99999999999980993,
  )
  const t = shifted + 7.5
  return 0.5 * Math.log(2 * Math.PI) + (shifted + 0.5) * Math.log(t) - t + Math.log(sum)
}

/** Continued fraction of the incomplete beta function (Abramowitz & Stegun 26.5.8), by Lentz's method. */
function betaFraction(x: number, a: number, b: number): number {
  const tiny = 1e-300
  const guard = (value: number) => (Math.abs(value) < tiny ? tiny : value)
  let c = 1
  let d = 1 / guard(1 - ((a + b) * x) / (a + 1))
  let h = d
  for (let m = 1; m <= 300; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m))
    d = 1 / guard(1 + even * d)
    c = guard(1 + even / c)
    h *= d * c
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1))
    d = 1 / guard(1 + odd * d)
    c = guard(1 + odd / c)
    h *= d * c
    if (Math.abs(d * c - 1) < 1e-15) break
  }
  return h
}

function incompleteBeta(x: number, a: number, b: number): number {
  if (x <= 0) return 0
  if (x >= 1) return 1
  const front = Math.exp(logGamma(a + b) - logGamma(a) - logGamma(b) + a * Math.log(x) + b * Math.log1p(-x))
  return x < (a + 1) / (a + b + 2)
    ? (front * betaFraction(x, a, b)) / a
    : 1 - (front * betaFraction(1 - x, b, a)) / b
}

/** P(F > f) for the F distribution with the two degrees of freedom given. */
export function fTail(f: number, between: number, within: number): number {
  if (f <= 0) return 1
  return incompleteBeta(within / (within + between * f), within / 2, between / 2)
}
