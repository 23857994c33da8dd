import type { z } from 'zod'
import { offerLeadTo } from '@/db/queries/leadOffers'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { leadOffered } from '../outbox/letters/leadOffered'
import { queueLetter } from '../outbox/queueLetter'
import { cannotLead, mayOfferLead } from './leadPolicy'
import { namedInvestigator } from './namedInvestigator'
import { lockedProposal } from './openProposal'
import type { investigatorSchema } from './peopleSchema'

/** Asks a member who has agreed to lead the proposal; nothing changes before they accept. */
export async function offerLead(ctx: Context, input: z.output<typeof investigatorSchema>): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject, actor } = await lockedProposal(tx, input.reference)
    authorize(mayOfferLead(actor, subject))
    const person = namedInvestigator(subject, input.id)
    const why = cannotLead(person)
    if (why || person.personId === null) throw refuse.closed(why ?? 'They have no account.')
    if (row.lead_offered_to === person.personId) return
    const askedBefore = subject.people.find(({ personId }) => personId === row.lead_offered_to)
    await offerLeadTo(tx.db, row.id, person.personId)
    await queueLetter(
      tx,
      person,
      leadOffered({
        toName: person.name,
        byName: actor.name,
        title: row.title,
        reference: row.reference,
        callTitle: subject.call.title,
        url: tx.request.origin + paths.proposalSection(row.reference, 'people'),
      }),
      // Asked again after a no is a new letter.
      `lead:${row.id}:${tx.request.id}`,
    )
    await writeLogbook(tx, {
      action: 'people.lead-offer',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { lead: actor.name, asked: askedBefore?.name ?? null },
      after: { lead: actor.name, asked: person.name },
    })
  })
}
