import type { CallKind, FeeRate } from '@/lib/domain/calls/types'
import { formatList, formatMoneyShort } from '@/lib/format'

const led = {
  member: 'led from member institutes',
  partner: 'led from partners',
  other: 'otherwise',
} as const

/** What a kind of proposal costs, in words: one price, or one for each class, and what sending late adds. */
export function priceWords(
  kind: Pick<CallKind, 'id' | 'feeMinor'>,
  rates: readonly FeeRate[],
  currency: string,
): string {
  const own = rates.filter(({ callKindId }) => callKindId === kind.id)
  const price = (minor: number) => (minor === 0 ? 'no fee' : formatMoneyShort(minor, currency))
  const isOne = own.every(({ amountMinor }) => amountMinor === kind.feeMinor)
  const prices = isOne
    ? price(kind.feeMinor)
    : formatList(
        own.map(({ affiliationClass, amountMinor }) => `${price(amountMinor)} ${led[affiliationClass]}`),
      )
  const late = own.find(({ lateMinor, amountMinor }) => lateMinor > 0 && amountMinor > 0)?.lateMinor
  return late ? `${prices}; ${price(late)} more when sent after the deadline, under an extension` : prices
}
