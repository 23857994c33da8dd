import type { z } from 'zod'
import { databaseNow } from '@/db/queries/clock'
import { touchProposal } from '@/db/queries/proposals'
import { findWriting, putWriting } from '@/db/queries/writings'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { openForEditing } from '../proposals/openProposal'
import { staleProposal } from '../proposals/staleProposal'
import type { Saved } from '../proposals/writeProposal'
import { measure } from './measure'
import type { saveWritingSchema } from './schema'

export type SaveWritingInput = z.output<typeof saveWritingSchema>

/** Keeps a text as it is typed; refused when someone saved since `version` was read. */
export async function saveWriting(ctx: Context, input: SaveWritingInput): Promise<Saved> {
  return inTransaction(ctx, async (tx) => {
    const { row } = await openForEditing(tx, input.reference)
    const { part, text } = input
    const before = await findWriting(tx.db, row.id, part)
    if (before.version !== input.version)
      throw await staleProposal(
        tx,
        {
          reference: row.reference,
          version: before.version,
          updated_at: before.updatedAt ?? row.updated_at,
        },
        { text: before.text },
      )
    if (before.text === text)
      return { version: before.version, savedAt: (before.updatedAt ?? row.updated_at).toISOString() }
    if (!(await putWriting(tx.db, { proposalId: row.id, part, text, version: before.version })))
      throw refuse.integrity('The text changed while its proposal was locked.')
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'writing.save',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: measure(part, before.text),
      after: measure(part, text),
    })
    return { version: before.version + 1, savedAt: (await databaseNow(tx.db)).toISOString() }
  })
}
