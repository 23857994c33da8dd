import { findPerson } from '@/db/queries/people'
import { confirmInvestigator } from '@/db/queries/proposalPeople'
import { touchProposal } from '@/db/queries/proposals'
import { authorize } from '@/lib/auth/authorize'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { lockedProposal } from './openProposal'
import { investigatorRow, mayConfirm } from './policy'

/** The person named agrees: from now on the name stands as they write it themselves. */
export async function confirmMembership(ctx: Context, input: { reference: string }): Promise<void> {
  await inTransaction(ctx, async (tx) => {
    const { row, subject, actor, now } = await lockedProposal(tx, input.reference)
    authorize(mayConfirm(actor, subject))
    const own = investigatorRow(actor, subject)
    if (!own || own.confirmedAt) return
    const person = await findPerson(tx.db, actor.personId)
    await confirmInvestigator(tx.db, own.id, {
      personId: actor.personId,
      name: actor.name,
      institute: own.institute || (person?.institute_text ?? ''),
      confirmedAt: now,
    })
    await touchProposal(tx.db, row.id)
    await writeLogbook(tx, {
      action: 'people.agree',
      subject: { kind: 'proposal', id: row.reference },
      actingAs: 'investigator',
      before: { name: own.name, agreed: false },
      after: { name: actor.name, agreed: true },
    })
  })
}
