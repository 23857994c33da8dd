import type { z } from 'zod'
import { withdrawNaming } from '@/db/queries/invitations'
import { endLeadOffer } from '@/db/queries/leadOffers'
import { deleteInvestigator } from '@/db/queries/proposalPeople'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { namedInvestigator } from './namedInvestigator'
import { openForManaging } from './openProposal'
import type { investigatorSchema } from './peopleSchema'

/** Takes a co-investigator off. What was sent before keeps the name. */
export async function removeInvestigator(
  ctx: Context,
  input: z.output<typeof investigatorSchema>,
): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForManaging(tx, input.reference)
    const person = namedInvestigator(subject, input.id)
    if (person.role === 'pi') throw refuse.forbidden('The principal investigator cannot be taken off.')
    await deleteInvestigator(tx.db, person.id)
    await withdrawNaming(tx.db, row.id, person.email)
    if (row.lead_offered_to !== null && row.lead_offered_to === person.personId)
      await endLeadOffer(tx.db, row.id)
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'people.remove',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { name: person.name, access: person.access, agreed: person.confirmedAt !== null },
    })
  })
}
