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
  /** What the firm keeps of it, in the same currency; null while that is not known. */
  firmFeeMinor: number | null
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
  /** The key it was asked for with; null when it was made by hand at the firm. */
  key: string | null
  amountMinor: number
  status: 'succeeded' | 'pending' | 'failed'
  failure: string | null
}

/** A card holder asks the bank for the money back; the firm holds the amount until the bank has decided. */
export interface DisputeState {
  disputeId: string
  amountMinor: number
  reason: string
  status: 'open' | 'won' | 'lost'
  /** What the firm asks for handling it; null where it says nothing. */
  firmFeeMinor: number | null
}

/** One payment in the firm's own list, to hold our books against. */
export interface ListedPayment {
  paymentId: string
  reference: string | null
  amountMinor: number
  currency: string
  refundedMinor: number
  isDisputed: boolean
  createdAt: Date
}

export interface Payments {
  createCheckout(request: CheckoutRequest): Promise<CheckoutState>
  readCheckout(sessionId: string): Promise<CheckoutState>
  refund(request: { idempotencyKey: string; paymentId: string; amountMinor: number }): Promise<RefundState>
  readRefunds(paymentId: string): Promise<RefundState[]>
  readDisputes(paymentId: string): Promise<DisputeState[]>
  /** Every payment that succeeded since a moment, the newest first. */
  listPayments(since: Date): Promise<ListedPayment[]>
  /** Throws a Refusal 'invalid' when the signature, the date or the version is wrong. */
  readNotice(body: string, signature: string, now: Date): PaymentNotice
  isUp(): Promise<boolean>
  /** No money moves: shown on every page that speaks of it. */
  readonly isTestMode: boolean
}
