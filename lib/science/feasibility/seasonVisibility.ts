import { visibility, type TargetVisibility } from '../sky'
import { moonClassLimits } from './moonClass'
import type { ReportInput } from './types'

export interface SeasonVisibility {
  readonly visible: TargetVisibility
  readonly usableHours: number
  readonly nights: number
  /** Whether any night is dark enough at all. */
  readonly isEverDark: boolean
}

/** Hours of a target through the season, the Moon left aside and within its limits; null without a position. */
export function seasonVisibility(input: ReportInput): SeasonVisibility | null {
  const { target, site, pointing, mode, observation, season } = input
  if (target.raDeg === null || target.decDeg === null) return null
  const { raDeg, decDeg, pmRaMasYr, pmDecMasYr } = target
  const asked = {
    ...pointing,
    site,
    targets: [{ id: String(target.id), raDeg, decDeg, pmRaMasYr, pmDecMasYr }],
    from: season.from,
    to: season.to,
    maxAirmass: observation.maxAirmass,
    twilightLimitDeg: mode.twilightLimitDeg,
    lowestAltitudeDeg: site.lowestAltitudeDeg,
  }
  const limits = { ...moonClassLimits[observation.moon], minSeparationDeg: observation.minMoonSeparationDeg }
  const { targets, nights } = visibility(asked)
  const [visible] = targets
  const [usable] = visibility({ ...asked, moon: limits }).targets
  if (!visible || !usable) return null
  const isEverDark = nights.some(({ darkHours }) => darkHours > 0)
  return { visible, usableHours: usable.totalHours, nights: nights.length, isEverDark }
}
