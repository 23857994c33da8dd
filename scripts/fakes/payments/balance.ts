import type { Charge } from './objects'

/** What this firm asks, invented: a share and a fixed sum of each charge, and a sum for each dispute, minor units. */
export const firmFee = {
  ofCharge: (amount: number): number => Math.round(amount * 0.015) + 25,
  dispute: 2000,
}

/** The line of the firm's own books that belongs to a charge. */
export function balanceLine(charge: Charge): { [key: string]: string | number } {
  const fee = firmFee.ofCharge(charge.amount_captured)
  return {
    id: charge.balance_transaction ?? '',
    object: 'balance_transaction',
    amount: charge.amount_captured,
    currency: charge.currency,
    fee,
    net: charge.amount_captured - fee,
    type: 'charge',
  }
}
