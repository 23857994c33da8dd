import Stripe from 'stripe'
import { PaymentMock } from '@/scripts/fakes/payments/mock'
import { anyFreePorts } from '@/scripts/services/ports'
import { WebhookReceiver, webhookSecret } from './webhookReceiver'

/** The mock, the real SDK pointed at it, and a receiver for its webhooks. */
export interface PaymentMockRig {
  stripe: Stripe
  receiver: WebhookReceiver
  base: string
  createSession: (idempotencyKey?: string, amount?: number) => Promise<Stripe.Checkout.Session>
  /** Presses a button of the hosted page; redirects are not followed. */
  press: (sessionId: string, outcome: string) => Promise<Response>
  control: (path: string, wish?: object) => Promise<Response>
  close: () => Promise<void>
}

export async function startPaymentMockRig(folder: string | null = null): Promise<PaymentMockRig> {
  const [port = 0, receiverPort = 0] = await anyFreePorts(2)
  const stripe = new Stripe('sk_test_for_these_tests', {
    host: '127.0.0.1',
    port,
    protocol: 'http',
    timeout: 2000,
    maxNetworkRetries: 0,
    telemetry: false,
  })
  const receiver = await WebhookReceiver.start(receiverPort, stripe)
  const base = `http://127.0.0.1:${port}`
  const webhook = { url: `http://127.0.0.1:${receiverPort}/`, secret: webhookSecret }
  const mock = await PaymentMock.start({ folder, port, webhook })
  return {
    stripe,
    receiver,
    base,
    createSession: (idempotencyKey, amount = 12_000) =>
      stripe.checkout.sessions.create(sessionParameters(amount), idempotencyKey ? { idempotencyKey } : {}),
    press: (sessionId, outcome) =>
      fetch(`${base}/pay/${sessionId}`, {
        method: 'POST',
        body: new URLSearchParams({ outcome }),
        redirect: 'manual',
      }),
    control: (path, wish = {}) => fetch(`${base}${path}`, { method: 'POST', body: JSON.stringify(wish) }),
    close: async () => {
      await mock.close()
      await receiver.close()
    },
  }
}

function sessionParameters(amount: number): Stripe.Checkout.SessionCreateParams {
  return {
    mode: 'payment',
    line_items: [
      {
        quantity: 1,
        price_data: {
          currency: 'eur',
          unit_amount: amount,
          product_data: { name: 'Fee of proposal 4F7-K2M' },
        },
      },
    ],
    client_reference_id: '17',
    customer_email: 'ines@harrow.example',
    metadata: { proposal: '17' },
    payment_intent_data: { metadata: { proposal: '17' } },
    success_url: 'http://127.0.0.1:3000/back?session={CHECKOUT_SESSION_ID}',
    cancel_url: 'http://127.0.0.1:3000/left',
  }
}
