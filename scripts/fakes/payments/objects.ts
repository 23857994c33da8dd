/** The parts of the payment API's public objects that are used here; names and meanings are the API's. */
export type Metadata = Record<string, string>

export interface LineItem {
  id: string
  object: 'item'
  amount_subtotal: number
  amount_total: number
  amount_discount: number
  amount_tax: number
  currency: string
  description: string
  quantity: number
  price: { id: string; object: 'price'; currency: string; unit_amount: number; type: 'one_time' }
}

export interface CheckoutSession {
  id: string
  object: 'checkout.session'
  amount_subtotal: number
  amount_total: number
  automatic_tax: { enabled: false; liability: null; provider: null; status: null }
  cancel_url: string | null
  client_reference_id: string | null
  created: number
  currency: string
  custom_fields: never[]
  customer: null
  customer_creation: 'if_required'
  customer_details: { email: string | null; name: string | null; address: null; phone: null } | null
  customer_email: string | null
  expires_at: number
  invoice: null
  livemode: false
  locale: string | null
  metadata: Metadata
  mode: 'payment'
  payment_intent: string | null
  payment_link: null
  payment_method_types: ['card']
  payment_status: 'unpaid' | 'paid'
  shipping_options: never[]
  status: 'open' | 'complete' | 'expired'
  subscription: null
  success_url: string
  total_details: { amount_discount: 0; amount_shipping: 0; amount_tax: 0 }
  ui_mode: 'hosted_page'
  url: string | null
}

/** A session with what the API does not show: its lines and the intent its first attempt made. */
export interface StoredSession {
  session: CheckoutSession
  lineItems: LineItem[]
  intentId: string | null
  intentMetadata: Metadata
  intentDescription: string | null
}

export interface PaymentError {
  type: 'card_error'
  code: string
  decline_code?: string
  message: string
}

export interface PaymentIntent {
  id: string
  object: 'payment_intent'
  amount: number
  amount_capturable: number
  amount_received: number
  canceled_at: number | null
  cancellation_reason: string | null
  capture_method: 'automatic_async'
  client_secret: string
  confirmation_method: 'automatic'
  created: number
  currency: string
  customer: null
  description: string | null
  last_payment_error: PaymentError | null
  latest_charge: string | null
  livemode: false
  metadata: Metadata
  next_action: null
  payment_method: string | null
  payment_method_types: ['card']
  receipt_email: string | null
  status: 'requires_payment_method' | 'requires_action' | 'succeeded' | 'canceled'
}

export interface Charge {
  id: string
  object: 'charge'
  amount: number
  amount_captured: number
  amount_refunded: number
  balance_transaction: string | null
  captured: boolean
  created: number
  currency: string
  customer: null
  disputed: boolean
  failure_code: string | null
  failure_message: string | null
  livemode: false
  metadata: Metadata
  paid: boolean
  payment_intent: string
  payment_method: string
  payment_method_details: {
    type: 'card'
    card: { brand: 'visa'; last4: string; exp_month: number; exp_year: number }
  }
  receipt_url: null
  refunded: boolean
  status: 'succeeded' | 'failed'
}

export interface Refund {
  id: string
  object: 'refund'
  amount: number
  balance_transaction: string
  charge: string
  created: number
  currency: string
  metadata: Metadata
  payment_intent: string
  reason: string | null
  receipt_number: null
  failure_reason?: string
  status: 'succeeded' | 'pending' | 'failed'
}

export interface Dispute {
  id: string
  object: 'dispute'
  amount: number
  balance_transactions: { id: string; object: 'balance_transaction'; currency: string; fee: number }[]
  charge: string
  created: number
  currency: string
  is_charge_refundable: false
  livemode: false
  metadata: Metadata
  payment_intent: string
  reason: 'fraudulent'
  status: 'needs_response' | 'won' | 'lost'
}

export type ApiObject = CheckoutSession | PaymentIntent | Charge | Refund | Dispute

export interface ApiEvent {
  id: string
  object: 'event'
  api_version: string
  created: number
  data: { object: ApiObject }
  livemode: false
  pending_webhooks: number
  request: { id: string | null; idempotency_key: string | null } | null
  type: string
}
