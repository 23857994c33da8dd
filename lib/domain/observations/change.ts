import type { Cosmology } from '@/lib/science/cosmology'
import { reportOf, type ObservationInput } from './computeObservation'
import type { Verdict } from './types'

/** A request with something about it changed. */
export type Change = Partial<
  Pick<ObservationInput, 'target' | 'contents' | 'cosmology' | 'mode' | 'observation'>
>

export interface Needed {
  /** Hours needed in seconds, overheads included; null when it cannot be reached at all. */
  seconds: number | null
  verdict: Verdict
}

/** Without a right ascension no night is searched; the declination alone gives the mean airmass of its window. */
export function neededWith(input: ObservationInput, change: Change): Needed {
  const changed = { ...input, ...change }
  const { mode } = changed
  if (!mode) return { seconds: null, verdict: 'not-feasible' }
  const { seasonFrom, seasonTo } = changed.contents.call
  const report = reportOf({ ...changed, mode }, seasonFrom, seasonTo, { searchNights: false })
  return { seconds: report.exposure ? report.exposure.totalS : null, verdict: report.verdict }
}

/** The same target brighter by some magnitudes. */
export function brighterBy(input: ObservationInput, magnitudes: number): Change {
  const { brightness } = input.target
  if (!brightness) return {}
  return { target: { ...input.target, brightness: { ...brightness, value: brightness.value - magnitudes } } }
}

/** A magnitude predicted from a luminosity follows the distance: fainter where the other universe is larger. */
export function underOther(input: ObservationInput, other: Cosmology): Change {
  const z = input.target.redshift ?? 0
  const ratio = other.luminosityMpc(z) / input.cosmology.luminosityMpc(z)
  return { ...brighterBy(input, -5 * Math.log10(ratio)), cosmology: other }
}

/** The same target at a redshift further by `by`; its predicted magnitude follows. Null where there is no such redshift. */
export function furtherBy(input: ObservationInput, by: number): Change | null {
  const { redshift, brightness } = input.target
  if (redshift === null || redshift + by <= 0) return null
  const isPredicted = brightness?.provenance === 'predicted'
  const { cosmology } = input
  const dimmer = isPredicted
    ? 5 * Math.log10(cosmology.luminosityMpc(redshift + by) / cosmology.luminosityMpc(redshift))
    : 0
  const { target } = { target: input.target, ...brighterBy(input, -dimmer) }
  return { target: { ...target, redshift: redshift + by } }
}
