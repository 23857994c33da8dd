import { databaseNow } from '@/db/queries/clock'
import { proposalsNaming, type ListedProposal } from '@/db/queries/proposalList'
import type { ActingContext } from '../context'
import { deadlineOf, takesProposals } from '../calls/rules'
import type { Call } from '../calls/types'
import { isOpenForWriting } from './policy'
import { putAwayReason } from './putAwayDraft'
import { readOpenKinds } from './readOpenKinds'
import type { ProposalRow, ProposalsReply } from './tableSchema'

/** The newest open call that a programme is not in yet, for those who may carry it on. */
function continueIn(found: ListedProposal, open: readonly Pick<Call, 'id' | 'number'>[]): number | null {
  if (!found.maySpeak) return null
  const free = open.filter(({ id }) => id !== found.callId && !found.programmeCalls.includes(id))
  return free[0]?.number ?? null
}

function rowOf(found: ListedProposal, now: Date, open: readonly Pick<Call, 'id' | 'number'>[]): ProposalRow {
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
    continueIn: continueIn(found, open),
  }
}

/** The proposals that name the reader, for the page and for its table's data. */
export async function listProposals(ctx: ActingContext): Promise<ProposalsReply> {
  const person = { id: ctx.actor.personId, email: ctx.actor.email }
  const [now, found, kinds] = await Promise.all([
    databaseNow(ctx.db),
    proposalsNaming(ctx.db, person),
    readOpenKinds(ctx),
  ])
  const open = kinds.map(({ call }) => call)
  return { now: now.toISOString(), rows: found.map((one) => rowOf(one, now, open)) }
}
