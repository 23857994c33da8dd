import { programmeInCall } from '@/db/queries/programmes'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { lockedProposal } from './openProposal'
import { mayManagePeople } from './policy'
import { putAwayReason } from './putAwayDraft'
import { writeProposal, type Saved } from './writeProposal'

/** Takes a draft that was put away back, as it was. */
export async function takeBackDraft(ctx: Context, input: { reference: string }): Promise<Saved> {
  return inTransaction(ctx, async (tx) => {
    const opened = await lockedProposal(tx, input.reference)
    const asDraft = { ...opened.subject, state: 'draft' as const }
    authorize(mayManagePeople(opened.actor, asDraft, opened.now))
    if (opened.row.state !== 'withdrawn' || opened.row.withdrawn_reason !== putAwayReason)
      throw refuse.closed('Only a draft that was put away can be taken back.')
    const standing = await programmeInCall(tx.db, opened.row.programme_id, opened.row.call_id)
    if (standing) throw refuse.closed('Another proposal of this programme stands in this call.')
    return writeProposal(tx, opened, 'proposal.take-back', {
      state: 'draft',
      withdrawn_at: null,
      withdrawn_reason: null,
    })
  })
}
