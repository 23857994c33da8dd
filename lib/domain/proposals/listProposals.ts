import { databaseNow } from '@/db/queries/clock'
import { proposalsNaming, type ListedProposal } from '@/db/queries/proposalList'
import type { ActingContext } from '../context'
import { deadlineOf, takesProposals } from '../calls/rules'
import { isOpenForWriting } from './policy'
import { putAwayReason } from './putAwayDraft'
import type { ProposalRow, ProposalsReply } from './tableSchema'

function rowOf(found: ListedProposal, now: Date): ProposalRow {
  const call = { stage: found.call.stage, opensAt: found.call.opens_at, closesAt: found.call.closes_at }
  const deadline = deadlineOf(call, found.kind, found)
  return {
    reference: found.reference,
    title: found.title,
    state: found.state,
    isReopened: found.isReopened,
    isPutAway: found.state === 'withdrawn' && found.withdrawnReason === putAwayReason,
    callNumber: found.call.number,
    callSlug: found.call.slug,
    callTitle: found.call.title,
    kindTitle: found.kind.title,
    askedSeconds: found.askedSeconds,
    targets: found.targets,
    lead: found.lead,
    isLead: found.isLead,
    hasAgreed: found.hasAgreed,
    deadline: deadline.toISOString(),
    isOpen: isOpenForWriting(found) && takesProposals(call, deadline, now),
    updatedAt: found.updatedAt.toISOString(),
  }
}

/** The proposals that name the reader, for the page and for its table's data. */
export async function listProposals(ctx: ActingContext): Promise<ProposalsReply> {
  const person = { id: ctx.actor.personId, email: ctx.actor.email }
  const [now, found] = await Promise.all([databaseNow(ctx.db), proposalsNaming(ctx.db, person)])
  return { now: now.toISOString(), rows: found.map((one) => rowOf(one, now)) }
}
