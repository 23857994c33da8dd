import { callPhase } from '../calls/rules'
import type { Call } from '../calls/types'
import type { ReviewState, SheetCriterion } from './types'

/** Fewest characters the investigators are given to read. */
const shortestText = 50
export const longestText = 4000

/** Weighted mean of the criteria scored so far, 0 to 10; null while none is. */
export function weightedMean(
  criteria: readonly Pick<SheetCriterion, 'weight' | 'halfPoints'>[],
): number | null {
  let sum = 0
  let weights = 0
  for (const { weight, halfPoints } of criteria) {
    if (halfPoints === null) continue
    sum += weight * halfPoints
    weights += weight
  }
  return weights === 0 ? null : sum / weights / 2
}

/** Parts of the whole that are scored, and the whole. */
export function partsScored(criteria: readonly Pick<SheetCriterion, 'weight' | 'halfPoints'>[]) {
  return {
    scored: criteria.reduce((sum, { weight, halfPoints }) => sum + (halfPoints === null ? 0 : weight), 0),
    all: criteria.reduce((sum, { weight }) => sum + weight, 0),
  }
}

/** What is missing before a review can be finished: a message for each field, in the order of the sheet. */
export function reviewGaps(
  criteria: readonly Pick<SheetCriterion, 'id' | 'title' | 'halfPoints'>[],
  toInvestigators: string,
): Record<string, string> {
  const gaps: Record<string, string> = {}
  for (const { id, title, halfPoints } of criteria)
    if (halfPoints === null) gaps[`score-${id}`] = `${title} is not scored yet.`
  const length = [...toInvestigators.trim()].length
  if (length < shortestText)
    gaps.investigators =
      length === 0
        ? 'Write what the investigators should read: it is what they learn from.'
        : `Write at least ${shortestText} characters to the investigators; there are ${length}.`
  return gaps
}

export function reviewState(finishedAt: Date | null, anyScore: boolean): ReviewState {
  if (finishedAt) return 'finished'
  return anyScore ? 'begun' : 'to-read'
}

/** Why a sheet cannot be written on now; null when it can. A late review is taken until the panel meets. */
export function whySheetIsShut(
  call: Pick<Call, 'stage' | 'opensAt' | 'closesAt' | 'panelMeetsAt'>,
  finishedAt: Date | null,
  now: Date,
): string | null {
  const phase = callPhase(call, now)
  if (phase === 'planned' || phase === 'open') return 'Reviews begin once the call has closed.'
  if (phase !== 'closed' && phase !== 'review') return 'The panel has met: reviews of this call are settled.'
  if (now >= call.panelMeetsAt) return 'The panel is meeting: reviews of this call are settled.'
  return finishedAt ? 'This review is finished. Open it again to change it.' : null
}

/** A finished review may be opened again until reviews are due. */
export function whyNotReopened(
  call: Pick<Call, 'stage' | 'opensAt' | 'closesAt' | 'panelMeetsAt' | 'reviewsDueAt'>,
  finishedAt: Date | null,
  now: Date,
): string | null {
  if (!finishedAt) return 'This review is open already.'
  if (now >= call.reviewsDueAt) return 'Reviews were due: a finished one stays as it is.'
  return whySheetIsShut(call, null, now)
}
