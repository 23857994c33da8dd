import { bands, findBand, nearestBandValue } from '../light'
import { moonlitSkyV, nanolamberts, skyAirmass, vMagArcsec2 } from '../sky/moonlight'
import { ScienceError } from '../ScienceError'
import type { MoonClass, SiteRecord } from './types'

/** A Moon that stands for a class: grey a half Moon, bright a full one, 60 degrees from the target. */
const moons = {
  grey: { phaseAngleDeg: 90, separationDeg: 60, moonAltitudeDeg: 45 },
  bright: { phaseAngleDeg: 5, separationDeg: 60, moonAltitudeDeg: 45 },
} as const

/** Share of Rayleigh scattering at 60 degrees from the Moon in V, by the scattering function of the model. */
const RAYLEIGH_SHARE = 0.87

/**
 * Colour of scattered moonlight against V, AB magnitudes: the Sun's colour, scattered by molecules as
 * lambda^-4 and by aerosols as lambda^-1.3. Rough: good to some 0.3 mag from u to z.
 */
function moonlightMinusV(band: string): number {
  const { wavelengthA, sunMinusV } = findBand(band)
  const ratio = wavelengthA / findBand('V').wavelengthA
  return sunMinusV - 2.5 * Math.log10(RAYLEIGH_SHARE * ratio ** -4 + (1 - RAYLEIGH_SHARE) * ratio ** -1.3)
}

function magnitudeOf(fluxes: readonly number[]): number {
  return -2.5 * Math.log10(fluxes.reduce((sum, flux) => sum + flux, 0))
}

const flux = (magnitude: number): number => 10 ** (-0.4 * magnitude)

/**
 * Sky at a wavelength, AB magnitudes per square arcsecond: the site's dark sky, brighter with airmass, plus
 * moonlight by Krisciunas & Schaefer 1991 in V, carried to other bands by a rough colour.
 */
export function skyAbArcsec2(
  site: SiteRecord,
  wavelengthA: number,
  named: string | null,
  moon: MoonClass,
  airmass: number,
): { ab: number; band: string } {
  const dark = nearestBandValue(site.darkSkyMagArcsec2, wavelengthA, named)
  if (!dark || !bands[dark.band]) {
    throw new ScienceError('bad-site', 'The site has no sky brightness for this wavelength.')
  }
  const extinction = (band: string): number => {
    const at = findBand(band).wavelengthA
    return nearestBandValue(site.extinctionMagPerAirmass, at, band)?.value ?? 0
  }
  // Altitude whose scattering airmass matches: sin^2 z = (1 - 1/X^2)/0.96.
  const sinZ2 = Math.min(1, (1 - 1 / (airmass * airmass)) / 0.96)
  const targetAltitudeDeg = 90 - (Math.asin(Math.sqrt(sinZ2)) * 180) / Math.PI
  const air = skyAirmass(90 - targetAltitudeDeg)
  const k = extinction(dark.band)
  const darkHere = dark.value - 2.5 * Math.log10(air) + k * (air - 1)
  if (moon === 'dark') return { ab: darkHere, band: dark.band }
  const darkZenithV = (nearestBandValue(site.darkSkyMagArcsec2, 5448, 'V')?.value ?? 21.6) - 0.02
  const model = { ...moons[moon], targetAltitudeDeg, extinctionV: extinction('V'), darkZenithV }
  const moonlight =
    nanolamberts(moonlitSkyV(model)) - nanolamberts(moonlitSkyV({ ...model, moonAltitudeDeg: -1 }))
  const moonAb = vMagArcsec2(moonlight) + 0.02 + moonlightMinusV(dark.band)
  return { ab: magnitudeOf([flux(darkHere), flux(moonAb)]), band: dark.band }
}
