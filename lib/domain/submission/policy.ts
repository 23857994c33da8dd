import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { formatUtcInstant } from '@/lib/format'
import { holds, type Actor } from '../actor'
import { deadlineOf, takesProposals } from '../calls/rules'
import { investigatorRow, lacksRight, mayLead as leads, type ProposalSubject } from '../proposals/policy'

function mayLead(actor: Actor, subject: ProposalSubject, act: string): Decision {
  const row = investigatorRow(actor, subject)
  if (!row)
    return holds(actor, 'office') ? no('role', `The office does not ${act} proposals.`) : unseen('proposal')
  return leads(row) ? yes : lacksRight(row, `The principal investigator or a deputy may ${act} the proposal.`)
}

/** A sent proposal may be written again until its deadline, judged by the stamp of arrival. */
export function mayReopenProposal(actor: Actor, subject: ProposalSubject, arrivedAt: Date): Decision {
  const lead = mayLead(actor, subject, 'reopen')
  if (!lead.allowed) return lead
  if (subject.state !== 'submitted') return no('window', 'Only a proposal that was sent can be reopened.')
  if (subject.isReopened) return no('window', 'This proposal is open already.')
  const deadline = deadlineOf(subject.call, subject.kind, subject)
  if (takesProposals(subject.call, deadline, arrivedAt)) return yes
  return no('window', `The call closed at ${formatUtcInstant(deadline)}. The version that was sent stands.`)
}

/** Until it is decided a proposal may be withdrawn; what was assigned or written about it stays. */
export function mayWithdrawProposal(actor: Actor, subject: ProposalSubject): Decision {
  const lead = mayLead(actor, subject, 'withdraw')
  if (!lead.allowed) return lead
  if (subject.state === 'submitted' || subject.state === 'under-review') return yes
  if (subject.state === 'draft') return no('window', 'A proposal that was never sent need not be withdrawn.')
  return no('window', 'This proposal has been decided or has left the call. It cannot be withdrawn.')
}
