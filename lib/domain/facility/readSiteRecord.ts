import { findOwner } from '@/db/queries/facilityOwners'
import { siteVersions } from '@/db/queries/facilityRecords'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayEditFacility } from './policy'
import { recordPage, type RecordPage } from './recordPage'
import type { SiteFacts } from './types'

/** A site's record to be changed: every version, and who computes with it. */
export async function readSiteRecord(ctx: Context, slug: string): Promise<RecordPage<SiteFacts>> {
  authorize(mayEditFacility(ctx.actor))
  const owner = await findOwner(ctx.db, 'site', slug)
  if (!owner) throw refuse.notFound('site')
  return recordPage(ctx, 'site', owner, siteVersions)
}
