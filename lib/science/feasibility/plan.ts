import { exposure, type Conditions, type ExposureReport, type ModeRecord, type Source } from '../exposure'
import { toAb, vacuumToAirA } from '../light'
import { ScienceError } from '../ScienceError'
import { feasibilityAirmass } from './planningAirmass'
import { vacuumRange } from './featureChecks'
import type { ReportInput } from './types'

/** What a request needs, and what it reaches in the hours asked. */
export interface Plan {
  readonly needed: ExposureReport | null
  readonly reached: ExposureReport | null
  readonly refusal: string | null
}

/** A value, or the sentence of the ScienceError that stood in its way. */
function attempt(make: () => ExposureReport): { report: ExposureReport | null; refusal: string | null } {
  try {
    return { report: make(), refusal: null }
  } catch (error) {
    if (error instanceof ScienceError) return { report: null, refusal: error.message }
    throw error
  }
}

/** Time open of what was asked: the overheads that the needed exposure would have, scaled to fit. */
function openWithin(mode: ModeRecord, askedS: number, subExposureS: number): number {
  const { acquisitionS, readoutS, ditherS, calibrationFraction } = mode.overheads
  const left = askedS - acquisitionS + ditherS
  const perFrame = subExposureS * (1 + calibrationFraction) + readoutS + ditherS
  return (left / perFrame) * subExposureS
}

/** The exposure at the poorest conditions accepted, averaged airmass of the window. */
export function planExposure(input: ReportInput, observedA: number | null): Plan {
  const { target, mode, observation, site } = input
  const { brightness } = target
  if (!brightness) return { needed: null, reached: null, refusal: 'No brightness is given.' }
  if (observedA !== null) {
    const [low, high] = vacuumRange(mode)
    if (observedA < low || observedA > high) {
      return { needed: null, reached: null, refusal: 'The feature lies outside the range of this mode.' }
    }
  }
  const inMode = observedA === null || mode.medium === 'vacuum' ? observedA : vacuumToAirA(observedA)
  const source: Source = {
    kind: 'magnitude',
    ab: toAb(brightness.value, brightness.system, brightness.band),
    wavelengthA:
      inMode === null ? undefined : Math.min(mode.wavelengthMaxA, Math.max(mode.wavelengthMinA, inMode)),
    geometry: target.geometry ?? { kind: 'point' },
    provenance: brightness.provenance,
  }
  const conditions: Conditions = {
    site,
    airmass: feasibilityAirmass(input),
    seeingArcsec: observation.seeingArcsec,
    moon: observation.moon,
    transparency: observation.transparency,
  }
  const per = mode.kind === 'imaging' ? 'image' : observation.snrPer
  const shared = { mode, source, conditions, per }
  const { report: needed, refusal } = attempt(() =>
    exposure({ ...shared, solve: 'time', snr: observation.snr }),
  )
  const open = openWithin(mode, observation.askedS, needed?.subExposureS ?? mode.maxSubExposureS)
  const reached =
    open >= mode.minSubExposureS
      ? attempt(() => exposure({ ...shared, solve: 'snr', timeS: open })).report
      : null
  return { needed, reached, refusal }
}
