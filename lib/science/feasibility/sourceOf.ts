import type { Source } from '../exposure'
import { airToVacuumA, lineFlux, vacuumToAirA } from '../light'
import { ScienceError } from '../ScienceError'
import { carriedLight, type Place } from './carriedLight'
import { vacuumRange } from './featureChecks'
import { lostOnTheWayMag } from './onTheWay'
import type { CarriedLight, ReportInput } from './types'

/** Whether the signal asked for is that of the target's own line, and not of its continuum. */
export function asksForLine({
  target,
  mode,
  observation,
}: Pick<ReportInput, 'target' | 'mode' | 'observation'>) {
  return mode.kind === 'long-slit' && Boolean(target.line) && observation.feature?.name === target.line?.name
}

/** Where the light is looked at, in the mode's own kind of wavelength: the feature, or the middle of the range. */
function placeOf({ mode }: ReportInput, observedA: number | null): Place {
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

/** What is looked at, and how its continuum came there. */
export interface CarriedSource {
  readonly source: Source
  readonly carried: CarriedLight | null
}

/** The source as the exposure engine takes it. Throws a ScienceError when there is no light or no such wavelength. */
export function sourceOf(input: ReportInput, observedA: number | null): CarriedSource {
  const { target, cosmology } = input
  const place = placeOf(input, observedA)
  const { inModeA, vacuumA } = place
  const geometry = target.geometry ?? { kind: 'point' as const }
  const carried = carriedLight(input, place)
  if (asksForLine(input) && target.line) {
    const { kind, value, widthKmS } = target.line
    if (kind === 'luminosity' && !((target.redshift ?? 0) > 0))
      throw new ScienceError('bad-redshift', 'A luminosity gives a flux only at a distance.')
    const arriving = 10 ** (-0.4 * lostOnTheWayMag(target, vacuumA))
    const fluxErgSCm2 =
      kind === 'flux' ? value : lineFlux(value, cosmology.luminosityMpc(target.redshift ?? 0)) * arriving
    const source: Source = {
      kind: 'line',
      fluxErgSCm2,
      wavelengthA: inModeA,
      widthKmS,
      continuumAb: carried?.ab,
      geometry,
      provenance: kind === 'flux' ? 'observed' : 'predicted',
    }
    return { source, carried }
  }
  if (!carried || !target.brightness) throw new ScienceError('bad-source', 'No brightness is given.')
  const wavelengthA = observedA === null ? undefined : inModeA
  const { provenance } = target.brightness
  return { source: { kind: 'magnitude', ab: carried.ab, wavelengthA, geometry, provenance }, carried }
}
