import { insertPaymentEvent, isKnownEvent, lockPayment, updatePayment } from '@/db/queries/payments'
import type { PaymentsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { PaymentNotice } from '@/lib/services/payments/Payments'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { isDuplicate } from '../isDuplicate'
import { applyDisputes } from './applyDisputes'
import { applyRefunds } from './applyRefunds'
import type { FirmState } from './readFirmState'
import { recordFirmFee } from './recordFirmFee'
import { settlePayment } from './settlePayment'

export const knownBefore = 'known before'

/**
 * Brings a payment to the state it is in at the firm, whoever asked: the notice, the returning person or the job. A
 * notice is stored in the transaction of its effect, once.
 */
export async function applyFirmState(
  ctx: Context,
  paymentId: number,
  state: FirmState,
  notice: PaymentNotice | null = null,
): Promise<string> {
  try {
    return await inTransaction(ctx, async (tx) => {
      if (notice && (await isKnownEvent(tx.db, notice.id))) return knownBefore
      const payment = await lockPayment(tx.db, paymentId)
      if (!payment) throw refuse.notFound('payment')
      const effect = await bringToState(tx, payment, state, notice?.failure ?? null)
      if (notice)
        await insertPaymentEvent(tx.db, {
          providerEventId: notice.id,
          eventType: notice.type,
          paymentId,
          payload: notice.body,
          effect: effect.slice(0, 120),
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
  { checkout, refunds, disputes }: FirmState,
  failure: string | null,
): Promise<string> {
  if (!checkout.isPaid) return bringUnpaid(tx, payment, checkout.status, failure)
  if (checkout.amountMinor !== payment.amount_minor || checkout.currency !== payment.currency)
    return 'nothing: the amount differs from the fee'
  const effects: string[] = []
  if (payment.state !== 'succeeded') effects.push(await settlePayment(tx, payment, checkout))
  if (await recordFirmFee(tx, payment, checkout)) effects.push('noted what the firm keeps')
  effects.push(...(await applyRefunds(tx, payment, refunds)))
  effects.push(...(await applyDisputes(tx, payment, disputes)))
  return effects.join('; ') || 'nothing: it was settled before'
}

async function bringUnpaid(
  tx: Context,
  payment: PaymentsRow,
  status: 'open' | 'complete' | 'expired',
  failure: string | null,
): Promise<string> {
  if (payment.state === 'succeeded') return 'nothing: it was settled before'
  if (status === 'expired') {
    await updatePayment(tx.db, payment.id, { state: 'expired' })
    return 'the page has expired'
  }
  if (failure) {
    await updatePayment(tx.db, payment.id, { failure: failure.slice(0, 200) })
    return 'noted why the card was refused'
  }
  return 'nothing: it is still open'
}
