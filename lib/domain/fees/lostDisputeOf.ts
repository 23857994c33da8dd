import type { DisputesRow, FeesRow, ProposalsRow } from '@/db/tables'
import type { Context } from '../context'
import { disputeChoices, type DisputeDecision } from './disputeRules'
import { isSurplusPayment } from './isSurplusPayment'

/** The lost dispute of a fee that nobody has decided on, with what may be made of it. */
export async function lostDisputeOf(
  ctx: Context,
  of: { disputes: readonly DisputesRow[]; fee: FeesRow; proposalState: ProposalsRow['state'] },
): Promise<{ disputeId: number; amountMinor: number; choices: DisputeDecision[] } | null> {
  const dispute = of.disputes.find(({ state, decision }) => state === 'lost' && decision === null)
  if (!dispute) return null
  const isSurplus = await isSurplusPayment(ctx, dispute.payment_id)
  return {
    disputeId: dispute.id,
    amountMinor: dispute.amount_minor,
    choices: disputeChoices({ ...of, dispute, isSurplus }),
  }
}
