import type { FeeView } from '@/lib/domain/fees/readFee'
import { formatMoney, formatUtc } from '@/lib/format'

/** How a fee stands, in a few words and the colour they are written in. */
export function feeStanding(
  fee: Pick<
    FeeView,
    'state' | 'dueAt' | 'givenBackMinor' | 'currency' | 'isDisputed' | 'openInvoice' | 'lostDispute'
  >,
): { words: string; className: string } {
  if (fee.isDisputed) return { words: 'disputed with the bank', className: 'text-not-feasible' }
  if (fee.lostDispute) return { words: 'taken back by the bank', className: 'text-not-feasible' }
  switch (fee.state) {
    case 'due':
      return { words: `owed by ${formatUtc(fee.dueAt)}`, className: 'text-lamp' }
    case 'paid':
      return fee.givenBackMinor > 0
        ? { words: `paid, ${formatMoney(fee.givenBackMinor, fee.currency)} back`, className: 'text-feasible' }
        : { words: 'paid', className: 'text-feasible' }
    case 'invoiced':
      return fee.openInvoice?.isOverdue
        ? { words: 'by invoice, overdue', className: 'text-lamp' }
        : { words: 'by invoice', className: 'text-accent' }
    case 'waived':
      return { words: 'waived', className: 'text-accent' }
    case 'refunded':
      return { words: 'given back', className: 'text-muted' }
    case 'lapsed':
      return { words: 'lapsed', className: 'text-muted' }
    case 'cancelled':
      return { words: 'not owed', className: 'text-muted' }
  }
}
