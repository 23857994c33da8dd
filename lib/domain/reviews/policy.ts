import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holdsForPanel, type Actor } from '../actor'
import { callPhase } from '../calls/rules'
import type { Call } from '../calls/types'
import type { ProposalState } from '../proposals/types'
import { whyNotReopened, whySheetIsShut } from './rules'

export interface ReviewFacts {
  assignment: { personId: number; panelId: number; finishedAt: Date | null; withdrawnAt: Date | null }
  proposalState: ProposalState
  call: Pick<Call, 'id' | 'stage' | 'opensAt' | 'closesAt' | 'panelMeetsAt' | 'reviewsDueAt'>
  isBarred: boolean
  hasDeclared: boolean
  now: Date
}

const gone: readonly ProposalState[] = ['draft', 'withdrawn', 'lapsed']

/** Whether the review exists for this person at all; whoever has an interest is never told that it does. */
export function canSeeReview(actor: Actor, facts: ReviewFacts): Decision {
  const { assignment, call } = facts
  const phase = callPhase(call, facts.now)
  const isTheirs = assignment.personId === actor.personId && assignment.withdrawnAt === null
  if (!isTheirs || facts.isBarred || gone.includes(facts.proposalState)) return unseen('review')
  if (!holdsForPanel(actor, 'reviewer', call.id, assignment.panelId)) return unseen('review')
  if (phase === 'planned' || phase === 'open' || phase === 'archived') return unseen('review')
  return yes
}

/** Opening the packet and the sheet: only after the list of names has been gone through. */
export function canOpenReview(actor: Actor, facts: ReviewFacts): Decision {
  const seen = canSeeReview(actor, facts)
  if (!seen.allowed) return seen
  return facts.hasDeclared ? yes : no('conflict', 'Go through the list of names first.')
}

export function canWriteReview(actor: Actor, facts: ReviewFacts): Decision {
  const open = canOpenReview(actor, facts)
  if (!open.allowed) return open
  const shut = whySheetIsShut(facts.call, facts.assignment.finishedAt, facts.now)
  return shut ? no('window', shut) : yes
}

export function canReopenReview(actor: Actor, facts: ReviewFacts): Decision {
  const open = canOpenReview(actor, facts)
  if (!open.allowed) return open
  const shut = whyNotReopened(facts.call, facts.assignment.finishedAt, facts.now)
  return shut ? no('window', shut) : yes
}
