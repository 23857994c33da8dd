import type { DisputesRow, InvoicesRow, PaymentsRow, RefundsRow } from '@/db/tables'
import { formatMoney } from '@/lib/format'

/** A card payment or a settled invoice, with what is left of it; minor units. */
export interface RefundSource {
  of: { paymentId: number } | { invoiceId: number }
  paidMinor: number
  /** From the decision on, unless it failed. */
  givenBackMinor: number
  /** Held or taken by a card holder's bank. */
  disputedMinor: number
  leftMinor: number
}

export interface FeeMoney {
  payments: readonly Pick<PaymentsRow, 'id' | 'state' | 'amount_minor'>[]
  invoices: readonly Pick<InvoicesRow, 'id' | 'state' | 'amount_minor'>[]
  refunds: readonly Pick<RefundsRow, 'payment_id' | 'invoice_id' | 'state' | 'amount_minor'>[]
  disputes: readonly Pick<DisputesRow, 'payment_id' | 'state' | 'amount_minor'>[]
}

const sum = (rows: readonly { amount_minor: number }[]) =>
  rows.reduce((total, { amount_minor }) => total + amount_minor, 0)

/** Everything that was paid for a fee, the oldest first, cards before invoices. */
export function sourcesOf(money: FeeMoney): RefundSource[] {
  const given = money.refunds.filter(({ state }) => state !== 'failed')
  const held = money.disputes.filter(({ state }) => state !== 'won')
  const source = (of: RefundSource['of'], paidMinor: number): RefundSource => {
    const isCard = 'paymentId' in of
    const givenBackMinor = sum(
      given.filter((refund) =>
        isCard ? refund.payment_id === of.paymentId : refund.invoice_id === of.invoiceId,
      ),
    )
    const disputedMinor = isCard ? sum(held.filter((one) => one.payment_id === of.paymentId)) : 0
    return {
      of,
      paidMinor,
      givenBackMinor,
      disputedMinor,
      leftMinor: Math.max(0, paidMinor - givenBackMinor - disputedMinor),
    }
  }
  return [
    ...money.payments
      .filter(({ state }) => state === 'succeeded')
      .map(({ id, amount_minor }) => source({ paymentId: id }, amount_minor)),
    ...money.invoices
      .filter(({ state }) => state === 'settled')
      .map(({ id, amount_minor }) => source({ invoiceId: id }, amount_minor)),
  ]
}

/** The payment a refund is taken from: the one with most left of it; null when nothing was paid. */
export function refundFrom(sources: readonly RefundSource[]): RefundSource | null {
  return sources.reduce<RefundSource | null>(
    (best, one) => (best === null || one.leftMinor > best.leftMinor ? one : best),
    null,
  )
}

/** Why this much cannot be given back of a payment, in a sentence; null when it can. */
export function whyNoRefund(source: RefundSource | null, wishMinor: number, currency: string): string | null {
  if (!source) return 'Nothing was paid, so nothing can be given back.'
  if (!Number.isSafeInteger(wishMinor) || wishMinor <= 0) return 'Give an amount above zero.'
  if (source.leftMinor === 0)
    return source.disputedMinor > 0
      ? 'The card holder disputes this payment with the bank: it cannot be given back besides.'
      : 'All that was paid has been given back already.'
  if (wishMinor > source.leftMinor)
    return `At most ${formatMoney(source.leftMinor, currency)} can be given back: that is what is left of the payment.`
  return null
}
