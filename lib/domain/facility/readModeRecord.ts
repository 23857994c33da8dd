import { modeOwners, type ModeOwner } from '@/db/queries/facilityOwners'
import { modeVersions } from '@/db/queries/facilityRecords'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { mayEditMode } from './policy'
import { recordPage, type RecordPage } from './recordPage'
import type { ModeFacts } from './types'

/** A mode's record to be changed: every version, who computes with it, and the calls that offer it. */
export async function readModeRecord(
  ctx: Context,
  slug: string,
): Promise<RecordPage<ModeFacts> & { mode: ModeOwner }> {
  const [mode] = await modeOwners(ctx.db, { slug })
  if (!mode) throw refuse.notFound('mode')
  authorize(mayEditMode(ctx.actor, mode.instrument.id))
  return { mode, ...(await recordPage(ctx, 'mode', mode, modeVersions)) }
}
