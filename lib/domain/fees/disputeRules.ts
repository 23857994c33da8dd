import type { DisputesRow, FeesRow, ProposalsRow } from '@/db/tables'

export type DisputeDecision = NonNullable<DisputesRow['decision']>

export interface LostDispute {
  dispute: Pick<DisputesRow, 'amount_minor'>
  fee: Pick<FeesRow, 'state' | 'amount_minor'>
  proposalState: ProposalsRow['state']
  /** The payment settled nothing: it came twice or too late. */
  isSurplus: boolean
}

/** Days a fee that is asked for again has, unless the office says otherwise. */
export const graceDaysOffered = 14

/**
 * What the office may make of a lost dispute. Where all of a fee that was paid is gone, the fee is open again: it is
 * asked for, waived, or dropped with its proposal. Of part of a fee, or of money that settled none, the loss is taken.
 */
export function disputeChoices(lost: LostDispute): DisputeDecision[] {
  const { dispute, fee, proposalState, isSurplus } = lost
  const isWhole = fee.state === 'paid' && !isSurplus && dispute.amount_minor === fee.amount_minor
  if (!isWhole) return ['accept']
  const isRunning = proposalState === 'submitted' || proposalState === 'under-review'
  return isRunning ? ['ask-again', 'waive', 'withdraw'] : ['waive']
}
