import type { CheckoutState, Payments } from '../../../lib/services/payments/Payments.ts'

/** A payment firm of the past: whoever opens its page has paid. The demonstration's earlier calls used it. */
export function pastPayments(): Payments {
  const sessions = new Map<string, CheckoutState>()
  let count = 0
  return {
    isTestMode: true,
    isUp: async () => true,
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
      sessions.set(sessionId, {
        ...open,
        status: 'complete',
        isPaid: true,
        url: null,
        paymentId: `pi_past_${count}`,
        cardLast4: '4242',
        firmFeeMinor: Math.round(request.amountMinor * 0.015) + 25,
      })
      return open
    },
    readCheckout: async (sessionId) => {
      const session = sessions.get(sessionId)
      if (!session) throw new Error('no such page')
      return session
    },
    refund: async ({ idempotencyKey, amountMinor }) => ({
      refundId: `re_past_${idempotencyKey}`,
      key: idempotencyKey,
      amountMinor,
      status: 'succeeded',
      failure: null,
    }),
    readRefunds: async () => [],
    readDisputes: async () => [],
    listPayments: async () => [],
    readNotice: () => {
      throw new Error('the past sends no notices')
    },
  }
}
