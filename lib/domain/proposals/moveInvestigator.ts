import type { z } from 'zod'
import { updateInvestigator } from '@/db/queries/proposalPeople'
import { touchProposal } from '@/db/queries/proposals'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { namedInvestigator } from './namedInvestigator'
import { openForManaging } from './openProposal'
import { orderAfterMove } from './orderAfterMove'
import type { moveSchema } from './peopleSchema'

/** Moves a name one place up or down. The principal investigator stays first. */
export async function moveInvestigator(ctx: Context, input: z.output<typeof moveSchema>): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject } = await openForManaging(tx, input.reference)
    const person = namedInvestigator(subject, input.id)
    const order = orderAfterMove(subject.people, person.id, input.by)
    const moved = order.filter((one, index) => one.position !== index + 1)
    if (order.every((one, index) => one === subject.people[index])) return
    for (const one of moved) await updateInvestigator(tx.db, one.id, { position: order.indexOf(one) + 1 })
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'people.order',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { names: subject.people.map(({ name }) => name) },
      after: { names: order.map(({ name }) => name) },
    })
  })
}
