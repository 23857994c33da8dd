import type { CheckoutState, DisputeState, Payments, RefundState } from '@/lib/services/payments/Payments'

/** What the firm says of one payment at this moment. */
export interface FirmState {
  checkout: CheckoutState
  refunds: RefundState[]
  disputes: DisputeState[]
}

/** A checkout of which nothing further has been asked. */
export const justCheckout = (checkout: CheckoutState): FirmState => ({ checkout, refunds: [], disputes: [] })

/** Asks the firm how a payment stands, with what came after it: what it says now counts, not what it once sent. */
export async function readFirmState(payments: Payments, sessionId: string): Promise<FirmState> {
  const checkout = await payments.readCheckout(sessionId)
  if (!checkout.isPaid || !checkout.paymentId) return justCheckout(checkout)
  const refunds = await payments.readRefunds(checkout.paymentId)
  const disputes = await payments.readDisputes(checkout.paymentId)
  return { checkout, refunds, disputes }
}
