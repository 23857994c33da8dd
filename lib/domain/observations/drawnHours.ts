import { seededNormal } from '@/lib/science/numeric/seededNormal'
import { bluerBy, brighterBy, furtherBy, largerBy, magnifiedBy, neededWith, type Needed } from './change'
import type { ObservationInput } from './computeObservation'

const DRAWS = 100
/** Of a hundred draws in order, those that leave sixteen on either side. */
const LOW = 15
const HIGH = 84
const SEED = 20_270_301

/** One sigma each; 0 where none is stated. */
export interface TargetErrors {
  redshift: number
  /** Of what is asked for, magnitudes. */
  magnitude: number
  magnification: number
  /** Of a power law. */
  index: number
  /** Half-light radius, arcseconds. */
  size: number
}

export interface DrawnHours {
  /** Seconds; null where it is not reached. */
  low: number | null
  high: number | null
  /** Of a hundred draws, those whose verdict is another one. */
  flips: number
}

/**
 * Hours needed, seconds, between which 68 of 100 draws fall when redshift, brightness, magnification, size and colour vary
 * by their errors together. The same draws for every request, so that the same request gives the same; lens and size
 * have draws of their own, and so has colour, so that stating their errors leaves the other draws as they were.
 */
export function drawnHours(input: ObservationInput, own: Needed, errors: TargetErrors): DrawnHours {
  const ofLight = seededNormal(SEED)
  const ofShape = seededNormal(SEED + 1)
  const ofColour = seededNormal(SEED + 2)
  const draws = Array.from({ length: DRAWS }, () => {
    const fainter = ofLight() * errors.magnitude
    const further = furtherBy(input, ofLight() * errors.redshift)
    const [lens, size] = [ofShape() * errors.magnification, ofShape() * errors.size]
    let moved: ObservationInput = { ...input, ...further }
    moved = { ...moved, ...magnifiedBy(moved, lens) }
    moved = { ...moved, ...largerBy(moved, size) }
    moved = { ...moved, ...bluerBy(moved, ofColour() * errors.index) }
    return neededWith(moved, brighterBy(moved, -fainter))
  })
  const hours = draws.map(({ seconds }) => seconds ?? Infinity).sort((a, b) => a - b)
  const at = (index: number) => {
    const value = hours[index] ?? Infinity
    return Number.isFinite(value) ? value : null
  }
  return {
    low: at(LOW),
    high: at(HIGH),
    flips: draws.filter(({ verdict }) => verdict !== own.verdict).length,
  }
}
