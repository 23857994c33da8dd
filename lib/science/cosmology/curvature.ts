/**
 * Curved space in units of the Hubble distance. `chi` is the line-of-sight comoving distance and
 * q = Ok0 chi^2, negative in closed space. Near q = 0 the closed forms cancel, so the power series is used.
 * Hogg 1999, eq. 16 and 29.
 */
const SMALL = 0.01

/** Transverse over line-of-sight distance: sinh(sqrt q)/sqrt q, or sin(sqrt -q)/sqrt -q. */
export function transverseFactor(q: number): number {
  if (Math.abs(q) < SMALL) return 1 + (q / 6) * (1 + (q / 20) * (1 + (q / 42) * (1 + q / 72)))
  if (q > 0) {
    const y = Math.sqrt(q)
    return Math.sinh(y) / y
  }
  const y = Math.sqrt(-q)
  return Math.sin(y) / y
}

/**
 * Volume of a ball over 4 pi chi^3: (sinh 2y - 2y)/(4 y^3), or (2y - sin 2y)/(4 y^3) in closed space, where
 * this form, unlike the one with an arcsine, holds past the equator too.
 */
export function volumeFactor(q: number): number {
  if (Math.abs(q) < SMALL)
    return 1 / 3 + (q / 15) * (1 + ((2 * q) / 21) * (1 + (q / 18) * (1 + (2 * q) / 55)))
  if (q > 0) {
    const u = 2 * Math.sqrt(q)
    return (2 * (Math.sinh(u) - u)) / u ** 3
  }
  const u = 2 * Math.sqrt(-q)
  return (2 * (u - Math.sin(u))) / u ** 3
}
