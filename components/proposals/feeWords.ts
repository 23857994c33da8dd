import { formatMoneyShort } from '@/lib/format'
import type { ReadProposal } from '@/lib/domain/proposals/readProposal'

const words = {
  due: 'to be settled',
  paid: 'paid',
  waived: 'waived',
  invoiced: 'by invoice',
  refunded: 'given back',
  lapsed: 'not settled in time',
  cancelled: 'not owed',
} as const

/** The fee in the strip: what it is and how it stands; null where there is none. */
export function feeWords(
  read: Pick<ReadProposal, 'contents' | 'fee'>,
): { amount: string; standing: string } | null {
  if (read.fee)
    return {
      amount: formatMoneyShort(read.fee.amountMinor, read.fee.currency),
      standing: words[read.fee.state],
    }
  const { call, kind } = read.contents
  if (!call.currency || kind.feeMinor === 0) return null
  return { amount: formatMoneyShort(kind.feeMinor, call.currency), standing: 'due on sending' }
}
