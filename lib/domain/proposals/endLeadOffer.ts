import { endLeadOffer as endOffer } from '@/db/queries/leadOffers'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { mayAnswerLeadOffer, mayOfferLead } from './leadPolicy'
import { lockedProposal } from './openProposal'

/** Ends the question who is to lead: whoever asked takes it back, or whoever was asked says no. */
export async function endLeadOffer(ctx: Context, input: { reference: string }): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject, actor } = await lockedProposal(tx, input.reference)
    const isAsked = row.lead_offered_to === actor.personId
    authorize(isAsked ? mayAnswerLeadOffer(actor, subject, actor.personId) : mayOfferLead(actor, subject))
    if (row.lead_offered_to === null) throw refuse.closed('Nobody is asked to lead it at the moment.')
    const asked = subject.people.find(({ personId }) => personId === row.lead_offered_to)
    await endOffer(tx.db, row.id)
    await writeLogbook(tx, {
      action: isAsked ? 'people.lead-decline' : 'people.lead-take-back',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { asked: asked?.name ?? null },
      after: { asked: null },
    })
  })
}
