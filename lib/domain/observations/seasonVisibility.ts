import {
  createAlmanac,
  visibility,
  type Almanac,
  type MoonLimits,
  type Night,
  type SkyTarget,
  type TargetVisibility,
} from '@/lib/science/sky'
import { pointingOf } from '../facility/pointingOf'
import type { SiteRecord, TelescopePointing } from '../facility/types'
import { boundedMap } from './boundedMap'

export interface SeasonConditions {
  /** First and last evening date, both included. */
  from: string
  to: string
  maxAirmass: number
  twilightLimitDeg?: number
  moon?: MoonLimits
  /** Whose horizon and blind spot count besides the site's; none when not known. */
  telescope?: TelescopePointing | undefined
}

export interface SeasonVisibility {
  nights: Night[]
  /** By the target's id. */
  byTarget: Map<string, TargetVisibility>
}

const almanacs = boundedMap<Almanac>(4)
const nightsKept = boundedMap<Night[]>(8)
const targetsKept = boundedMap<TargetVisibility>(3000)
const limitKeys = boundedMap<string>(100)
let limits = 0

/** A short name for limits, so that the rows of a horizon do not stand in thousands of keys. */
const limitKey = (pointing: object): string =>
  limitKeys.getOr(JSON.stringify(pointing), () => {
    limits += 1
    return `limits ${limits}`
  })

/** Sun and Moon through a season, computed once and shared by everything that asks. */
export const seasonAlmanac = (from: string, to: string): Almanac =>
  almanacs.getOr(`${from} ${to}`, () => createAlmanac())

/**
 * When targets are up through a season. Sun and Moon cost most, so nights are kept for each site and season,
 * and each target's hours for each set of conditions: only what is new is computed, in one go.
 */
export function seasonVisibility(
  site: SiteRecord,
  { telescope, ...conditions }: SeasonConditions,
  targets: readonly SkyTarget[],
): SeasonVisibility {
  const place = [site.latitudeDeg, site.longitudeDeg, site.elevationM]
  const season = JSON.stringify([place, conditions.from, conditions.to, conditions.twilightLimitDeg ?? -18])
  const pointing = pointingOf(site, telescope)
  const under = JSON.stringify([season, limitKey(pointing), conditions.maxAirmass, conditions.moon ?? {}])
  const keyOf = (t: SkyTarget) => `${under} ${t.raDeg} ${t.decDeg} ${t.pmRaMasYr ?? 0} ${t.pmDecMasYr ?? 0}`

  const missing = new Map(
    targets.filter((target) => !targetsKept.get(keyOf(target))).map((target) => [keyOf(target), target]),
  )
  let nights = nightsKept.get(season)
  if (!nights || missing.size > 0) {
    const computed = visibility({
      site,
      ...conditions,
      targets: [...missing].map(([key, target]) => ({ ...target, id: key })),
      ...pointing,
      almanac: seasonAlmanac(conditions.from, conditions.to),
    })
    nights = computed.nights
    nightsKept.set(season, nights)
    for (const one of computed.targets) targetsKept.set(one.id, one)
  }
  const byTarget = new Map<string, TargetVisibility>()
  for (const target of targets) {
    const one = targetsKept.get(keyOf(target))
    if (one) byTarget.set(target.id, { ...one, id: target.id })
  }
  return { nights, byTarget }
}
