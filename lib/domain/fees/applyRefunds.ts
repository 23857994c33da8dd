import { lockFee, updateFee } from '@/db/queries/fees'
import { findRefundOf, lockRefund, noteRefundNumber, refundsOfFee } from '@/db/queries/refunds'
import type { PaymentsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { RefundState } from '@/lib/services/payments/Payments'
import type { Context } from '../context'
import { closeRefundWith } from './closeRefundWith'
import { decideRefund } from './decideRefund'
import { isGivenBackWhole } from './isGivenBackWhole'
import { isSurplusPayment } from './isSurplusPayment'

/** Brings our refunds of a payment to what the firm says of them; one made by hand there is taken into the books. */
export async function applyRefunds(
  tx: Context,
  payment: PaymentsRow,
  states: readonly RefundState[],
): Promise<string[]> {
  const effects: string[] = []
  for (const state of states) {
    const found = await findRefundOf(tx.db, state)
    if (!found && state.status === 'failed') continue
    const id = found?.id ?? (await takeIn(tx, payment, state))
    const row = await lockRefund(tx.db, id)
    if (row?.state !== 'created') continue
    if (state.status === 'pending') await noteRefundNumber(tx.db, id, state.refundId)
    else
      await closeRefundWith(tx, row, {
        state: state.status,
        providerRefundId: state.refundId,
        failure: state.failure ?? '',
        actingAs: 'payment firm',
      })
    effects.push(found ? `refund ${state.status}` : `refund made at the firm taken in, ${state.status}`)
  }
  return effects
}

/** A refund nobody decided here: the office made it on the firm's own pages. */
async function takeIn(tx: Context, payment: PaymentsRow, state: RefundState): Promise<number> {
  const fee = await lockFee(tx.db, payment.fee_id)
  if (!fee) throw refuse.integrity('The fee of this refund is missing.')
  const id = await decideRefund(tx, fee, {
    of: { paymentId: payment.id },
    amountMinor: state.amountMinor,
    isSurplus: await isSurplusPayment(tx, payment.id),
    reason: 'made on the pages of the payment firm',
    providerRefundId: state.refundId,
  })
  if (fee.state === 'paid' && isGivenBackWhole(fee, await refundsOfFee(tx.db, fee.id)))
    await updateFee(tx.db, fee, 'refunded')
  return id
}
