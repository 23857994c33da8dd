import type { z } from 'zod'
import { insertSiteRecord } from '@/db/queries/facilityRecords'
import { insertSite } from '@/db/queries/newRecords'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { beginRecord } from './beginRecord'
import type { newSiteSchema } from './siteSchema'
import { mayEditFacility } from './policy'

/** A new site with its first record. */
export async function createSite(
  ctx: ActingContext,
  input: z.output<typeof newSiteSchema>,
): Promise<{ slug: string }> {
  authorize(mayEditFacility(ctx.actor))
  return beginRecord(ctx, {
    kind: 'site',
    input,
    carrier: null,
    insertOwner: (db) => insertSite(db, input),
    insert: insertSiteRecord,
  })
}
