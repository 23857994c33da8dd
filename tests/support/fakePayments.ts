import { refuse } from '@/lib/errors'
import type { CheckoutState, PaymentNotice, Payments } from '@/lib/services/payments/Payments'
import { step } from '@/lib/services/step'

export interface FakePayments extends Payments {
  /** Sessions by id, in the order they were made. */
  sessions: Map<string, CheckoutState>
  refunds: Map<string, { refundId: string; paymentId: string; amountMinor: number }>
  pay(sessionId: string, cardLast4?: string): void
  expire(sessionId: string): void
}

/** A payment firm in memory: the same key twice is the same session, as the real one promises. */
export function fakePayments(): FakePayments {
  const sessions = new Map<string, CheckoutState>()
  const byKey = new Map<string, string>()
  const refunds: FakePayments['refunds'] = new Map()
  const tag = Math.random().toString(36).slice(2, 10)
  let count = 0

  const reach = async <T>(name: `payments:${string}`, call: () => T): Promise<T> => {
    try {
      return await step(name, async () => call())
    } catch (cause) {
      throw refuse.unavailable('payment firm', cause)
    }
  }
  const find = (sessionId: string): CheckoutState => {
    const session = sessions.get(sessionId)
    if (!session) throw refuse.integrity('No such session.')
    return session
  }

  return {
    isTestMode: true,
    sessions,
    refunds,
    isUp: () => Promise.resolve(true),
    pay: (sessionId, cardLast4 = '4242') => {
      const paid = { status: 'complete' as const, isPaid: true, url: null, cardLast4 }
      sessions.set(sessionId, { ...find(sessionId), ...paid, paymentId: `pi_${sessionId}` })
    },
    expire: (sessionId) => void sessions.set(sessionId, { ...find(sessionId), status: 'expired', url: null }),
    createCheckout: (request) =>
      reach('payments:create-checkout', () => {
        const known = byKey.get(request.idempotencyKey)
        if (known) return find(known)
        const sessionId = `cs_${tag}_${(count += 1)}`
        byKey.set(request.idempotencyKey, sessionId)
        const session: CheckoutState = {
          sessionId,
          url: `http://127.0.0.1:4242/pay/${sessionId}`,
          status: 'open',
          isPaid: false,
          amountMinor: request.amountMinor,
          currency: request.currency,
          paymentId: null,
          cardLast4: null,
        }
        sessions.set(sessionId, session)
        return session
      }),
    readCheckout: (sessionId) => reach('payments:read-checkout', () => find(sessionId)),
    refund: (request) =>
      reach('payments:refund', () => {
        const made = refunds.get(request.idempotencyKey) ?? {
          refundId: `re_${tag}_${(count += 1)}`,
          paymentId: request.paymentId,
          amountMinor: request.amountMinor,
        }
        refunds.set(request.idempotencyKey, made)
        return { refundId: made.refundId, status: 'succeeded' as const }
      }),
    readNotice: (body, signature) => {
      if (signature !== 'good') throw refuse.invalid('The signature of this notice is wrong or too old.')
      return JSON.parse(body, (key, value: unknown) =>
        key === 'createdAt' ? new Date(String(value)) : value,
      ) as PaymentNotice
    },
  }
}
