import Stripe from 'stripe'
import { refuse } from '@/lib/errors'
import { step } from '../step'
import type { CheckoutState, PaymentNotice, Payments } from './Payments'

export interface StripeSettings {
  secretKey: string
  webhookSecret: string
  /** Address of the local mock; null speaks to the real service. */
  apiBase: string | null
}

const allowedClockSkewMs = 60_000

function idOf(value: string | { id: string } | null | undefined): string | null {
  if (!value) return null
  return typeof value === 'string' ? value : value.id
}

function checkoutState(session: Stripe.Checkout.Session): CheckoutState {
  const intent = typeof session.payment_intent === 'object' ? session.payment_intent : null
  const charge = intent && typeof intent.latest_charge === 'object' ? intent.latest_charge : null
  return {
    sessionId: session.id,
    url: session.url,
    status: session.status === 'complete' ? 'complete' : session.status === 'expired' ? 'expired' : 'open',
    isPaid: session.payment_status === 'paid',
    amountMinor: session.amount_total ?? 0,
    currency: (session.currency ?? '').toUpperCase(),
    paymentId: idOf(session.payment_intent),
    cardLast4: charge?.payment_method_details?.card?.last4 ?? null,
  }
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
          await stripe.checkout.sessions.retrieve(sessionId, { expand: ['payment_intent.latest_charge'] }),
        ),
      ),
    refund: ({ idempotencyKey, paymentId, amountMinor }) =>
      reach('payments:refund', async () => {
        const refund = await stripe.refunds.create(
          { payment_intent: paymentId, amount: amountMinor },
          { idempotencyKey },
        )
        const status = refund.status === 'succeeded' || refund.status === 'pending' ? refund.status : 'failed'
        return { refundId: refund.id, status }
      }),
    readNotice: (body, signature, now) => readNotice(stripe, settings.webhookSecret, body, signature, now),
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

function readNotice(
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

  const object = event.data.object
  const isSession = object.object === 'checkout.session'
  const isIntent = object.object === 'payment_intent'
  return {
    id: event.id,
    type: event.type,
    apiVersion: event.api_version,
    createdAt: new Date(event.created * 1000),
    sessionId: isSession ? object.id : null,
    paymentId: isSession ? idOf(object.payment_intent) : isIntent ? object.id : null,
    reference: isSession || isIntent ? (object.metadata?.reference ?? null) : null,
    failure: isIntent ? (object.last_payment_error?.message ?? null) : null,
    body,
  }
}
