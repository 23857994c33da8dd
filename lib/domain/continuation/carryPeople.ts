import { insertInvestigator } from '@/db/queries/proposalPeople'
import { deadlineOf } from '../calls/rules'
import type { Call, CallKind } from '../calls/types'
import type { ActingContext } from '../context'
import { namedOnProposal } from '../outbox/letters/namedOnProposal'
import { queueLetter } from '../outbox/queueLetter'
import { answerLink } from '../proposals/answerLink'
import { namedOnSending } from '../proposals/namedOnSending'
import type { Investigator } from '../proposals/types'

export interface NewProposalOfPeople {
  id: number
  reference: string
  title: string
  call: Call
  kind: CallKind
  now: Date
}

/**
 * Names the people of an earlier proposal on a new one: whoever carries it on leads, the others come in their order,
 * are written to, and must agree anew. Who had never agreed is not named again.
 */
export async function carryPeople(
  tx: ActingContext,
  people: readonly Investigator[],
  proposal: NewProposalOfPeople,
): Promise<void> {
  const own = people.find(({ personId }) => personId === tx.actor.personId)
  const order = [...(own ? [own] : []), ...namedOnSending(people).filter((person) => person !== own)]
  for (const [index, person] of order.entries()) {
    const leads = person === own
    const id = await insertInvestigator(tx.db, {
      ...person,
      proposalId: proposal.id,
      role: leads ? 'pi' : 'co-investigator',
      // Who led before goes on as a deputy.
      access: person.role === 'pi' && !leads ? 'deputy' : person.access,
      position: index + 1,
      confirmedAt: leads ? proposal.now : null,
    })
    if (leads) continue
    const hasAccount = person.personId !== null
    await queueLetter(
      tx,
      person,
      namedOnProposal({
        toName: person.name,
        byName: tx.actor.name,
        title: proposal.title,
        reference: proposal.reference,
        callTitle: proposal.call.title,
        deadline: deadlineOf(proposal.call, proposal.kind, { closesAt: null }),
        mayEdit: person.access !== 'read',
        hasAccount,
        url: tx.request.origin + (await answerLink(tx, proposal, { ...person, hasAccount })),
      }),
      `named:${proposal.id}:${id}`,
    )
  }
}
