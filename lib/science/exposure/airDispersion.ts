const ARCSEC = 206_264.806

/** What the air above a site is like. */
export interface Air {
  readonly pressureMmHg: number
  readonly temperatureC: number
  readonly waterMmHg: number
}

/** Air at a height, metres, by the standard atmosphere (ISO 2533), dry enough for a good site: 2 mm Hg of vapour. */
export function airAt(elevationM: number): Air {
  const temperatureC = 15 - 0.0065 * elevationM
  return { pressureMmHg: 760 * (1 - 2.25577e-5 * elevationM) ** 5.25588, temperatureC, waterMmHg: 2 }
}

/** Refractive index of air less 1, wavelength in angstroms (Edlen 1953; Filippenko 1982, PASP 94, 715, eqs. 1 to 3). */
export function refractivity(
  wavelengthA: number,
  { pressureMmHg: p, temperatureC: t, waterMmHg }: Air,
): number {
  const s2 = (1e4 / wavelengthA) ** 2
  const standard = 64.328 + 29_498.1 / (146 - s2) + 255.4 / (41 - s2)
  const warm = 1 + 0.003661 * t
  const dry = (standard * p * (1 + (1.049 - 0.0157 * t) * 1e-6 * p)) / (720.883 * warm)
  return 1e-6 * (dry - ((0.0624 - 0.00068 * s2) / warm) * waterMmHg)
}

/**
 * How far above the image at one wavelength the air puts that at another, arcseconds, at an airmass
 * (Filippenko 1982, eq. 4): 206265 (n - n0) tan z; plane-parallel, good to a few percent to airmass 3.
 */
export function airDispersionArcsec(
  wavelengthA: number,
  referenceA: number,
  airmass: number,
  air: Air,
): number {
  const tanZ = Math.sqrt(Math.max(0, airmass * airmass - 1))
  return ARCSEC * (refractivity(wavelengthA, air) - refractivity(referenceA, air)) * tanZ
}
