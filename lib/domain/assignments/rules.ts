import type { CallPhase } from '../calls/types'
import { RECENT_CALLS, type BarredPair } from '../conflicts/types'
import { countInWords } from '@/lib/format'
import type { ProposalState } from '../proposals/types'

/**
 * An interest in words for the chair. What was found by matching is not named closer: 'same institute' would tell
 * the panel where the investigators work.
 */
export function interestInWords({ kind, source }: Pick<BarredPair, 'kind' | 'source'>): string {
  if (source === 'matched' && kind === 'collaborator')
    return `is named with one of its investigators on a proposal of this call or of the ${countInWords(RECENT_CALLS, 'call', 'calls')} before it`
  if (source === 'matched' || kind === 'investigator' || kind === 'institute')
    return 'has an interest in it, found by matching people and institutes'
  const words = {
    collaborator: 'works with an investigator',
    family: 'is close to an investigator',
    rival: 'works against an investigator',
    other: 'declared an interest',
  }[kind]
  return source === 'chair'
    ? `has an interest in it, set by the chair: ${words}`
    : `has declared an interest: ${words}`
}

export interface PairFacts {
  phase: CallPhase
  state: ProposalState
  reviewNumber: string
  reviewer: { name: string; mayReview: boolean } | null
  interest: Pick<BarredPair, 'kind' | 'source'> | null
}

/** Why a proposal cannot be given to a reviewer, in a sentence; null when it can. */
export function whyNotAssigned(facts: PairFacts): string | null {
  const { phase, state, reviewNumber, reviewer, interest } = facts
  if (phase !== 'closed' && phase !== 'review')
    return phase === 'planned' || phase === 'open'
      ? 'Reviewers are assigned once the call has closed.'
      : 'The panel has begun its ranking: nothing more is assigned.'
  if (state !== 'submitted' && state !== 'under-review') return `${reviewNumber} is no longer under review.`
  if (!reviewer) return 'This person does not sit on the panel.'
  if (interest) return `${reviewer.name} cannot read ${reviewNumber}: ${interestInWords(interest)}.`
  return reviewer.mayReview ? null : `${reviewer.name} does not hold the reviewer’s role on this panel.`
}

/** Whether a reviewer may be reminded again: once a day (UTC) at most, and only of what is owed. */
export function whyNotReminded(owed: number, last: Date | null, now: Date): string | null {
  if (owed === 0) return 'Nothing is owed.'
  const day = (date: Date) => date.toISOString().slice(0, 10)
  return last && day(last) === day(now) ? 'Reminded today; once a day is enough.' : null
}

const dayMs = 86_400_000

/**
 * Which reminder is due by itself: a week and a day before reviews are due, and a day after, until the panel meets;
 * null between them. Each is written once, and one whose time passed unnoticed is not made up for.
 */
export function reminderDue(dueAt: Date, meetsAt: Date, now: Date): 'week' | 'day' | 'late' | null {
  if (now >= meetsAt) return null
  const left = dueAt.getTime() - now.getTime()
  if (left <= -dayMs) return 'late'
  if (left <= 0) return null
  if (left <= dayMs) return 'day'
  return left <= 7 * dayMs ? 'week' : null
}
