import type { FeeBook } from '@/lib/domain/fees/types'

export type LedgerGrouping = 'call' | 'state' | 'class'

/** A sum over fees of one currency; all amounts in minor units. */
export interface LedgerTotal {
  key: string
  currency: string
  fees: number
  billedMinor: number
  paidMinor: number
  waivedMinor: number
  droppedMinor: number
  givenBackMinor: number
  disputedMinor: number
  owedMinor: number
  /** Paid less what was given back and what disputes hold or took. */
  keptMinor: number
}

const keyOf: Record<LedgerGrouping, (fee: FeeBook) => string> = {
  call: (fee) => `Call ${fee.callNumber}`,
  state: (fee) => fee.state,
  class: (fee) => fee.affiliationClass,
}

/** Fees summed by call, by state or by class; currencies are never added up. */
export function ledgerTotals(fees: readonly FeeBook[], by: LedgerGrouping): LedgerTotal[] {
  const totals = new Map<string, LedgerTotal>()
  for (const fee of fees) {
    const key = keyOf[by](fee)
    const id = `${key} ${fee.currency}`
    const total = totals.get(id) ?? nothing(key, fee.currency)
    total.fees += 1
    total.billedMinor += fee.billedMinor
    total.paidMinor += fee.paidMinor
    total.waivedMinor += fee.waivedMinor
    total.droppedMinor += fee.droppedMinor
    total.givenBackMinor += fee.givenBackMinor
    total.disputedMinor += fee.disputedMinor
    total.owedMinor += fee.owedMinor
    total.keptMinor += fee.paidMinor - fee.givenBackMinor - fee.disputedMinor
    totals.set(id, total)
  }
  return [...totals.values()]
}

const nothing = (key: string, currency: string): LedgerTotal => ({
  key,
  currency,
  fees: 0,
  billedMinor: 0,
  paidMinor: 0,
  waivedMinor: 0,
  droppedMinor: 0,
  givenBackMinor: 0,
  disputedMinor: 0,
  owedMinor: 0,
  keptMinor: 0,
})
