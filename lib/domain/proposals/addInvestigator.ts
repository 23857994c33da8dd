import type { z } from 'zod'
import { findPersonByEmail } from '@/db/queries/people'
import { insertInvestigator } from '@/db/queries/proposalPeople'
import { touchProposal } from '@/db/queries/proposals'
import { refuse } from '@/lib/errors'
import { deadlineOf } from '../calls/rules'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { namedOnProposal } from '../outbox/letters/namedOnProposal'
import { queueLetter } from '../outbox/queueLetter'
import { answerLink } from './answerLink'
import { openForManaging } from './openProposal'
import type { addInvestigatorSchema } from './peopleSchema'

export type AddInvestigatorInput = z.output<typeof addInvestigatorSchema>

const most = 60

/** Names a co-investigator and writes to them; an account that has proved the address is tied at once. */
export async function addInvestigator(ctx: Context, input: AddInvestigatorInput): Promise<{ id: number }> {
  return inTransaction(ctx, async (tx) => {
    const { row, subject, actor } = await openForManaging(tx, input.reference)
    const known = subject.people.find(({ email }) => email.toLowerCase() === input.email.toLowerCase())
    if (known) throw refuse.field('email', `${known.name} is named already, with this address.`)
    if (subject.people.length >= most) throw refuse.field('email', `A proposal names at most ${most} people.`)
    const owner = await findPersonByEmail(tx.db, input.email)
    const person = owner?.email_confirmed_at && !owner.disabled_at ? owner : null
    const id = await insertInvestigator(tx.db, {
      proposalId: row.id,
      personId: person?.id ?? null,
      name: input.name,
      email: input.email,
      institute: input.institute || (person?.institute_text ?? ''),
      role: 'co-investigator',
      access: input.access,
      isStudent: input.isStudent,
      isSupervisor: input.isSupervisor,
      orcid: input.orcid || null,
      position: Math.max(0, ...subject.people.map(({ position }) => position)) + 1,
      confirmedAt: null,
    })
    await touchProposal(tx.db, row.id)
    await queueLetter(
      tx,
      { personId: person?.id ?? null, email: input.email, name: input.name },
      namedOnProposal({
        toName: input.name,
        byName: actor.name,
        title: row.title,
        reference: row.reference,
        callTitle: subject.call.title,
        deadline: deadlineOf(subject.call, subject.kind, subject),
        mayEdit: input.access !== 'read',
        hasAccount: person !== null,
        url: tx.request.origin + (await answerLink(tx, row, { ...input, hasAccount: person !== null })),
      }),
      `named:${row.id}:${id}`,
    )
    await writeLogbook(tx, {
      action: 'people.add',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      after: {
        name: input.name,
        access: input.access,
        institute: input.institute,
        orcid: input.orcid || null,
        isStudent: input.isStudent,
        isSupervisor: input.isSupervisor,
      },
    })
    return { id }
  })
}
