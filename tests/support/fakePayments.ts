import { refuse } from '@/lib/errors'
import type {
  CheckoutState,
  DisputeState,
  PaymentNotice,
  Payments,
  RefundState,
} from '@/lib/services/payments/Payments'
import { step } from '@/lib/services/step'

interface MadeRefund extends RefundState {
  paymentId: string
}

export interface FakePayments extends Payments {
  /** Sessions by id, in the order they were made. */
  sessions: Map<string, CheckoutState>
  /** By the key they were asked for with. */
  refunds: Map<string, MadeRefund>
  /** By payment. */
  disputes: Map<string, DisputeState[]>
  pay(sessionId: string, cardLast4?: string): void
  expire(sessionId: string): void
  /** Somebody gives money back on the firm's own pages. */
  refundByHand(sessionId: string, amountMinor: number): void
  /** Over all that was paid unless told. */
  dispute(sessionId: string, status: DisputeState['status'], amountMinor?: number): void
  /** What the next refunds come to, until told otherwise. */
  refundsTurn: RefundState['status']
}

/** What this firm keeps of a payment. */
export const firmFeeOf = (amountMinor: number): number => Math.round(amountMinor * 0.015) + 25

/** A payment firm in memory: the same key twice is the same session, as the real one promises. */
export function fakePayments(): FakePayments {
  const sessions = new Map<string, CheckoutState>()
  const byKey = new Map<string, string>()
  const references = new Map<string, string>()
  const refunds: FakePayments['refunds'] = new Map()
  const disputes: FakePayments['disputes'] = new Map()
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
  const refundsOf = (paymentId: string) =>
    [...refunds.values()].filter((refund) => refund.paymentId === paymentId)

  const fake: FakePayments = {
    isTestMode: true,
    sessions,
    refunds,
    disputes,
    refundsTurn: 'succeeded',
    isUp: () => Promise.resolve(true),
    pay: (sessionId, cardLast4 = '4242') => {
      const session = find(sessionId)
      const paid = { status: 'complete' as const, isPaid: true, url: null, cardLast4 }
      const firmFeeMinor = firmFeeOf(session.amountMinor)
      sessions.set(sessionId, { ...session, ...paid, firmFeeMinor, paymentId: `pi_${sessionId}` })
    },
    expire: (sessionId) => void sessions.set(sessionId, { ...find(sessionId), status: 'expired', url: null }),
    refundByHand: (sessionId, amountMinor) => {
      const refundId = `re_${tag}_${(count += 1)}`
      const made = { refundId, key: null, amountMinor, status: 'succeeded' as const, failure: null }
      refunds.set(refundId, { ...made, paymentId: find(sessionId).paymentId ?? '' })
    },
    dispute: (sessionId, status, amountMinor) => {
      const session = find(sessionId)
      const paymentId = session.paymentId ?? ''
      const [known] = disputes.get(paymentId) ?? []
      const disputeId = known?.disputeId ?? `dp_${tag}_${(count += 1)}`
      const facts = { reason: 'fraudulent', status, firmFeeMinor: 2000 }
      disputes.set(paymentId, [{ disputeId, amountMinor: amountMinor ?? session.amountMinor, ...facts }])
    },
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
          firmFeeMinor: null,
        }
        sessions.set(sessionId, session)
        references.set(sessionId, request.reference)
        return session
      }),
    readCheckout: (sessionId) => reach('payments:read-checkout', () => find(sessionId)),
    refund: (request) =>
      reach('payments:refund', () => {
        const known = refunds.get(request.idempotencyKey)
        if (known) return known
        const session = [...sessions.values()].find(({ paymentId }) => paymentId === request.paymentId)
        const given = refundsOf(request.paymentId)
          .filter(({ status }) => status !== 'failed')
          .reduce((sum, { amountMinor }) => sum + amountMinor, 0)
        if (given + request.amountMinor > (session?.amountMinor ?? 0))
          throw refuse.integrity('Refund amount is greater than what is left.')
        const made: MadeRefund = {
          refundId: `re_${tag}_${(count += 1)}`,
          key: request.idempotencyKey,
          paymentId: request.paymentId,
          amountMinor: request.amountMinor,
          status: fake.refundsTurn,
          failure: fake.refundsTurn === 'failed' ? 'expired_or_canceled_card' : null,
        }
        refunds.set(request.idempotencyKey, made)
        return made
      }),
    readRefunds: (paymentId) => reach('payments:read-refunds', () => refundsOf(paymentId)),
    readDisputes: (paymentId) => reach('payments:read-disputes', () => disputes.get(paymentId) ?? []),
    listPayments: () =>
      reach('payments:list', () =>
        [...sessions.values()].flatMap((session) =>
          session.isPaid && session.paymentId
            ? [
                {
                  paymentId: session.paymentId,
                  reference: references.get(session.sessionId) ?? null,
                  amountMinor: session.amountMinor,
                  currency: session.currency,
                  refundedMinor: refundsOf(session.paymentId)
                    .filter(({ status }) => status === 'succeeded')
                    .reduce((sum, { amountMinor }) => sum + amountMinor, 0),
                  isDisputed: disputes.has(session.paymentId),
                  createdAt: new Date(),
                },
              ]
            : [],
        ),
      ),
    readNotice: (body, signature) => {
      if (signature !== 'good') throw refuse.invalid('The signature of this notice is wrong or too old.')
      return JSON.parse(body, (key, value: unknown) =>
        key === 'createdAt' ? new Date(String(value)) : value,
      ) as PaymentNotice
    },
  }
  return fake
}
