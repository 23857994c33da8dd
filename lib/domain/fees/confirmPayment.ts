import { feeOf } from '@/db/queries/fees'
import { paymentsOf } from '@/db/queries/payments'
import { authorize } from '@/lib/auth/authorize'
import { Refusal } from '@/lib/errors'
import type { ActingContext } from '../context'
import { readContents } from '../proposals/readContents'
import { applyFirmState } from './applyFirmState'
import { justCheckout } from './readFirmState'
import { mayPayFee } from './policy'

/**
 * Asks the payment firm how the open payments of a proposal stand: for the person who comes back from its page
 * before, or without, its notice. A firm that does not answer changes nothing; the job asks again.
 */
export async function confirmPayment(ctx: ActingContext, input: { reference: string }): Promise<void> {
  const contents = await readContents(ctx.db, input.reference)
  authorize(mayPayFee(ctx.actor, contents))
  const fee = await feeOf(ctx.db, contents.id)
  if (!fee) return
  for (const payment of await paymentsOf(ctx.db, fee.id)) {
    if (payment.state !== 'open' || !payment.provider_session_id) continue
    try {
      const checkout = await ctx.payments.readCheckout(payment.provider_session_id)
      await applyFirmState(ctx, payment.id, justCheckout(checkout))
    } catch (error) {
      if (!(error instanceof Refusal && error.kind === 'unavailable')) throw error
    }
  }
}
