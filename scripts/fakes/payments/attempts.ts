import type { Charge, Dispute, PaymentError, PaymentIntent, Refund, StoredSession } from './objects'
import { newId, unixNow, type PaymentStore } from './store'

/** What the person at the hosted page may choose to happen. */
export const outcomes = [
  'pays',
  'declined',
  'insufficient-funds',
  'authentication',
  'approve',
  'refuse',
] as const
export type Outcome = (typeof outcomes)[number]

export interface Happening {
  type: string
  object: PaymentIntent | Charge | Refund | Dispute | StoredSession['session']
}

const failures: Record<'declined' | 'insufficient-funds' | 'refuse', PaymentError> = {
  declined: {
    type: 'card_error',
    code: 'card_declined',
    decline_code: 'generic_decline',
    message: 'Your card was declined.',
  },
  'insufficient-funds': {
    type: 'card_error',
    code: 'card_declined',
    decline_code: 'insufficient_funds',
    message: 'Your card has insufficient funds.',
  },
  refuse: {
    type: 'card_error',
    code: 'payment_intent_authentication_failure',
    message: 'We were unable to authenticate your payment method.',
  },
}

/** One attempt to pay an open session: changes the objects and tells which events follow, in order. */
export function attempt(store: PaymentStore, stored: StoredSession, outcome: Outcome): Happening[] {
  const happenings: Happening[] = []
  const intent = intentOf(store, stored, happenings)
  const method = newId('pm')
  if (outcome === 'authentication') {
    intent.status = 'requires_action'
    intent.payment_method = method
    happenings.push({ type: 'payment_intent.requires_action', object: intent })
  } else if (outcome === 'pays' || outcome === 'approve') {
    succeed(store, stored, intent, method, happenings)
  } else {
    fail(store, intent, method, failures[outcome], happenings)
  }
  store.changed()
  return happenings
}

function intentOf(store: PaymentStore, stored: StoredSession, happenings: Happening[]): PaymentIntent {
  const known = stored.intentId === null ? undefined : store.state.intents[stored.intentId]
  if (known) return known
  const intent = makeIntent(store, stored, newId('pi'))
  happenings.push({ type: 'payment_intent.created', object: intent })
  return intent
}

export function makeIntent(store: PaymentStore, stored: StoredSession, id: string): PaymentIntent {
  const { session } = stored
  const intent: PaymentIntent = {
    id,
    object: 'payment_intent',
    amount: session.amount_total,
    amount_capturable: 0,
    amount_received: 0,
    canceled_at: null,
    cancellation_reason: null,
    capture_method: 'automatic_async',
    client_secret: `${id}_secret_mock`,
    confirmation_method: 'automatic',
    created: unixNow(),
    currency: session.currency,
    customer: null,
    description: stored.intentDescription,
    last_payment_error: null,
    latest_charge: null,
    livemode: false,
    metadata: stored.intentMetadata,
    next_action: null,
    payment_method: null,
    payment_method_types: ['card'],
    receipt_email: null,
    status: 'requires_payment_method',
  }
  store.state.intents[id] = intent
  stored.intentId = id
  return intent
}

function succeed(
  store: PaymentStore,
  { session }: StoredSession,
  intent: PaymentIntent,
  method: string,
  happenings: Happening[],
): void {
  const charge = makeCharge(store, intent, method, null)
  Object.assign(intent, {
    status: 'succeeded',
    amount_received: intent.amount,
    latest_charge: charge.id,
    last_payment_error: null,
    payment_method: method,
  })
  Object.assign(session, {
    status: 'complete',
    payment_status: 'paid',
    payment_intent: intent.id,
    url: null,
    customer_details: { email: session.customer_email, name: null, address: null, phone: null },
  })
  happenings.push(
    { type: 'charge.succeeded', object: charge },
    { type: 'payment_intent.succeeded', object: intent },
    { type: 'checkout.session.completed', object: session },
  )
}

/** A refused card leaves the session open: the person may try another. */
function fail(
  store: PaymentStore,
  intent: PaymentIntent,
  method: string,
  error: PaymentError,
  happenings: Happening[],
): void {
  Object.assign(intent, {
    status: 'requires_payment_method',
    last_payment_error: error,
    payment_method: null,
  })
  if (error.code === 'card_declined') {
    const charge = makeCharge(store, intent, method, error)
    intent.latest_charge = charge.id
    happenings.push({ type: 'charge.failed', object: charge })
  }
  happenings.push({ type: 'payment_intent.payment_failed', object: intent })
}

export function makeCharge(
  store: PaymentStore,
  intent: PaymentIntent,
  method: string,
  error: PaymentError | null,
): Charge {
  const paid = error === null
  const charge: Charge = {
    id: newId('ch'),
    object: 'charge',
    amount: intent.amount,
    amount_captured: paid ? intent.amount : 0,
    amount_refunded: 0,
    balance_transaction: paid ? newId('txn') : null,
    captured: paid,
    created: unixNow(),
    currency: intent.currency,
    customer: null,
    disputed: false,
    failure_code: error?.code ?? null,
    failure_message: error?.message ?? null,
    livemode: false,
    metadata: intent.metadata,
    paid,
    payment_intent: intent.id,
    payment_method: method,
    payment_method_details: {
      type: 'card',
      card: { brand: 'visa', last4: '4242', exp_month: 12, exp_year: 2040 },
    },
    receipt_url: null,
    refunded: false,
    status: paid ? 'succeeded' : 'failed',
  }
  store.state.charges[charge.id] = charge
  return charge
}
