import { moveMoney } from '@/db/queries/moneyLedger'
import { insertRefund, refundsOfFee } from '@/db/queries/refunds'
import type { FeesRow } from '@/db/tables'
import type { Context } from '../context'
import { refundKey } from './refundKey'

export interface RefundWish {
  of: { paymentId: number } | { invoiceId: number }
  amountMinor: number
  isSurplus: boolean
  reason: string
  /** Known where it was made by hand at the firm. */
  providerRefundId?: string
}

/**
 * Puts a refund on record, to be carried out once the transaction stands, so that no money moves for a change that
 * was undone. What was a fee becomes money to be given back; surplus is that already. The fee is locked by the caller.
 */
export async function decideRefund(tx: Context, fee: FeesRow, wish: RefundWish): Promise<number> {
  const before = await refundsOfFee(tx.db, fee.id)
  const ofSame = before.filter((refund) =>
    'paymentId' in wish.of
      ? refund.payment_id === wish.of.paymentId
      : refund.invoice_id === wish.of.invoiceId,
  )
  const id = await insertRefund(tx.db, {
    paymentId: 'paymentId' in wish.of ? wish.of.paymentId : null,
    invoiceId: 'invoiceId' in wish.of ? wish.of.invoiceId : null,
    idempotencyKey: refundKey(wish.of, ofSame.length + 1),
    amountMinor: wish.amountMinor,
    isSurplus: wish.isSurplus,
    reason: wish.reason,
    madeBy: tx.actor?.personId ?? null,
    providerRefundId: wish.providerRefundId ?? null,
  })
  if (!wish.isSurplus)
    await moveMoney(tx.db, {
      movement: `refund:${id}`,
      feeId: fee.id,
      from: 'owed-back',
      to: 'refunds',
      amountMinor: wish.amountMinor,
      currency: fee.currency,
    })
  return id
}
