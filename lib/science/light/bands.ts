import { ScienceError } from '../ScienceError'

/** A broad band: its middle and width, the AB magnitude of Vega in it, and the Sun's colour against V, AB. */
export interface Band {
  readonly wavelengthA: number
  /** Full width, as if it let through all light within and none outside. */
  readonly widthA: number
  readonly vegaAb: number
  readonly sunMinusV: number
}

/**
 * Middle wavelengths and widths: Fukugita et al. 1996 (ugriz), Bessell 2005 (UBVRI), Cohen et al. 2003 (JHK), Hewett
 * et al. 2006 (y); the widths from memory of those tables. AB magnitude of Vega: Blanton & Roweis 2007 (AJ 133, 734), table 1; y Hewett et al. 2006.
 * Colours of the Sun: Willmer 2018 (ApJS 236, 47), to 0.1 mag, enough for scattered moonlight.
 */
export const bands: Readonly<Record<string, Band>> = {
  u: { wavelengthA: 3557, widthA: 599, vegaAb: 0.91, sunMinusV: 1.6 },
  g: { wavelengthA: 4825, widthA: 1379, vegaAb: -0.08, sunMinusV: 0.3 },
  r: { wavelengthA: 6261, widthA: 1382, vegaAb: 0.16, sunMinusV: -0.15 },
  i: { wavelengthA: 7672, widthA: 1535, vegaAb: 0.37, sunMinusV: -0.3 },
  z: { wavelengthA: 9097, widthA: 1370, vegaAb: 0.54, sunMinusV: -0.3 },
  y: { wavelengthA: 10305, widthA: 1000, vegaAb: 0.634, sunMinusV: -0.3 },
  U: { wavelengthA: 3663, widthA: 650, vegaAb: 0.79, sunMinusV: 1.5 },
  B: { wavelengthA: 4361, widthA: 890, vegaAb: -0.09, sunMinusV: 0.5 },
  V: { wavelengthA: 5448, widthA: 840, vegaAb: 0.02, sunMinusV: 0 },
  R: { wavelengthA: 6407, widthA: 1580, vegaAb: 0.21, sunMinusV: -0.2 },
  I: { wavelengthA: 7980, widthA: 1540, vegaAb: 0.45, sunMinusV: -0.3 },
  J: { wavelengthA: 12350, widthA: 1620, vegaAb: 0.91, sunMinusV: -0.3 },
  H: { wavelengthA: 16620, widthA: 2510, vegaAb: 1.39, sunMinusV: -0.1 },
  K: { wavelengthA: 21590, widthA: 2620, vegaAb: 1.85, sunMinusV: 0.3 },
}

export function findBand(name: string): Band {
  const band = bands[name]
  if (!band) throw new ScienceError('unknown-name', `No band is called “${name}”.`)
  return band
}

/** The value of a per-band table at a wavelength: that of the band named or, failing that, the nearest. */
export function nearestBandValue(
  table: Readonly<Record<string, number>>,
  wavelengthA: number,
  named: string | null,
): { band: string; value: number } | null {
  const exact = named === null ? undefined : table[named]
  if (named !== null && exact !== undefined) return { band: named, value: exact }
  let best: { band: string; value: number; distance: number } | null = null
  for (const [band, value] of Object.entries(table)) {
    const known = bands[band]
    if (!known) continue
    const distance = Math.abs(Math.log(known.wavelengthA / wavelengthA))
    if (!best || distance < best.distance) best = { band, value, distance }
  }
  return best && { band: best.band, value: best.value }
}
