import type { z } from 'zod'
import { findOwner } from '@/db/queries/facilityOwners'
import { insertTelescopeRecord, telescopeVersions } from '@/db/queries/facilityRecords'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { mayEditFacility } from './policy'
import { saveVersion } from './saveVersion'
import { telescopeTyped } from './telescopeForm'
import type { telescopeRecordSchema } from './telescopeSchema'

/** Writes a new version of a telescope's record. */
export async function saveTelescopeRecord(
  ctx: ActingContext,
  input: z.output<typeof telescopeRecordSchema>,
): Promise<{ recordVersion: number }> {
  authorize(mayEditFacility(ctx.actor))
  const owner = await findOwner(ctx.db, 'telescope', input.slug)
  if (!owner) throw refuse.notFound('telescope')
  return saveVersion(ctx, {
    kind: 'telescope',
    owner,
    input,
    versions: telescopeVersions,
    insert: insertTelescopeRecord,
    typed: telescopeTyped,
  })
}
