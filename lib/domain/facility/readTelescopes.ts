import { databaseNow } from '@/db/queries/clock'
import { siteRecordsAt, telescopesAtSites } from '@/db/queries/facility'
import type { Context } from '../context'
import type { SiteRecord, TelescopeFacts } from './types'

export interface TelescopeAtSite {
  id: number
  slug: string
  name: string
  /** The records in force today. */
  site: SiteRecord
  facts: TelescopeFacts
}

/** Every telescope with its record and its site's in force today, and the moment they were read. */
export async function readTelescopes(ctx: Context): Promise<{ now: Date; telescopes: TelescopeAtSite[] }> {
  const now = await databaseNow(ctx.db)
  const today = now.toISOString().slice(0, 10)
  const [sites, telescopes] = await Promise.all([
    siteRecordsAt(ctx.db, today),
    telescopesAtSites(ctx.db, today),
  ])
  return {
    now,
    telescopes: telescopes.flatMap(({ siteId, ...telescope }) =>
      sites.filter((site) => site.siteId === siteId).map((site) => ({ ...telescope, site })),
    ),
  }
}
