import type { z } from 'zod'
import { updateInvestigator } from '@/db/queries/proposalPeople'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { namedInvestigator } from './namedInvestigator'
import { openForManaging } from './openProposal'
import type { accessSchema } from './peopleSchema'

/** Says what a co-investigator may do: read, change, or send in place of the principal investigator. */
export async function setAccess(ctx: Context, input: z.output<typeof accessSchema>): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForManaging(tx, input.reference)
    const person = namedInvestigator(subject, input.id)
    if (person.role === 'pi') throw refuse.forbidden('The principal investigator may do everything.')
    if (person.access === input.access) return
    await updateInvestigator(tx.db, person.id, { access: input.access })
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'people.access',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { name: person.name, access: person.access },
      after: { name: person.name, access: input.access },
    })
  })
}
