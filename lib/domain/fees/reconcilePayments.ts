import { unfinishedPayments } from '@/db/queries/payments'
import { Refusal } from '@/lib/errors'
import type { Context } from '../context'
import { applyFirmState } from './applyFirmState'
import { justCheckout } from './readFirmState'
import { carryOutRefunds } from './carryOutRefunds'

const batch = 50

export interface ReconcileReport {
  settled: number
  unanswered: number
  refunded: number
}

/** Asks after every payment that is open, since a notice may never come, and carries out refunds that wait. */
export async function reconcilePayments(ctx: Context): Promise<ReconcileReport> {
  const report: ReconcileReport = { settled: 0, unanswered: 0, refunded: 0 }
  for (const payment of await unfinishedPayments(ctx.db, batch)) {
    if (!payment.provider_session_id) continue
    try {
      const checkout = await ctx.payments.readCheckout(payment.provider_session_id)
      await applyFirmState(ctx, payment.id, justCheckout(checkout))
      if (checkout.isPaid) report.settled += 1
    } catch (error) {
      if (!(error instanceof Refusal)) throw error
      report.unanswered += 1
    }
  }
  report.refunded = (await carryOutRefunds(ctx)).made
  return report
}
