import type { z } from 'zod'
import { findOwner } from '@/db/queries/facilityOwners'
import { insertSiteRecord, siteVersions } from '@/db/queries/facilityRecords'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { mayEditFacility } from './policy'
import { saveVersion } from './saveVersion'
import { siteTyped } from './siteForm'
import type { siteRecordSchema } from './siteSchema'

/** Writes a new version of a site's record. */
export async function saveSiteRecord(
  ctx: ActingContext,
  input: z.output<typeof siteRecordSchema>,
): Promise<{ recordVersion: number }> {
  authorize(mayEditFacility(ctx.actor))
  const owner = await findOwner(ctx.db, 'site', input.slug)
  if (!owner) throw refuse.notFound('site')
  return saveVersion(ctx, {
    kind: 'site',
    owner,
    input,
    versions: siteVersions,
    insert: insertSiteRecord,
    typed: siteTyped,
  })
}
