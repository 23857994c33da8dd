import { exposure, type Conditions, type ExposureReport, type ModeRecord } from '../exposure'
import { ScienceError } from '../ScienceError'
import { planningAirmass } from './planningAirmass'
import { sourceOf } from './sourceOf'
import type { CarriedLight, ReportInput } from './types'

/** What a request needs, and what it reaches in the hours asked. */
export interface Plan {
  readonly needed: ExposureReport | null
  readonly reached: ExposureReport | null
  readonly refusal: string | null
  readonly carried: CarriedLight | null
  readonly totalAtMedianS: number | null
  readonly totalAtBestS: number | null
}

interface Attempt<T> {
  readonly made: T | null
  readonly refusal: string | null
}

/** A value, or the sentence of the ScienceError that stood in its way. */
function attempt<T>(make: () => T): Attempt<T> {
  try {
    return { made: make(), refusal: null }
  } catch (error) {
    if (error instanceof ScienceError) return { made: null, refusal: error.message }
    throw error
  }
}

/** Time open of what was asked: the overheads that the needed exposure would have, scaled to fit. */
function openWithin(mode: ModeRecord, askedS: number, subExposureS: number): number {
  const { acquisitionS, readoutS, ditherS, calibrationFraction } = mode.overheads
  const left = askedS - acquisitionS + ditherS
  const frame = subExposureS + readoutS + ditherS
  const perFrame = subExposureS * calibrationFraction + (mode.skySubtraction === 'blank-sky' ? 2 : 1) * frame
  return (left / perFrame) * subExposureS
}

/**
 * The exposure at the poorest seeing accepted and the airmass averaged over the window; what it would be
 * at the site's median seeing and on its best tenth of nights stands beside it.
 */
export function planExposure(input: ReportInput, observedA: number | null): Plan {
  const { mode, observation, site } = input
  const per = mode.kind === 'imaging' ? 'image' : observation.snrPer
  const light = attempt(() => sourceOf(input, observedA))
  const under = (seeingArcsec: number, solve: { solve: 'time' } | { solve: 'snr'; timeS: number }) =>
    attempt((): ExposureReport | null => {
      if (!light.made) return null
      const conditions: Conditions = {
        site,
        airmass: planningAirmass(input),
        seeingArcsec,
        moon: observation.moon,
        transparency: observation.transparency,
      }
      return exposure({ mode, source: light.made.source, conditions, per, snr: observation.snr, ...solve })
    })
  const { made: needed, refusal } = under(observation.seeingArcsec, { solve: 'time' })
  const timeS = openWithin(mode, observation.askedS, needed?.subExposureS ?? mode.maxSubExposureS)
  const reached =
    timeS >= mode.minSubExposureS ? under(observation.seeingArcsec, { solve: 'snr', timeS }).made : null
  const { best10, median } = site.seeingQuantilesArcsec
  return {
    needed,
    reached,
    refusal: light.refusal ?? refusal,
    carried: light.made?.carried ?? null,
    totalAtMedianS: under(median, { solve: 'time' }).made?.totalS ?? null,
    totalAtBestS: under(best10, { solve: 'time' }).made?.totalS ?? null,
  }
}
