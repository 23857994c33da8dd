import { markSubmitted, takenReviewNumbers } from '@/db/queries/submission'
import type { ProposalsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { isDuplicate } from '../isDuplicate'
import type { ProposalContents } from '../proposals/types'
import { drawReviewNumber } from './reviewNumber'

const draws = 20

/**
 * Marks the proposal as sent under its review number, which it keeps when it is sent again. The UPDATE itself
 * asks once more for state, version and deadline against the stamp of arrival.
 */
export async function markSent(
  tx: Context,
  row: ProposalsRow,
  contents: ProposalContents,
  arrivedAt: Date,
): Promise<string> {
  const taken = contents.reviewNumber ? [] : await takenReviewNumbers(tx.db, contents.call.id)
  for (let draw = 1; draw <= draws; draw += 1) {
    const reviewNumber = contents.reviewNumber ?? drawReviewNumber(contents.call.number, taken, tx.random)
    if (!reviewNumber)
      throw refuse.integrity('This call has no review number left. The office has to be told.')
    try {
      const sent = { reviewNumber, panelId: contents.kind.panelId, arrivedAt }
      if (await markSubmitted(tx.db, row, sent)) return reviewNumber
      throw refuse.closed('The deadline passed before this reached us. Nothing was sent.')
    } catch (error) {
      // Another proposal of the call drew the same digits a moment ago and is not visible from here.
      if (!isDuplicate(error)) throw error
      taken.push(reviewNumber)
    }
  }
  throw refuse.unavailable('database')
}
