import type { PaymentStore } from './store'
import { makeCharge, makeIntent } from './attempts'
import { createSession } from './checkout'

/** A payment that was made before this mock was started: the demonstration's earlier calls. */
export interface PastPayment {
  sessionId: string
  paymentId: string
  reference: string
  description: string
  email: string
  amountMinor: number
  currency: string
  /** Unix seconds. */
  created: number
  successUrl: string
}

/** Takes past payments into the books, without any event; those known already are left. */
export function takePast(store: PaymentStore, payments: readonly PastPayment[], pageBase: string): number {
  const fresh = payments.filter(({ sessionId }) => !store.state.sessions[sessionId])
  for (const past of fresh) takeOne(store, past, pageBase)
  store.changed()
  return fresh.length
}

function takeOne(store: PaymentStore, past: PastPayment, pageBase: string): void {
  const form = {
    mode: 'payment',
    client_reference_id: past.reference,
    customer_email: past.email,
    success_url: past.successUrl,
    metadata: { reference: past.reference },
    payment_intent_data: { metadata: { reference: past.reference } },
    line_items: [
      {
        quantity: '1',
        price_data: {
          currency: past.currency.toLowerCase(),
          unit_amount: String(past.amountMinor),
          product_data: { name: past.description },
        },
      },
    ],
  }
  const made = createSession(store, form, pageBase)
  const stored = store.state.sessions[made.id]
  if (!stored) return
  delete store.state.sessions[made.id]
  const { session } = stored
  Object.assign(session, {
    id: past.sessionId,
    created: past.created,
    expires_at: past.created + 3600,
    status: 'complete',
    payment_status: 'paid',
    payment_intent: past.paymentId,
    url: null,
  })
  stored.intentId = past.paymentId
  store.state.sessions[past.sessionId] = stored
  const intent = makeIntent(store, stored, past.paymentId)
  const charge = makeCharge(store, intent, 'pm_past', null)
  Object.assign(charge, { created: past.created })
  Object.assign(intent, {
    created: past.created,
    status: 'succeeded',
    amount_received: intent.amount,
    latest_charge: charge.id,
    payment_method: 'pm_past',
  })
}
