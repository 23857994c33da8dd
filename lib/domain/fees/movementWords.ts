import type { MoneyAccount } from '@/db/queries/moneyLedger'

/** The chart of accounts, as it is called on screen, in the order of a balance. */
export const accountWords: Record<MoneyAccount, string> = {
  receivable: 'owed by proposals',
  invoiced: 'owed by institutes',
  provider: 'at the payment firm',
  bank: 'at the bank',
  disputed: 'held in disputes',
  'owed-back': 'to be given back',
  income: 'fees billed',
  waived: 'waived',
  refunds: 'given back of fees',
  'firm-fees': 'kept by the payment firm',
  lost: 'lost in disputes',
}

const kinds: Record<string, string> = {
  billed: 'billed',
  paid: 'paid by card',
  charged: 'firm’s charge',
  invoiced: 'invoice written',
  settled: 'invoice paid',
  credited: 'invoice taken back',
  waived: 'waived',
  lapsed: 'lapsed',
  cancelled: 'cancelled',
  refund: 'refund decided',
  'refund-failed': 'refund failed',
  refunded: 'given back',
  disputed: 'disputed',
  'dispute-won': 'dispute won',
  'dispute-lost': 'dispute lost',
  'dispute-decided': 'lost dispute decided',
  'paid-after-all': 'dispute won after all',
  'dispute-charge': 'firm’s charge for a dispute',
}

/** What a movement is, from its name: `paid:12` is `paid by card`. */
export function movementWords(movement: string): string {
  const [kind = ''] = movement.split(':')
  return kinds[kind] ?? kind
}
