import type { Database } from '@/db/client'
import { siteRecordAt } from '@/db/queries/facility'
import { scienceNights } from '@/db/queries/scienceNights'
import type { Call } from '../calls/types'
import { seasonBins, type SeasonBins } from './seasonBins'

/** The dark time on offer in a call, in bins. */
export async function callBins(db: Database, call: Call): Promise<SeasonBins> {
  const [site, nights] = await Promise.all([
    siteRecordAt(db, call.siteId, call.seasonFrom),
    scienceNights(db, call.id),
  ])
  return seasonBins(site, { from: call.seasonFrom, to: call.seasonTo }, nights)
}
