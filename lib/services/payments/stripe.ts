import Stripe from 'stripe'
import { refuse } from '@/lib/errors'
import { step } from '../step'
import type { Payments } from './Payments'
import { stripeNotice } from './stripeNotice'
import { checkoutState, disputeState, listedPayment, refundKeyName, refundState } from './stripeStates'

export interface StripeSettings {
  secretKey: string
  webhookSecret: string
  /** Address of the local mock; null speaks to the real service. */
  apiBase: string | null
}

/** Payments by Stripe Checkout; test and live differ by keys alone. */
export function stripePayments(settings: StripeSettings): Payments {
  const base = settings.apiBase ? new URL(settings.apiBase) : null
  const stripe = new Stripe(settings.secretKey, {
    timeout: 10_000,
    maxNetworkRetries: 2,
    telemetry: false,
    ...(base ? { host: base.hostname, port: Number(base.port), protocol: 'http' as const } : {}),
  })

  const reach = async <T>(name: `payments:${string}`, call: () => Promise<T>): Promise<T> => {
    try {
      return await step(name, call)
    } catch (error) {
      if (error instanceof Stripe.errors.StripeInvalidRequestError) throw refuse.integrity(error.message)
      throw refuse.unavailable('payment firm', error)
    }
  }

  return {
    isTestMode: !settings.secretKey.startsWith('sk_live_'),
    createCheckout: (request) =>
      reach('payments:create-checkout', async () => {
        const session = await stripe.checkout.sessions.create(
          {
            mode: 'payment',
            client_reference_id: request.reference,
            customer_email: request.email,
            line_items: [
              {
                quantity: 1,
                price_data: {
                  currency: request.currency.toLowerCase(),
                  unit_amount: request.amountMinor,
                  product_data: { name: request.description },
                },
              },
            ],
            metadata: { reference: request.reference },
            payment_intent_data: { metadata: { reference: request.reference } },
            success_url: request.successUrl,
            cancel_url: request.cancelUrl,
            expires_at: Math.floor(request.expiresAt.getTime() / 1000),
          },
          { idempotencyKey: request.idempotencyKey },
        )
        return checkoutState(session)
      }),
    readCheckout: (sessionId) =>
      reach('payments:read-checkout', async () =>
        checkoutState(
          await stripe.checkout.sessions.retrieve(sessionId, {
            expand: ['payment_intent.latest_charge.balance_transaction'],
          }),
        ),
      ),
    refund: ({ idempotencyKey, paymentId, amountMinor }) =>
      reach('payments:refund', async () => {
        const refund = await stripe.refunds.create(
          {
            payment_intent: paymentId,
            amount: amountMinor,
            metadata: { [refundKeyName]: idempotencyKey },
          },
          { idempotencyKey },
        )
        return refundState(refund)
      }),
    readRefunds: (paymentId) =>
      reach('payments:read-refunds', async () => {
        const { data } = await stripe.refunds.list({ payment_intent: paymentId, limit: 100 })
        return data.map(refundState)
      }),
    readDisputes: (paymentId) =>
      reach('payments:read-disputes', async () => {
        const { data } = await stripe.disputes.list({ payment_intent: paymentId, limit: 100 })
        return data.map(disputeState).filter((dispute) => dispute !== null)
      }),
    listPayments: (since) =>
      reach('payments:list', async () => {
        const created = { gte: Math.floor(since.getTime() / 1000) }
        const charges = await stripe.charges
          .list({ created, limit: 100 })
          .autoPagingToArray({ limit: 10_000 })
        return charges.map(listedPayment).filter((payment) => payment !== null)
      }),
    readNotice: (body, signature, now) => stripeNotice(stripe, settings.webhookSecret, body, signature, now),
    isUp: async () => {
      try {
        await step('payments:ping', () => stripe.events.list({ limit: 1 }))
        return true
      } catch {
        return false
      }
    },
  }
}
