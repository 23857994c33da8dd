import { databaseNow } from '@/db/queries/clock'
import { findPaymentOf, insertPaymentEvent, isKnownEvent } from '@/db/queries/payments'
import type { Context } from '../context'
import { isDuplicate } from '../isDuplicate'
import { applyFirmState, knownBefore } from './applyFirmState'
import { justCheckout, readFirmState } from './readFirmState'

/** Notices of what comes after a payment; for the others the checkout alone is asked for. */
const comesAfter = /^(charge\.(refund|dispute)|refund\.)/

/**
 * Applies a signed notice of the payment firm. Notices repeat and overtake each other, so what counts is the
 * present state of the payment, asked for here. One that speaks of no payment of ours is kept and left alone.
 */
export async function applyNotice(
  ctx: Context,
  input: { body: string; signature: string },
): Promise<{ effect: string }> {
  const now = await databaseNow(ctx.db)
  const notice = ctx.payments.readNotice(input.body, input.signature, now)
  if (await isKnownEvent(ctx.db, notice.id)) return { effect: knownBefore }

  const payment = await findPaymentOf(ctx.db, notice)
  const sessionId = payment?.provider_session_id ?? notice.sessionId
  if (payment && sessionId) {
    const state = comesAfter.test(notice.type)
      ? await readFirmState(ctx.payments, sessionId)
      : justCheckout(await ctx.payments.readCheckout(sessionId))
    return { effect: await applyFirmState(ctx, payment.id, state, notice) }
  }
  const effect = payment ? 'nothing: its page is not known yet' : 'nothing: it speaks of no payment of ours'
  try {
    await insertPaymentEvent(ctx.db, {
      providerEventId: notice.id,
      eventType: notice.type,
      paymentId: payment?.id ?? null,
      payload: notice.body,
      effect,
      providerCreatedAt: notice.createdAt,
    })
  } catch (error) {
    if (isDuplicate(error)) return { effect: knownBefore }
    throw error
  }
  return { effect }
}
