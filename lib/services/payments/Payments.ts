/** What the product needs of a payment firm; amounts in minor units. */
export interface CheckoutRequest {
  idempotencyKey: string
  amountMinor: number
  currency: string
  description: string
  email: string
  /** Comes back with every notice, so that a payment is found whatever else was lost. */
  reference: string
  successUrl: string
  cancelUrl: string
  expiresAt: Date
}

export interface CheckoutState {
  sessionId: string
  url: string | null
  status: 'open' | 'complete' | 'expired'
  isPaid: boolean
  amountMinor: number
  currency: string
  paymentId: string | null
  cardLast4: string | null
}

/** A signed notice; `object` is the provider's own object, read only by the verb that applies it. */
export interface PaymentNotice {
  id: string
  type: string
  apiVersion: string | null
  createdAt: Date
  sessionId: string | null
  paymentId: string | null
  /** What was sent along as `reference` when the checkout was made. */
  reference: string | null
  failure: string | null
  body: string
}

export interface RefundState {
  refundId: string
  status: 'succeeded' | 'pending' | 'failed'
}

export interface Payments {
  createCheckout(request: CheckoutRequest): Promise<CheckoutState>
  readCheckout(sessionId: string): Promise<CheckoutState>
  refund(request: { idempotencyKey: string; paymentId: string; amountMinor: number }): Promise<RefundState>
  /** Throws a Refusal 'invalid' when the signature, the date or the version is wrong. */
  readNotice(body: string, signature: string, now: Date): PaymentNotice
  isUp(): Promise<boolean>
  /** No money moves: shown on every page that speaks of it. */
  readonly isTestMode: boolean
}
