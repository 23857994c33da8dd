import type {
  CheckoutRequest,
  CheckoutState,
  DisputeState,
  Payments,
  RefundState,
} from '../../../lib/services/payments/Payments.ts'

/** One payment of the past with what came after it, to be taken into the books of the payment mock. */
export interface PastPayment {
  request: CheckoutRequest
  paid: CheckoutState
  refunds: RefundState[]
  disputes: DisputeState[]
}

export interface PastPayments extends Payments {
  made(): PastPayment[]
  /** The holder of the card asks the bank for the money back, and perhaps the bank decides. */
  dispute(sessionId: string, status: DisputeState['status']): void
}

/** A payment firm of the past: whoever opens its page has paid. The demonstration's earlier calls used it. */
export function pastPayments(): PastPayments {
  const payments = new Map<string, PastPayment>()
  const of = (paymentId: string) =>
    [...payments.values()].find(({ paid }) => paid.paymentId === paymentId) ?? null
  let count = 0
  return {
    isTestMode: true,
    isUp: async () => true,
    made: () => [...payments.values()],
    dispute: (sessionId, status) => {
      const payment = payments.get(sessionId)
      if (!payment) throw new Error('no such payment')
      const disputeId = `du_past_${payment.paid.paymentId}`
      const { amountMinor } = payment.paid
      payment.disputes = [{ disputeId, amountMinor, reason: 'fraudulent', status, firmFeeMinor: 2000 }]
    },
    createCheckout: async (request) => {
      count += 1
      const sessionId = `cs_past_${count}`
      const open: CheckoutState = {
        sessionId,
        url: 'http://127.0.0.1/',
        status: 'open',
        isPaid: false,
        amountMinor: request.amountMinor,
        currency: request.currency,
        paymentId: null,
        cardLast4: null,
        firmFeeMinor: null,
      }
      const paid: CheckoutState = {
        ...open,
        status: 'complete',
        isPaid: true,
        url: null,
        paymentId: `pi_past_${count}`,
        cardLast4: '4242',
        firmFeeMinor: Math.round(request.amountMinor * 0.015) + 25,
      }
      payments.set(sessionId, { request, paid, refunds: [], disputes: [] })
      return open
    },
    readCheckout: async (sessionId) => {
      const payment = payments.get(sessionId)
      if (!payment) throw new Error('no such page')
      return payment.paid
    },
    refund: async ({ idempotencyKey, paymentId, amountMinor }) => {
      const refund: RefundState = {
        refundId: `re_past_${idempotencyKey}`,
        key: idempotencyKey,
        amountMinor,
        status: 'succeeded',
        failure: null,
      }
      of(paymentId)?.refunds.push(refund)
      return refund
    },
    readRefunds: async (paymentId) => of(paymentId)?.refunds ?? [],
    readDisputes: async (paymentId) => of(paymentId)?.disputes ?? [],
    listPayments: async () => [],
    readNotice: () => {
      throw new Error('the past sends no notices')
    },
  }
}
