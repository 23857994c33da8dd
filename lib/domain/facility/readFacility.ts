import { databaseNow } from '@/db/queries/clock'
import { modeRecordsAt, siteRecordsAt } from '@/db/queries/facility'
import type { Context } from '../context'
import type { FacilityView } from './types'

/** Every site and instrument mode with the record in force today. Facility records are public facts. */
export async function readFacility(ctx: Context): Promise<FacilityView> {
  const today = (await databaseNow(ctx.db)).toISOString().slice(0, 10)
  const [sites, modes] = await Promise.all([siteRecordsAt(ctx.db, today), modeRecordsAt(ctx.db, today, null)])
  return { sites, modes }
}
