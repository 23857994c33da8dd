import { insertPaymentEvent, isKnownEvent, lockPayment, updatePayment } from '@/db/queries/payments'
import type { PaymentsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { CheckoutState, PaymentNotice } from '@/lib/services/payments/Payments'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { isDuplicate } from '../isDuplicate'
import { settlePayment } from './settlePayment'

export const knownBefore = 'known before'

/**
 * Brings a payment to the state its checkout is in at the firm, whoever asked: the notice, the returning
 * person or the job. A notice is stored in the transaction of its effect, once.
 */
export async function applyCheckout(
  ctx: Context,
  paymentId: number,
  checkout: CheckoutState,
  notice: PaymentNotice | null = null,
): Promise<string> {
  try {
    return await inTransaction(ctx, async (tx) => {
      if (notice && (await isKnownEvent(tx.db, notice.id))) return knownBefore
      const payment = await lockPayment(tx.db, paymentId)
      if (!payment) throw refuse.notFound('payment')
      const effect = await bringToState(tx, payment, checkout, notice?.failure ?? null)
      if (notice)
        await insertPaymentEvent(tx.db, {
          providerEventId: notice.id,
          eventType: notice.type,
          paymentId,
          payload: notice.body,
          effect,
          providerCreatedAt: notice.createdAt,
        })
      return effect
    })
  } catch (error) {
    // The same notice came twice at once: the other one did the work.
    if (notice && isDuplicate(error)) return knownBefore
    throw error
  }
}

async function bringToState(
  tx: Context,
  payment: PaymentsRow,
  checkout: CheckoutState,
  failure: string | null,
): Promise<string> {
  if (payment.state === 'succeeded') return 'nothing: it was settled before'
  if (checkout.isPaid) {
    if (checkout.amountMinor !== payment.amount_minor || checkout.currency !== payment.currency)
      return 'nothing: the amount differs from the fee'
    return settlePayment(tx, payment, checkout)
  }
  if (checkout.status === 'expired') {
    await updatePayment(tx.db, payment.id, { state: 'expired' })
    return 'the page has expired'
  }
  if (failure) {
    await updatePayment(tx.db, payment.id, { failure: failure.slice(0, 200) })
    return 'noted why the card was refused'
  }
  return 'nothing: it is still open'
}
