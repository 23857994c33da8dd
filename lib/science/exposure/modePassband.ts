import { airToVacuumA, oneWavelength, type Passband } from '../light'
import { efficiencyAt } from './throughput'
import type { ModeRecord } from './types'

/**
 * What a mode counts photons through: its throughput for an image, one wavelength of a spectrum (in the mode's own
 * medium, angstroms). Ends and knots in vacuum.
 */
export function modePassband(mode: ModeRecord, wavelengthA: number): Passband {
  const inVacuum = (modeA: number) => (mode.medium === 'vacuum' ? modeA : airToVacuumA(modeA))
  if (mode.kind !== 'imaging') return oneWavelength(inVacuum(wavelengthA))
  const rows = mode.throughput.map((row) => ({ ...row, wavelengthA: inVacuum(row.wavelengthA) }))
  const seen = { ...mode, throughput: rows }
  const [first, last] = [rows[0], rows.at(-1)]
  return {
    fromA: Math.max(inVacuum(mode.wavelengthMinA), first?.wavelengthA ?? 0),
    toA: Math.min(inVacuum(mode.wavelengthMaxA), last?.wavelengthA ?? Infinity),
    transmission: (vacuumA) => efficiencyAt(seen, vacuumA),
    knotsA: rows.map((row) => row.wavelengthA),
  }
}
