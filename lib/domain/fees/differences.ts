import type { ListedPayment } from '@/lib/services/payments/Payments'
import { formatMoney } from '@/lib/format'

/** One of our payments, as far as the firm has a say in it; minor units. */
export interface OurPayment {
  id: number
  reference: string
  state: 'created' | 'open' | 'succeeded' | 'failed' | 'expired'
  key: string
  sessionId: string | null
  paymentId: string | null
  amountMinor: number
  currency: string
  refundedMinor: number
  isDisputed: boolean
}

export interface Difference {
  /** The proposal; null for a payment of the firm that is none of ours. */
  reference: string | null
  /** Ours; null likewise. */
  paymentRow: number | null
  sessionId: string | null
  /** What the firm calls it. */
  paymentId: string
  ours: string
  theirs: string
  /** Asking the firm how the payment stands may mend it; else it is for people. */
  isMendable: boolean
}

/** Where our books and the firm's own list do not say the same. */
export function differences(
  ours: readonly OurPayment[],
  theirs: readonly ListedPayment[],
  /** Ours from this moment on must be in the list. */
  isExpected: (payment: OurPayment) => boolean,
): Difference[] {
  const found: Difference[] = []
  const met = new Set<number>()
  for (const listed of theirs) {
    const own = ours.find(
      (payment) => payment.paymentId === listed.paymentId || payment.key === listed.reference,
    )
    if (own) met.add(own.id)
    const difference = own ? compare(own, listed) : unknownHere(listed)
    if (difference) found.push(difference)
  }
  const missing = ours.filter((own) => own.state === 'succeeded' && !met.has(own.id) && isExpected(own))
  return [...found, ...missing.map(unknownThere)]
}

const base = (own: OurPayment, paymentId: string) => ({
  reference: own.reference,
  paymentRow: own.id,
  sessionId: own.sessionId,
  paymentId,
})

function compare(own: OurPayment, listed: ListedPayment): Difference | null {
  const money = (minor: number, currency = listed.currency) => formatMoney(minor, currency)
  const of = base(own, listed.paymentId)
  if (own.amountMinor !== listed.amountMinor || own.currency !== listed.currency)
    return {
      ...of,
      ours: money(own.amountMinor, own.currency),
      theirs: money(listed.amountMinor),
      isMendable: false,
    }
  if (own.state !== 'succeeded')
    return { ...of, ours: 'not paid', theirs: `${money(listed.amountMinor)} paid`, isMendable: true }
  if (own.refundedMinor !== listed.refundedMinor)
    return {
      ...of,
      ours: `${money(own.refundedMinor)} given back`,
      theirs: `${money(listed.refundedMinor)} given back`,
      isMendable: true,
    }
  if (listed.isDisputed && !own.isDisputed)
    return { ...of, ours: 'no dispute', theirs: 'disputed', isMendable: true }
  return null
}

const unknownHere = (listed: ListedPayment): Difference => ({
  reference: null,
  paymentRow: null,
  sessionId: null,
  paymentId: listed.paymentId,
  ours: 'no such payment',
  theirs: `${formatMoney(listed.amountMinor, listed.currency)} paid`,
  isMendable: false,
})

const unknownThere = (own: OurPayment): Difference => ({
  ...base(own, own.paymentId ?? own.key),
  ours: `${formatMoney(own.amountMinor, own.currency)} paid`,
  theirs: 'no such payment',
  isMendable: false,
})
