import { endLeadOffer } from '@/db/queries/leadOffers'
import { deleteInvestigator } from '@/db/queries/proposalPeople'
import { touchProposal } from '@/db/queries/proposals'
import { authorize } from '@/lib/auth/authorize'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { lockedProposal } from './openProposal'
import { investigatorRow, mayLeave } from './policy'

/** A co-investigator takes the own name off; to them the proposal does not exist any more. */
export async function leaveProposal(ctx: Context, input: { reference: string }): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject, actor } = await lockedProposal(tx, input.reference)
    authorize(mayLeave(actor, subject))
    const own = investigatorRow(actor, subject)
    if (!own) return
    await deleteInvestigator(tx.db, own.id)
    if (row.lead_offered_to === actor.personId) await endLeadOffer(tx.db, row.id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'people.leave',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { name: own.name, access: own.access, agreed: own.confirmedAt !== null },
    })
  })
}
