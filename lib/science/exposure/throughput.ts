import { ScienceError } from '../ScienceError'
import { nearestBandValue } from '../light'
import type { ModeRecord, SiteRecord } from './types'

/** Efficiency of a mode at a wavelength, 0 to 1, straight between the rows of its table, 0 outside it. */
export function efficiencyAt(mode: ModeRecord, wavelengthA: number): number {
  const rows = mode.throughput
  let low = 0
  let high = rows.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((rows[middle]?.wavelengthA ?? Infinity) <= wavelengthA) low = middle
    else high = middle
  }
  const [from, to] = [rows[low], rows[high]]
  if (!from || !to || low === high || wavelengthA < from.wavelengthA || wavelengthA > to.wavelengthA) return 0
  const t = (wavelengthA - from.wavelengthA) / (to.wavelengthA - from.wavelengthA)
  return from.efficiency + t * (to.efficiency - from.efficiency)
}

/**
 * Integral of efficiency over ln(wavelength) through a mode's range: photons of a source flat in f_nu are
 * f_nu/h times this. In closed form between the rows of the table, where a + b w over w is a ln w + b w.
 */
export function efficiencyIntegral(mode: ModeRecord): number {
  const { wavelengthMinA, wavelengthMaxA, throughput } = mode
  let sum = 0
  for (let i = 1; i < throughput.length; i += 1) {
    const [from, to] = [throughput[i - 1], throughput[i]]
    if (!from || !to) continue
    const low = Math.max(wavelengthMinA, from.wavelengthA)
    const high = Math.min(wavelengthMaxA, to.wavelengthA)
    if (high <= low) continue
    const slope = (to.efficiency - from.efficiency) / (to.wavelengthA - from.wavelengthA)
    const level = from.efficiency - slope * from.wavelengthA
    sum += level * Math.log(high / low) + slope * (high - low)
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
