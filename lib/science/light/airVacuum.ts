import { ScienceError } from '../ScienceError'

/** Shortest wavelength that air lets through, angstroms; shorter ones are always given in vacuum. */
const SHORTEST_A = 2000

/** Refractive index of standard air for a vacuum wavelength, angstroms: Morton 2000 (ApJS 130, 403), eq. 8. */
function refractiveIndex(vacuumA: number): number {
  const s2 = (1e4 / vacuumA) ** 2
  return 1 + 8.34254e-5 + 2.406147e-2 / (130 - s2) + 1.5998e-4 / (38.9 - s2)
}

function check(wavelengthA: number): void {
  if (!(wavelengthA > 0 && wavelengthA < 1e9)) {
    throw new ScienceError('outside-range', 'A wavelength must be above 0 Å.')
  }
}

/** Wavelength in standard air of a vacuum wavelength, angstroms. Below 2000 A it is left as it is. */
export function vacuumToAirA(vacuumA: number): number {
  check(vacuumA)
  return vacuumA < SHORTEST_A ? vacuumA : vacuumA / refractiveIndex(vacuumA)
}

/** Vacuum wavelength of a wavelength in standard air, angstroms: the exact inverse, by iteration. */
export function airToVacuumA(airA: number): number {
  check(airA)
  if (airA < SHORTEST_A) return airA
  let vacuumA = airA
  for (let i = 0; i < 6; i += 1) vacuumA = airA * refractiveIndex(vacuumA)
  return vacuumA
}
