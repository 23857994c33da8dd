const GOLDEN = (3 - Math.sqrt(5)) / 2

/**
 * Abscissa of the minimum of a function with one minimum in the bracket, by golden section.
 * The abscissa is good to about the square root of the machine's precision, which is all a minimum allows.
 */
export function minimum(f: (x: number) => number, low: number, high: number, tolerance = 1e-9): number {
  let a = low
  let b = high
  let x = a + GOLDEN * (b - a)
  let y = b - GOLDEN * (b - a)
  let fx = f(x)
  let fy = f(y)
  while (b - a > tolerance) {
    if (fx < fy) {
      b = y
      y = x
      fy = fx
      x = a + GOLDEN * (b - a)
      fx = f(x)
    } else {
      a = x
      x = y
      fx = fy
      y = b - GOLDEN * (b - a)
      fy = f(y)
    }
  }
  return 0.5 * (a + b)
}
