import { findOwner } from '@/db/queries/facilityOwners'
import { telescopeVersions } from '@/db/queries/facilityRecords'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayEditFacility } from './policy'
import { recordPage, type RecordPage } from './recordPage'
import type { TelescopeFacts } from './types'

/** A telescope's record to be changed: every version, and who computes with it. */
export async function readTelescopeRecord(ctx: Context, slug: string): Promise<RecordPage<TelescopeFacts>> {
  authorize(mayEditFacility(ctx.actor))
  const owner = await findOwner(ctx.db, 'telescope', slug)
  if (!owner) throw refuse.notFound('telescope')
  return recordPage(ctx, 'telescope', owner, telescopeVersions)
}
