import type { z } from 'zod'
import { modeOwners } from '@/db/queries/facilityOwners'
import { insertModeRecord, modeVersions } from '@/db/queries/facilityRecords'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { modeTyped } from './modeForm'
import type { modeRecordSchema } from './modeSchema'
import { mayEditMode } from './policy'
import { saveVersion } from './saveVersion'

/** Writes a new version of a mode's record. */
export async function saveModeRecord(
  ctx: ActingContext,
  input: z.output<typeof modeRecordSchema>,
): Promise<{ recordVersion: number }> {
  const [owner] = await modeOwners(ctx.db, { slug: input.slug })
  if (!owner) throw refuse.notFound('mode')
  authorize(mayEditMode(ctx.actor, owner.instrument.id))
  return saveVersion(ctx, {
    kind: 'mode',
    owner,
    input,
    versions: modeVersions,
    insert: insertModeRecord,
    typed: modeTyped,
  })
}
