import { integrate } from '../numeric/gaussLegendre'
import { ScienceError } from '../ScienceError'
import { nearestBandValue } from '../light'
import type { ModeRecord, SiteRecord } from './types'

/** Efficiency of a mode at a wavelength, 0 to 1, straight between the rows of its table, 0 outside it. */
export function efficiencyAt(mode: ModeRecord, wavelengthA: number): number {
  const rows = mode.throughput
  for (let i = 1; i < rows.length; i += 1) {
    const low = rows[i - 1]
    const high = rows[i]
    if (!low || !high || wavelengthA < low.wavelengthA || wavelengthA > high.wavelengthA) continue
    const t = (wavelengthA - low.wavelengthA) / (high.wavelengthA - low.wavelengthA)
    return low.efficiency + t * (high.efficiency - low.efficiency)
  }
  return 0
}

/**
 * Integral of efficiency over ln(wavelength) through a mode's range: photons of a source flat in f_nu are
 * f_nu/h times this. Exact between the rows of the table.
 */
export function efficiencyIntegral(mode: ModeRecord): number {
  const { wavelengthMinA: low, wavelengthMaxA: high } = mode
  const inner = mode.throughput.map((row) => row.wavelengthA).filter((w) => w > low && w < high)
  const knots = [low, ...inner, high]
  let sum = 0
  for (let i = 1; i < knots.length; i += 1) {
    sum += integrate((w) => efficiencyAt(mode, w) / w, knots[i - 1] ?? low, knots[i] ?? high)
  }
  if (!(sum > 0))
    throw new ScienceError('bad-mode', 'This mode passes no light: its throughput table is empty.')
  return sum
}

/** Share of starlight that the air lets through; a table measured through the air holds one airmass already. */
export function airTransmission(
  mode: ModeRecord,
  site: SiteRecord,
  wavelengthA: number,
  airmass: number,
): number {
  const k = nearestBandValue(site.extinctionMagPerAirmass, wavelengthA, mode.band)?.value ?? 0
  const counted = mode.throughputIncludes.includes('atmosphere') ? 1 : 0
  return 10 ** (-0.4 * k * (airmass - counted))
}
