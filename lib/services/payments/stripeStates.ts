import type Stripe from 'stripe'
import type { CheckoutState, DisputeState, ListedPayment, RefundState } from './Payments'

/** Ours travels along as metadata, so that a refund is known again whoever tells of it. */
export const refundKeyName = 'refund_key'

export function idOf(value: string | { id: string } | null | undefined): string | null {
  if (!value) return null
  return typeof value === 'string' ? value : value.id
}

/** What the firm keeps of a charge; null while unknown, or when it is reckoned in another currency. */
function firmFee(charge: Stripe.Charge | null): number | null {
  const line = charge && typeof charge.balance_transaction === 'object' ? charge.balance_transaction : null
  return line && line.currency === charge?.currency ? line.fee : null
}

export function checkoutState(session: Stripe.Checkout.Session): CheckoutState {
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
    firmFeeMinor: session.payment_status === 'paid' ? firmFee(charge) : null,
  }
}

export function refundState(refund: Stripe.Refund): RefundState {
  const { status } = refund
  return {
    refundId: refund.id,
    key: refund.metadata?.[refundKeyName] ?? null,
    amountMinor: refund.amount,
    status:
      status === 'succeeded'
        ? 'succeeded'
        : status === 'pending' || status === 'requires_action'
          ? 'pending'
          : 'failed',
    failure: refund.failure_reason ?? null,
  }
}

/** Null for an inquiry: nothing is held until it becomes a dispute. */
export function disputeState(dispute: Stripe.Dispute): DisputeState | null {
  const statuses: Partial<Record<Stripe.Dispute.Status, DisputeState['status']>> = {
    needs_response: 'open',
    under_review: 'open',
    won: 'won',
    lost: 'lost',
  }
  const status = statuses[dispute.status]
  if (!status) return null
  const lines = dispute.balance_transactions.filter(({ currency }) => currency === dispute.currency)
  return {
    disputeId: dispute.id,
    amountMinor: dispute.amount,
    reason: dispute.reason,
    status,
    firmFeeMinor: lines.length > 0 ? lines.reduce((sum, { fee }) => sum + fee, 0) : null,
  }
}

/** Null for a charge that did not succeed. */
export function listedPayment(charge: Stripe.Charge): ListedPayment | null {
  const paymentId = idOf(charge.payment_intent)
  if (!charge.paid || !paymentId) return null
  return {
    paymentId,
    reference: charge.metadata.reference ?? null,
    amountMinor: charge.amount_captured,
    currency: charge.currency.toUpperCase(),
    refundedMinor: charge.amount_refunded,
    isDisputed: charge.disputed,
    createdAt: new Date(charge.created * 1000),
  }
}
