import type { PastPayment as Made } from '../../../db/seeds/story/pastPayments.ts'
import type { PastPayment } from './past.ts'

/** Tells a running mock of payments that were made before it was started. */
export async function recordPast(mockUrl: string, payments: readonly Made[]): Promise<void> {
  const response = await fetch(new URL('/mock/past', mockUrl), {
    method: 'POST',
    body: JSON.stringify({ payments: payments.map(pastOf) }),
  })
  if (!response.ok) throw new Error(`the payment mock did not take the past in: ${response.status}`)
}

const pastOf = ({ request, paid, refunds, disputes }: Made): PastPayment => ({
  sessionId: paid.sessionId,
  paymentId: paid.paymentId ?? '',
  reference: request.reference,
  description: request.description,
  email: request.email,
  amountMinor: request.amountMinor,
  currency: request.currency,
  created: Math.floor(request.expiresAt.getTime() / 1000) - 23 * 3600,
  successUrl: request.successUrl,
  refunds: refunds.map(({ refundId, key, amountMinor }) => ({ id: refundId, key: key ?? '', amountMinor })),
  dispute: disputes[0] ? { id: disputes[0].disputeId, status: disputes[0].status } : null,
})
