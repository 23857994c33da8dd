import type { z } from 'zod'
import { findOwner } from '@/db/queries/facilityOwners'
import { insertModeRecord } from '@/db/queries/facilityRecords'
import { insertMode } from '@/db/queries/newRecords'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { beginRecord } from './beginRecord'
import type { newModeSchema } from './modeSchema'
import { mayEditMode } from './policy'

/** A new mode of an instrument with its first record. */
export async function createMode(
  ctx: ActingContext,
  input: z.output<typeof newModeSchema>,
): Promise<{ slug: string }> {
  const instrument = await findOwner(ctx.db, 'instrument', input.of)
  if (!instrument) throw refuse.field('of', 'There is no such instrument.')
  authorize(mayEditMode(ctx.actor, instrument.id))
  return beginRecord(ctx, {
    kind: 'mode',
    input,
    carrier: 'instrument',
    insertOwner: (db, carrierId) => insertMode(db, carrierId, input),
    insert: insertModeRecord,
  })
}
