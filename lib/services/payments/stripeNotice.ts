import Stripe from 'stripe'
import { refuse } from '@/lib/errors'
import type { PaymentNotice } from './Payments'
import { idOf } from './stripeStates'

const allowedClockSkewMs = 60_000

/** Reads a signed notice; refuses one whose signature, date or version is wrong. */
export function stripeNotice(
  stripe: Stripe,
  webhookSecret: string,
  body: string,
  signature: string,
  now: Date,
): PaymentNotice {
  let event: Stripe.Event
  try {
    event = stripe.webhooks.constructEvent(body, signature, webhookSecret)
  } catch (cause) {
    throw refuse.invalid('The signature of this notice is wrong or too old.', {
      signature: cause instanceof Error ? cause.message : 'unreadable',
    })
  }
  const signedAt = Number(/(?:^|,)t=(\d+)/.exec(signature)?.[1] ?? 0) * 1000
  // The SDK refuses old signatures but accepts one dated in the future.
  if (signedAt > now.getTime() + allowedClockSkewMs)
    throw refuse.invalid('This notice is dated in the future.', { signature: 'dated in the future' })
  if (event.api_version !== Stripe.API_VERSION)
    throw refuse.invalid(`This notice speaks another version of the interface (${event.api_version}).`)
  return {
    id: event.id,
    type: event.type,
    apiVersion: event.api_version,
    createdAt: new Date(event.created * 1000),
    ...subjectOf(event.data.object),
    body,
  }
}

/** Which payment a notice speaks of, and why its card was refused. */
function subjectOf(
  object: Stripe.Event['data']['object'],
): Pick<PaymentNotice, 'sessionId' | 'paymentId' | 'reference' | 'failure'> {
  const nothing = { sessionId: null, paymentId: null, reference: null, failure: null }
  switch (object.object) {
    case 'checkout.session':
      return {
        ...nothing,
        sessionId: object.id,
        paymentId: idOf(object.payment_intent),
        reference: object.metadata?.reference ?? null,
      }
    case 'payment_intent':
      return {
        ...nothing,
        paymentId: object.id,
        reference: object.metadata.reference ?? null,
        failure: object.last_payment_error?.message ?? null,
      }
    case 'charge':
      return {
        ...nothing,
        paymentId: idOf(object.payment_intent),
        reference: object.metadata.reference ?? null,
      }
    case 'refund':
    case 'dispute':
      return { ...nothing, paymentId: idOf(object.payment_intent) }
    default:
      return nothing
  }
}
