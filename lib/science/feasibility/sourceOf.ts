import type { Source } from '../exposure'
import { airToVacuumA, lineFlux, toAb, vacuumToAirA } from '../light'
import { ScienceError } from '../ScienceError'
import { vacuumRange } from './featureChecks'
import { lostOnTheWayMag } from './onTheWay'
import type { ReportInput } from './types'

/** Whether the signal asked for is that of the target's own line, and not of its continuum. */
export function asksForLine({
  target,
  mode,
  observation,
}: Pick<ReportInput, 'target' | 'mode' | 'observation'>) {
  return mode.kind === 'long-slit' && Boolean(target.line) && observation.feature?.name === target.line?.name
}

/** Where the light is looked at, in the mode's own kind of wavelength: the feature, or the middle of the range. */
function placeOf({ mode }: ReportInput, observedA: number | null): { inModeA: number; vacuumA: number } {
  const toVacuum = (wavelengthA: number) =>
    mode.medium === 'vacuum' ? wavelengthA : airToVacuumA(wavelengthA)
  if (observedA === null) {
    const inModeA = 0.5 * (mode.wavelengthMinA + mode.wavelengthMaxA)
    return { inModeA, vacuumA: toVacuum(inModeA) }
  }
  const [low, high] = vacuumRange(mode)
  if (observedA < low || observedA > high)
    throw new ScienceError('outside-range', 'The feature lies outside the range of this mode.')
  const inModeA = mode.medium === 'vacuum' ? observedA : vacuumToAirA(observedA)
  // Conversion to air and back may step over the edge by rounding.
  return {
    inModeA: Math.min(mode.wavelengthMaxA, Math.max(mode.wavelengthMinA, inModeA)),
    vacuumA: observedA,
  }
}

/** AB magnitude of the continuum as it arrives; null when none is given. */
function continuumAb({ target }: ReportInput, vacuumA: number): number | null {
  const { brightness } = target
  if (!brightness) return null
  const ab = toAb(brightness.value, brightness.system, brightness.band)
  return brightness.provenance === 'predicted' ? ab + lostOnTheWayMag(target, vacuumA) : ab
}

/** The source as the exposure engine takes it. Throws a ScienceError when there is no light or no such wavelength. */
export function sourceOf(input: ReportInput, observedA: number | null): Source {
  const { target, cosmology } = input
  const { inModeA, vacuumA } = placeOf(input, observedA)
  const geometry = target.geometry ?? { kind: 'point' as const }
  const ab = continuumAb(input, vacuumA)
  if (asksForLine(input) && target.line) {
    const { kind, value, widthKmS } = target.line
    if (kind === 'luminosity' && !((target.redshift ?? 0) > 0))
      throw new ScienceError('bad-redshift', 'A luminosity gives a flux only at a distance.')
    const arriving = 10 ** (-0.4 * lostOnTheWayMag(target, vacuumA))
    const fluxErgSCm2 =
      kind === 'flux' ? value : lineFlux(value, cosmology.luminosityMpc(target.redshift ?? 0)) * arriving
    return {
      kind: 'line',
      fluxErgSCm2,
      wavelengthA: inModeA,
      widthKmS,
      continuumAb: ab ?? undefined,
      geometry,
      provenance: kind === 'flux' ? 'observed' : 'predicted',
    }
  }
  if (ab === null || !target.brightness) throw new ScienceError('bad-source', 'No brightness is given.')
  const wavelengthA = observedA === null ? undefined : inModeA
  return { kind: 'magnitude', ab, wavelengthA, geometry, provenance: target.brightness.provenance }
}
