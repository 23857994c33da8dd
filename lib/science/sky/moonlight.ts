import { DEG_RAD } from '../constants'

/** Brightness of the V-band sky in nanolamberts, from and to V magnitudes per square arcsecond. Eq. 27. */
export function nanolamberts(vMag: number): number {
  return 34.08 * Math.exp(20.7233 - 0.92104 * vMag)
}

export function vMagArcsec2(nanolambert: number): number {
  return (20.7233 - Math.log(nanolambert / 34.08)) / 0.92104
}

/** Airmass for scattered light, eq. 3: finite at the horizon. */
export function skyAirmass(zenithDistanceDeg: number): number {
  return (1 - 0.96 * Math.sin(zenithDistanceDeg * DEG_RAD) ** 2) ** -0.5
}

/** Scattering function of the air, Rayleigh plus Mie, eq. 16, 18 and 19; `separationDeg` from the Moon. */
export function moonScattering(separationDeg: number): number {
  const rayleigh = 10 ** 5.36 * (1.06 + Math.cos(separationDeg * DEG_RAD) ** 2)
  const mie =
    separationDeg < 10 ? 6.2e7 * Math.max(separationDeg, 0.25) ** -2 : 10 ** (6.15 - separationDeg / 40)
  return rayleigh + mie
}

export interface MoonlitSky {
  /** Angle Sun-Moon-Earth, degrees; 0 at full Moon. */
  readonly phaseAngleDeg: number
  readonly separationDeg: number
  readonly moonAltitudeDeg: number
  readonly targetAltitudeDeg: number
  /** Extinction in V, magnitudes an airmass. */
  readonly extinctionV: number
  /** Moonless sky at the zenith, V magnitudes per square arcsecond. */
  readonly darkZenithV: number
}

/**
 * Brightness of the V-band sky with the Moon in it: Krisciunas & Schaefer 1991 (PASP 103, 1033), eq. 2, 3,
 * 15 to 21. V magnitudes per square arcsecond; the model's own error is 8 to 23 per cent. Without twilight.
 */
export function moonlitSkyV(sky: MoonlitSky): number {
  const air = skyAirmass(90 - sky.targetAltitudeDeg)
  const k = sky.extinctionV
  const dark = nanolamberts(sky.darkZenithV) * air * 10 ** (-0.4 * k * (air - 1))
  if (sky.moonAltitudeDeg <= 0) return vMagArcsec2(dark)
  const angle = Math.abs(sky.phaseAngleDeg)
  const illuminance = 10 ** (-0.4 * (3.84 + 0.026 * angle + 4e-9 * angle ** 4))
  const moonAir = skyAirmass(90 - sky.moonAltitudeDeg)
  const moon =
    moonScattering(sky.separationDeg) *
    illuminance *
    10 ** (-0.4 * k * moonAir) *
    (1 - 10 ** (-0.4 * k * air))
  return vMagArcsec2(dark + moon)
}
