import { databaseNow } from '@/db/queries/clock'
import { authorize } from '@/lib/auth/authorize'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { lockedProposal } from './openProposal'
import { mayPutAway } from './policy'
import { writeProposal, type Saved } from './writeProposal'

/** The words kept with a draft its author put away; only those may be taken back. */
export const putAwayReason = 'Put away by the investigators before it was sent.'

/** Puts a draft that was never sent away. Nothing is deleted; it can be taken back while the call is open. */
export async function putAwayDraft(ctx: Context, input: { reference: string }): Promise<Saved> {
  return inTransaction(ctx, async (tx) => {
    const opened = await lockedProposal(tx, input.reference)
    authorize(mayPutAway(opened.actor, opened.subject))
    return writeProposal(tx, opened, 'proposal.put-away', {
      state: 'withdrawn',
      withdrawn_at: await databaseNow(tx.db),
      withdrawn_reason: putAwayReason,
    })
  })
}
