import { lockPayment, updatePayment } from '@/db/queries/payments'
import { paths } from '@/lib/paths'
import type { CheckoutState } from '@/lib/services/payments/Payments'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { applyFirmState } from './applyFirmState'
import { justCheckout } from './readFirmState'
import { beginPayment, type BegunPayment } from './beginPayment'
import { checkoutEndsAt } from './rules'

/**
 * Opens the payment firm's page for the fee of a proposal. The attempt is written down before the firm is asked,
 * so that an answer that is lost is asked for again by the same key; an open page is used again.
 */
export async function startPayment(
  ctx: ActingContext,
  input: { reference: string },
): Promise<{ url: string }> {
  const sentUrl = `${ctx.request.origin}${paths.proposalSent(input.reference)}`
  for (let round = 1; round <= 2; round += 1) {
    const begun = await inTransaction(ctx, (tx) => beginPayment(tx, input.reference))
    const { provider_session_id: sessionId } = begun.payment
    const checkout = sessionId
      ? await ctx.payments.readCheckout(sessionId)
      : await createCheckout(ctx, input.reference, begun)
    if (checkout.status === 'open' && checkout.url) return { url: checkout.url }
    await applyFirmState(ctx, begun.payment.id, justCheckout(checkout))
    if (checkout.status === 'complete') break
  }
  return { url: sentUrl }
}

async function createCheckout(
  ctx: ActingContext,
  reference: string,
  { payment, email, callNumber }: BegunPayment,
): Promise<CheckoutState> {
  const { origin } = ctx.request
  const checkout = await ctx.payments.createCheckout({
    idempotencyKey: payment.idempotency_key,
    amountMinor: payment.amount_minor,
    currency: payment.currency,
    description: `Fee of proposal ${reference}, call ${callNumber}`,
    email,
    reference: payment.idempotency_key,
    successUrl: `${origin}${paths.proposalPaid(reference)}`,
    cancelUrl: `${origin}${paths.proposalSent(reference)}`,
    expiresAt: checkoutEndsAt(payment.created_at),
  })
  await inTransaction(ctx, async (tx) => {
    const row = await lockPayment(tx.db, payment.id)
    if (row?.state !== 'created') return
    await updatePayment(tx.db, row.id, {
      state: 'open',
      provider_session_id: checkout.sessionId,
      checkout_url: checkout.url,
    })
  })
  return checkout
}
