import { insertBulkLetter, updateBulkLetter } from '@/db/queries/bulkLetters'
import { callsToWriteAbout } from '@/db/queries/recipients'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayWriteToMany } from './policy'
import type { SaveBulkLetter } from './schema'

/** Keeps a letter to many as a draft; nothing is sent. Returns its id and version. */
export async function saveBulkLetter(
  ctx: ActingContext,
  input: SaveBulkLetter,
): Promise<{ id: number; version: number }> {
  authorize(mayWriteToMany(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const { id, version, subject, text, parts, callId, states } = input
    if (callId && !(await callsToWriteAbout(tx.db)).some((call) => String(call.id) === callId))
      throw refuse.field('callId', 'There is no such call.')
    const facts = { subject, text, audience: JSON.stringify({ parts, callId, states }) }
    if (id !== 0 && !(await updateBulkLetter(tx.db, id, version, facts)))
      throw refuse.closed('This letter was changed or sent in between. Load the page again.')
    const saved = id || (await insertBulkLetter(tx.db, { ...facts, writtenBy: tx.actor.personId }))
    await writeLogbook(tx, {
      action: 'bulk-letter.save',
      subject: { kind: 'bulk letter', id: saved },
      actingAs: 'office',
      after: { subject },
    })
    return { id: saved, version: id === 0 ? 1 : version + 1 }
  })
}
