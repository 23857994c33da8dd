import { endLeadOffer, setProgrammeLead } from '@/db/queries/leadOffers'
import { updateInvestigator } from '@/db/queries/proposalPeople'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { leadTaken } from '../outbox/letters/leadTaken'
import { queueLetter } from '../outbox/queueLetter'
import { cannotLead, mayAnswerLeadOffer } from './leadPolicy'
import { lockedProposal } from './openProposal'
import { investigatorRow } from './policy'

/** Takes the lead that was offered. Who led stays as the second name, with the rights of a deputy. */
export async function acceptLead(ctx: Context, input: { reference: string }): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject, actor } = await lockedProposal(tx, input.reference)
    authorize(mayAnswerLeadOffer(actor, subject, row.lead_offered_to))
    const own = investigatorRow(actor, subject)
    const before = subject.people.find(({ role }) => role === 'pi')
    if (!own || !before) throw refuse.integrity('Nobody leads this proposal.')
    const why = cannotLead(own)
    if (why) throw refuse.closed(why)
    await updateInvestigator(tx.db, before.id, { role: 'co-investigator', access: 'deputy' })
    await updateInvestigator(tx.db, own.id, { role: 'pi', access: 'edit' })
    const order = [own, before, ...subject.people.filter((one) => one !== own && one !== before)]
    for (const [index, person] of order.entries())
      if (person.position !== index + 1) await updateInvestigator(tx.db, person.id, { position: index + 1 })
    await endLeadOffer(tx.db, row.id)
    await setProgrammeLead(tx.db, row.programme_id, actor.personId)
    await queueLetter(
      tx,
      before,
      leadTaken({
        toName: before.name,
        byName: own.name,
        title: row.title,
        reference: row.reference,
        url: tx.request.origin + paths.proposalSection(row.reference, 'people'),
      }),
      `lead-taken:${row.id}:${tx.request.id}`,
    )
    await writeLogbook(tx, {
      action: 'people.lead-accept',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { lead: before.name, names: subject.people.map(({ name }) => name) },
      after: { lead: own.name, names: order.map(({ name }) => name) },
    })
  })
}
