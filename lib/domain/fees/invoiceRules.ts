import type { FeesRow, InvoicesRow } from '@/db/tables'
import { whyNotPayable } from './rules'

const dayMs = 86_400_000

/** Days an institute has to pay an invoice. */
export const invoiceDays = 30

/** Days a proposal has to settle its fee another way once its invoice was taken back. */
export const daysAfterTakingBack = 7

export const invoiceDueAt = (issuedAt: Date): Date => new Date(issuedAt.getTime() + invoiceDays * dayMs)

/** The fee is owed again: as long as it was, but for a week at least. */
export const dueAgainAt = (dueAt: Date, now: Date): Date =>
  new Date(Math.max(dueAt.getTime(), now.getTime() + daysAfterTakingBack * dayMs))

/** Why no invoice can be written for a fee, in a sentence; null when it can. */
export function whyNoInvoice(state: FeesRow['state'], isWaiverAsked: boolean): string | null {
  if (state === 'invoiced')
    return 'An invoice has been written already. Take it back before another is written.'
  if (isWaiverAsked) return 'A waiver is asked for. The office decides it first.'
  return whyNotPayable(state)
}

export const isOverdue = (invoice: Pick<InvoicesRow, 'state' | 'due_at'>, now: Date): boolean =>
  invoice.state === 'open' && invoice.due_at <= now

/** What is wrong with the day a transfer is said to have arrived on; null when nothing is. */
export function whyNotThatDay(paidOn: string, writtenAt: Date, now: Date): string | null {
  const today = now.toISOString().slice(0, 10)
  if (paidOn > today) return 'That day has not come yet.'
  if (paidOn < writtenAt.toISOString().slice(0, 10)) return 'That is before the invoice was written.'
  return null
}
