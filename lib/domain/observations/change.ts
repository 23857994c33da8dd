import type { Cosmology } from '@/lib/science/cosmology'
import { reportOf, type ObservationInput } from './computeObservation'
import { isForLine } from './isForLine'
import type { Verdict } from './types'

/** A request with something about it changed. */
export type Change = Partial<
  Pick<ObservationInput, 'target' | 'contents' | 'cosmology' | 'mode' | 'observation'>
>

export interface Needed {
  /** Hours needed in seconds, overheads included; null when it cannot be reached at all. */
  seconds: number | null
  /** Of them with the shutter open. */
  openSeconds: number | null
  verdict: Verdict
}

/** Without a right ascension no night is searched; the declination alone gives the mean airmass of its window. */
export function neededWith(input: ObservationInput, change: Change): Needed {
  const changed = { ...input, ...change }
  const { mode } = changed
  if (!mode) return { seconds: null, openSeconds: null, verdict: 'not-feasible' }
  const { seasonFrom, seasonTo } = changed.contents.call
  const report = reportOf({ ...changed, mode }, seasonFrom, seasonTo, { searchNights: false })
  const { exposure, verdict } = report
  return { seconds: exposure?.totalS ?? null, openSeconds: exposure?.openS ?? null, verdict }
}

/** The same target brighter by some magnitudes: its continuum alone. */
function continuumBrighterBy(input: ObservationInput, magnitudes: number): Change {
  const { brightness } = input.target
  if (!brightness) return {}
  return { target: { ...input.target, brightness: { ...brightness, value: brightness.value - magnitudes } } }
}

/** The same target brighter by some magnitudes in what is asked for: the line where it is one, else the continuum. */
export function brighterBy(input: ObservationInput, magnitudes: number): Change {
  const { line } = input.target
  if (!isForLine(input) || !line) return continuumBrighterBy(input, magnitudes)
  return { target: { ...input.target, line: { ...line, value: line.value * 10 ** (0.4 * magnitudes) } } }
}

/** Whether what is asked for follows from a luminosity, and so from a cosmology and a lens. */
export function isPredicted(input: ObservationInput): boolean {
  const { line, brightness } = input.target
  return isForLine(input) ? line?.kind === 'luminosity' : brightness?.provenance === 'predicted'
}

/**
 * A magnitude predicted from a luminosity follows the distance: fainter where the other universe is larger. The flux
 * of a line is computed from its luminosity under whatever cosmology there is.
 */
export function underOther(input: ObservationInput, other: Cosmology): Change {
  const z = input.target.redshift ?? 0
  const ratio = other.luminosityMpc(z) / input.cosmology.luminosityMpc(z)
  const isShifted = input.target.brightness?.provenance === 'predicted'
  return { ...(isShifted ? continuumBrighterBy(input, -5 * Math.log10(ratio)) : {}), cosmology: other }
}

/** The same target at a redshift further by `by`; its predicted magnitude follows. Null where there is no such redshift. */
export function furtherBy(input: ObservationInput, by: number): Change | null {
  const { redshift, brightness } = input.target
  if (redshift === null || redshift + by <= 0) return null
  const isShifted = brightness?.provenance === 'predicted'
  const { cosmology } = input
  const dimmer = isShifted
    ? 5 * Math.log10(cosmology.luminosityMpc(redshift + by) / cosmology.luminosityMpc(redshift))
    : 0
  const { target } = { target: input.target, ...continuumBrighterBy(input, -dimmer) }
  return { target: { ...target, redshift: redshift + by } }
}

/** The least half-light radius that is told from a point, arcseconds. */
const LEAST_RADIUS = 0.01

/** The same target larger by some arcseconds of half-light radius; a point source has none. */
export function largerBy(input: ObservationInput, arcsec: number): Change {
  const { target } = input
  const radius = target.effectiveRadiusArcsec
  if (target.geometry === 'point' || radius === null) return {}
  return { target: { ...target, effectiveRadiusArcsec: Math.max(LEAST_RADIUS, radius + arcsec) } }
}

/** The same target magnified more by some; nothing where it is not by a lens that its brightness is predicted. */
export function magnifiedBy(input: ObservationInput, by: number): Change {
  const { magnification } = input.target
  if (!magnification || !isPredicted(input)) return {}
  return { target: { ...input.target, magnification: Math.max(0.01, magnification + by) } }
}

/** The same target with a spectral index larger by some; nothing where its spectrum is no power law. */
export function bluerBy(input: ObservationInput, by: number): Change {
  const spectrum = input.target.spectrum ?? null
  if (spectrum?.kind !== 'power-law') return {}
  return { target: { ...input.target, spectrum: { ...spectrum, index: spectrum.index + by } } }
}
