import { markReopened } from '@/db/queries/submission'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { lockContents } from './lockContents'
import { mayReopenProposal } from './policy'

/** Opens a sent proposal for writing. The version that was sent stands until another is. */
export async function reopenProposal(
  ctx: ActingContext,
  input: { reference: string; arrivedAt: Date },
): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, contents } = await lockContents(tx, input.reference)
    authorize(mayReopenProposal(tx.actor, contents, input.arrivedAt))
    if (!(await markReopened(tx.db, row)))
      throw refuse.closed('This proposal has moved on. Load the page again.')
    await writeLogbook(tx, {
      action: 'proposal.reopen',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'investigator',
      before: { isReopened: false },
      after: { isReopened: true },
    })
  })
}
