import { databaseNow } from '@/db/queries/clock'
import { siteRecordsAt, telescopesAtSites } from '@/db/queries/facility'
import type { Context } from '../context'
import type { SiteRecord } from './types'

export interface TelescopeAtSite {
  id: number
  slug: string
  name: string
  /** The record in force today. */
  site: SiteRecord
}

/** Every telescope with the record of its site in force today, and the moment they were read. */
export async function readTelescopes(ctx: Context): Promise<{ now: Date; telescopes: TelescopeAtSite[] }> {
  const now = await databaseNow(ctx.db)
  const [sites, telescopes] = await Promise.all([
    siteRecordsAt(ctx.db, now.toISOString().slice(0, 10)),
    telescopesAtSites(ctx.db),
  ])
  return {
    now,
    telescopes: telescopes.flatMap(({ siteId, ...telescope }) =>
      sites.filter((site) => site.siteId === siteId).map((site) => ({ ...telescope, site })),
    ),
  }
}
