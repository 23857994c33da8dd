import { moveMoney } from '@/db/queries/fees'
import { closeRefund, findPayment, lockRefund, openRefunds } from '@/db/queries/payments'
import type { RefundsRow } from '@/db/tables'
import { Refusal } from '@/lib/errors'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'

const batch = 20

/**
 * Asks the payment firm for every refund that was decided and not yet made. A firm that does not answer is asked
 * again by the next run, with the same key, so that nobody is paid back twice.
 */
export async function carryOutRefunds(ctx: Context): Promise<{ made: number; waiting: number }> {
  const report = { made: 0, waiting: 0 }
  for (const refund of await openRefunds(ctx.db, batch)) {
    try {
      report[(await carryOut(ctx, refund)) ? 'made' : 'waiting'] += 1
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
      report.waiting += 1
    }
  }
  return report
}

async function carryOut(ctx: Context, refund: RefundsRow): Promise<boolean> {
  const payment = await findPayment(ctx.db, refund.payment_id)
  if (!payment?.provider_payment_id) return false
  const answer = await ctx.payments.refund({
    idempotencyKey: refund.idempotency_key,
    paymentId: payment.provider_payment_id,
    amountMinor: refund.amount_minor,
  })
  if (answer.status === 'pending') return false
  await inTransaction(ctx, async (tx) => {
    const row = await lockRefund(tx.db, refund.id)
    if (row?.state !== 'created') return
    const state = answer.status === 'succeeded' ? 'succeeded' : 'failed'
    await closeRefund(tx.db, row.id, { state, providerRefundId: answer.refundId })
    if (state === 'succeeded')
      await moveMoney(tx.db, {
        movement: `refunded:${row.id}`,
        feeId: payment.fee_id,
        from: 'provider',
        to: 'refunds',
        amountMinor: row.amount_minor,
        currency: payment.currency,
      })
    await writeLogbook(tx, {
      action: 'fee.refund',
      subject: { kind: 'fee', id: payment.fee_id },
      actingAs: 'payment firm',
      after: { state, amountMinor: row.amount_minor, refund: answer.refundId },
    })
  })
  return true
}
