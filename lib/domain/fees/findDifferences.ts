import { databaseNow } from '@/db/queries/clock'
import { paymentsForFirm } from '@/db/queries/reconciliation'
import type { Context } from '../context'
import { differences, type Difference } from './differences'

const dayMs = 86_400_000

/** Days of the past that are held against the firm's list. */
export const daysHeld = 400

export interface Comparison {
  at: Date
  payments: number
  differences: Difference[]
}

/** Asks the firm for its own list of payments and holds ours against it. Changes nothing. */
export async function findDifferences(ctx: Context): Promise<Comparison> {
  const at = await databaseNow(ctx.db)
  const from = new Date(at.getTime() - daysHeld * dayMs)
  // Their clock and ours differ, so their list begins a little earlier.
  const theirs = await ctx.payments.listPayments(new Date(from.getTime() - 2 * dayMs))
  const ours = await paymentsForFirm(ctx.db)
  const recent = new Set(
    ours.filter(({ succeededAt }) => succeededAt && succeededAt >= from).map(({ id }) => id),
  )
  return {
    at,
    payments: theirs.length,
    differences: differences(ours, theirs, ({ id }) => recent.has(id)),
  }
}
