import { no, unseen, yes, type Decision } from '@/lib/auth/decision'
import { holdsForInstrument, type Actor } from '../actor'
import { callPhase } from '../calls/rules'
import type { Call, CallPhase } from '../calls/types'
import type { ProposalState } from '../proposals/types'

export interface RequestFacts {
  instrumentId: number
  proposalState: ProposalState
  call: Pick<Call, 'stage' | 'opensAt' | 'closesAt'>
  isBarred: boolean
  now: Date
}

const gone: readonly ProposalState[] = ['draft', 'withdrawn', 'lapsed']

/** Requests on one's own instruments, once the call has closed; never on a proposal one has an interest in. */
export function canSeeRequest(actor: Actor, facts: RequestFacts): Decision {
  const phase = callPhase(facts.call, facts.now)
  if (!holdsForInstrument(actor, facts.instrumentId) || facts.isBarred) return unseen('request')
  if (gone.includes(facts.proposalState)) return unseen('request')
  return phase === 'planned' || phase === 'open' || phase === 'archived' ? unseen('request') : yes
}

/** Whether assessments of a call are still made: from its closing until a panel begins to rank. */
export const isAssessed = (phase: CallPhase): boolean => phase === 'closed' || phase === 'review'

/** Assessing, asking and passing on end when the panel begins to rank. */
export function canAssess(actor: Actor, facts: RequestFacts): Decision {
  const seen = canSeeRequest(actor, facts)
  if (!seen.allowed) return seen
  return isAssessed(callPhase(facts.call, facts.now))
    ? yes
    : no('window', 'The panel has begun to rank: assessments of this call are settled.')
}

export interface AnswerFacts {
  people: readonly {
    personId: number | null
    role: 'pi' | 'co-investigator'
    access: 'read' | 'edit' | 'deputy'
    confirmedAt: Date | null
  }[]
  call: RequestFacts['call']
  proposalState: ProposalState
  now: Date
}

/** The principal investigator answers, or whoever may edit; until the panel begins to rank. */
export function canAnswerQuestion(actor: Actor, facts: AnswerFacts): Decision {
  const self = facts.people.find(({ personId }) => personId === actor.personId)
  if (!self) return unseen('question')
  if (self.confirmedAt === null) return no('role', 'Agree to be named on this proposal first.')
  if (self.role !== 'pi' && self.access === 'read')
    return no('role', 'You may read this proposal, not answer for it.')
  const phase = callPhase(facts.call, facts.now)
  const isLate = phase !== 'closed' && phase !== 'review'
  return isLate || gone.includes(facts.proposalState)
    ? no('window', 'The panel has begun to rank: it is too late to answer.')
    : yes
}
