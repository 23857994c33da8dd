import { randomUUID } from 'node:crypto'
import type { ActingContext, Context } from '@/lib/domain/context'
import { applyNotice } from '@/lib/domain/fees/applyNotice'
import type { PaymentNotice } from '@/lib/services/payments/Payments'

/** A notice of the payment firm about a session, as its fake sends them. */
export function noticeOf(sessionId: string, over: Partial<PaymentNotice> = {}): PaymentNotice {
  return {
    id: `evt_${randomUUID()}`,
    type: 'checkout.session.completed',
    apiVersion: null,
    createdAt: new Date(),
    sessionId,
    paymentId: null,
    reference: null,
    failure: null,
    body: '{}',
    ...over,
  }
}

/** Delivers it with a good signature, to nobody's session: the firm is not signed in. */
export async function deliver(
  ctx: ActingContext,
  notice: PaymentNotice,
  signature = 'good',
): Promise<string> {
  const outside: Context = { ...ctx, actor: null }
  return (await applyNotice(outside, { body: JSON.stringify(notice), signature })).effect
}
