import { findPayment } from '@/db/queries/payments'
import { lockRefund, noteRefundNumber, openRefunds } from '@/db/queries/refunds'
import type { RefundsRow } from '@/db/tables'
import { Refusal } from '@/lib/errors'
import type { RefundState } from '@/lib/services/payments/Payments'
import type { Context } from '../context'
import { inTransaction } from '../inTransaction'
import { closeRefundWith } from './closeRefundWith'

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
  const payment = refund.payment_id === null ? null : await findPayment(ctx.db, refund.payment_id)
  if (!payment?.provider_payment_id) return false
  const answer = await ask(ctx, refund, payment.provider_payment_id)
  if (!answer) return false
  return inTransaction(ctx, async (tx) => {
    const row = await lockRefund(tx.db, refund.id)
    // A notice may have told of it meanwhile.
    if (row?.state !== 'created') return true
    if (answer.status === 'pending') {
      await noteRefundNumber(tx.db, row.id, answer.refundId)
      return false
    }
    await closeRefundWith(tx, row, {
      state: answer.status,
      providerRefundId: answer.refundId,
      failure: answer.failure ?? '',
      actingAs: 'payment firm',
    })
    return true
  })
}

/** A refund under way is looked up: asked for again by its key, the firm would repeat its first answer. */
async function ask(ctx: Context, refund: RefundsRow, paymentId: string): Promise<RefundState | null> {
  if (!refund.provider_refund_id)
    return ctx.payments.refund({
      idempotencyKey: refund.idempotency_key,
      paymentId,
      amountMinor: refund.amount_minor,
    })
  const made = await ctx.payments.readRefunds(paymentId)
  return made.find(({ refundId }) => refundId === refund.provider_refund_id) ?? null
}
