import type { Database } from '@/db/client'
import { siteRecordAt } from '@/db/queries/facility'
import { scienceNights } from '@/db/queries/scienceNights'
import type { Call } from '../calls/types'
import type { SiteWeather } from '../facility/types'
import { seasonVisibility } from '../observations/seasonVisibility'
import { seasonBins, type SeasonBins } from './seasonBins'

export interface CallBins extends SeasonBins {
  /** First and last dark moment of each evening, milliseconds. */
  dark: ReadonlyMap<string, readonly [from: number, to: number]>
  /** As the site's record says; null where it says nothing. */
  weather: SiteWeather | null
}

/** The dark time on offer in a call, in bins. */
export async function callBins(db: Database, call: Call): Promise<CallBins> {
  const [site, nights] = await Promise.all([
    siteRecordAt(db, call.siteId, call.seasonFrom),
    scienceNights(db, call.id),
  ])
  const season = seasonBins(site, { from: call.seasonFrom, to: call.seasonTo }, nights)
  const evenings = seasonVisibility(site, { from: call.seasonFrom, to: call.seasonTo, maxAirmass: 2 }, [])
  const dark = new Map(
    evenings.nights.flatMap(({ date, darkFrom, darkTo }) =>
      darkFrom && darkTo ? [[date, [+darkFrom, +darkTo] as const] as const] : [],
    ),
  )
  return { ...season, dark, weather: site.weather ?? null }
}
