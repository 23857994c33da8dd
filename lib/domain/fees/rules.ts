import type { FeesRow, PaymentsRow } from '@/db/tables'

/** Why a fee cannot be paid now, in a sentence; null when it can. */
export function whyNotPayable(state: FeesRow['state']): string | null {
  switch (state) {
    case 'due':
      return null
    case 'paid':
      return 'The fee has been paid already.'
    case 'waived':
      return 'The fee has been waived: nothing is owed.'
    case 'invoiced':
      return 'The fee goes to an institute by invoice: nothing is to be paid here.'
    case 'refunded':
      return 'The fee was paid back: nothing is owed.'
    case 'lapsed':
    case 'cancelled':
      return 'The fee is no longer owed.'
  }
}

const hour = 3600_000

/** A checkout page stays open for 23 hours: the firm allows a day at most, and forgets keys after one. */
export const checkoutEndsAt = (begunAt: Date): Date => new Date(begunAt.getTime() + 23 * hour)

/** An attempt that can be taken up again: its page may be open still, or its creation can be repeated by its key. */
export function canBeTakenUp(
  payment: Pick<PaymentsRow, 'state' | 'provider_session_id' | 'created_at'>,
  now: Date,
): boolean {
  if (payment.state === 'open') return true
  // The firm wants at least half an hour until a page ends.
  return payment.state === 'created' && now.getTime() < checkoutEndsAt(payment.created_at).getTime() - hour
}

export type MoneyArrived = 'settles the fee' | 'came too late' | 'came twice'

/** What money that arrived means for the fee as it stands. */
export function whatMoneyMeans(state: FeesRow['state']): MoneyArrived {
  if (state === 'due' || state === 'invoiced') return 'settles the fee'
  return state === 'paid' ? 'came twice' : 'came too late'
}
