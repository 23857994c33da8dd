import { formatCountdown } from '@/lib/format'
import type { SentProposal } from './readSent'

/** The line above the reference: that it is in, and how its fee stands. */
export function sentHeading({ contents, fee }: Pick<SentProposal, 'contents' | 'fee'>): string {
  if (contents.state === 'withdrawn') return 'It has been withdrawn'
  if (contents.state === 'lapsed') return 'It has lapsed: the fee was not settled'
  if (contents.isReopened) return 'It is in, and open for writing again'
  switch (fee?.state) {
    case undefined:
      return 'It is in'
    case 'paid':
      return 'It is in, and the fee is settled'
    case 'waived':
      return 'It is in, and the fee is waived'
    case 'invoiced':
      return 'It is in; the fee goes by invoice'
    case 'refunded':
      return 'It is in; the fee was given back'
    case 'cancelled':
      return 'It is in; nothing is owed'
    case 'due':
    case 'lapsed':
      return 'It is in; the fee is still to be settled'
  }
}

/** How long before the deadline it arrived: `10 days 20 hours before the deadline`. */
export function beforeDeadline(arrivedAt: Date, deadline: Date): string {
  const words = formatCountdown(deadline.getTime() - arrivedAt.getTime(), 2)
    .replace(/(\d+)\sd\b/, (_, n: string) => `${n} ${n === '1' ? 'day' : 'days'}`)
    .replace(/(\d+)\sh\b/, (_, n: string) => `${n} ${n === '1' ? 'hour' : 'hours'}`)
    .replace(/(\d+)\smin\b/, (_, n: string) => `${n} ${n === '1' ? 'minute' : 'minutes'}`)
    .replace(/(\d+)\ss\b/, (_, n: string) => `${n} ${n === '1' ? 'second' : 'seconds'}`)
  return `${words} before the deadline`
}
