import type { CallPhase } from '../calls/types'

/** Why the review of a call cannot start at this phase; null when it can. */
export function whyNotStartReview(phase: CallPhase): string | null {
  if (phase === 'closed') return null
  if (phase === 'planned' || phase === 'open') return 'The review starts once the call has closed.'
  return 'The review of this call has started already.'
}

/** Why a panel's own measure can no longer be changed; null until its review opens. */
export function whyFormulaIsFixed(phase: CallPhase): string | null {
  return phase === 'planned' || phase === 'open' || phase === 'closed'
    ? null
    : 'The formula was fixed when the review opened.'
}

/** Why a panel cannot begin its ranking; null when it can. */
export function whyNotStartRanking(
  phase: CallPhase,
  hasRanking: boolean,
  reviewsFinished: number,
): string | null {
  if (hasRanking) return 'This panel has begun its ranking already.'
  if (phase !== 'review' && phase !== 'ranking') return 'A ranking is begun after the review has started.'
  return reviewsFinished > 0 ? null : 'No review is finished yet: there is nothing to rank by.'
}

/** Why places, the line and awards cannot be changed; null when they can. */
export function whyNotRanked(phase: CallPhase, hasRanking: boolean): string | null {
  if (phase === 'decided' || phase === 'archived')
    return 'The decisions of this call are made known: the ranking stands.'
  return hasRanking ? null : 'Begin the ranking first.'
}
