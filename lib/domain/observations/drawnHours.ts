import { seededNormal } from '@/lib/science/numeric/seededNormal'
import { brighterBy, furtherBy, neededWith } from './change'
import type { ObservationInput } from './computeObservation'

const DRAWS = 100
/** Of a hundred draws in order, those that leave sixteen on either side. */
const LOW = 15
const HIGH = 84
const SEED = 20_270_301

/**
 * Hours needed, seconds, between which 68 of 100 draws fall when redshift and magnitude vary by their errors
 * together; null where it is not reached. The same draws for every request, so that the same request gives the same.
 */
export function drawnHours(
  input: ObservationInput,
  errors: { redshift: number; magnitude: number },
): { low: number | null; high: number | null } {
  const normal = seededNormal(SEED)
  const hours = Array.from({ length: DRAWS }, () => {
    const fainter = normal() * errors.magnitude
    const further = furtherBy(input, normal() * errors.redshift)
    const moved = { ...input, ...further }
    return neededWith(moved, brighterBy(moved, -fainter)).seconds ?? Infinity
  }).sort((a, b) => a - b)
  const at = (index: number) => {
    const value = hours[index] ?? Infinity
    return Number.isFinite(value) ? value : null
  }
  return { low: at(LOW), high: at(HIGH) }
}
