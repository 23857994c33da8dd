import type { z } from 'zod'
import { insertTelescopeRecord } from '@/db/queries/facilityRecords'
import { insertTelescope } from '@/db/queries/newRecords'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { beginRecord } from './beginRecord'
import type { newTelescopeSchema } from './telescopeSchema'
import { mayEditFacility } from './policy'

/** A new telescope of a site with its first record. */
export async function createTelescope(
  ctx: ActingContext,
  input: z.output<typeof newTelescopeSchema>,
): Promise<{ slug: string }> {
  authorize(mayEditFacility(ctx.actor))
  return beginRecord(ctx, {
    kind: 'telescope',
    input,
    carrier: 'site',
    insertOwner: (db, carrierId) => insertTelescope(db, carrierId, input),
    insert: insertTelescopeRecord,
  })
}
