import { ApiError, missing } from './ApiError'
import type { Api } from './api'
import { findSession } from './checkout'
import { disputeCharge, disputeDeeds } from './disputes'
import type { Charge } from './objects'
import { createRefund, finishRefund } from './refunds'

/** What may happen to a payment once it is made, without the application asking for it. */
export function afterwards(api: Api, sessionId: string, deed: string, amount?: number): void {
  const charge = chargeOf(api, sessionId)
  const disputeDeed = disputeDeeds.find((known) => known === deed)
  if (disputeDeed) {
    api.announce(disputeCharge(api.store, charge, disputeDeed), null)
    return
  }
  if (deed !== 'refund')
    throw new ApiError(400, 'invalid_request_error', 'deed is one of open, won, lost, refund.')
  const form = {
    payment_intent: charge.payment_intent,
    ...(amount === undefined ? {} : { amount: String(amount) }),
  }
  api.announce(createRefund(api.store, form).happenings, null)
}

/** Ends refunds that are under way, as the banks would by and by. */
export function finishRefunds(api: Api, status: 'succeeded' | 'failed'): number {
  const waiting = Object.values(api.store.state.refunds).filter((refund) => refund.status === 'pending')
  for (const refund of waiting) api.announce(finishRefund(api.store, refund, status), null)
  return waiting.length
}

function chargeOf(api: Api, sessionId: string): Charge {
  const { intentId } = findSession(api.store, sessionId)
  const intent = intentId === null ? undefined : api.store.state.intents[intentId]
  const charge = intent?.latest_charge ? api.store.state.charges[intent.latest_charge] : undefined
  if (!charge?.paid) throw missing('charge', sessionId)
  return charge
}
