import { listCalls } from '@/db/queries/calls'
import { authorize } from '@/lib/auth/authorize'
import { mayManageCalls } from '../calls/policy'
import type { OfficeProposalRow } from '../calls/officeProposalSchema'
import { readOfficeProposals } from '../calls/readOfficeProposals'
import type { Call } from '../calls/types'
import type { ActingContext } from '../context'

export interface FeesView {
  call: Call
  /** Other calls with a fee. */
  others: Call[]
  /** Proposals with a fee. */
  rows: OfficeProposalRow[]
  billedMinor: number
}

/** Fees of one call, of the newest with any fee when none is named; null when no call has a fee. */
export async function readFeesOfCall(ctx: ActingContext, slug: string | null): Promise<FeesView | null> {
  authorize(mayManageCalls(ctx.actor))
  const calls = (await listCalls(ctx.db)).filter((call) => call.currency !== null)
  const lists = await Promise.all(calls.map((call) => readOfficeProposals(ctx, call.slug)))
  const billed = lists.map((list) => list.rows.filter((row) => row.feeMinor !== null))
  const named = calls.findIndex((call) => call.slug === slug)
  const index =
    named >= 0
      ? named
      : Math.max(
          0,
          billed.findIndex((rows) => rows.length > 0),
        )
  const call = calls[index]
  const rows = billed[index]
  if (!call || !rows) return null
  return {
    call,
    others: calls.filter((other) => other !== call),
    rows,
    billedMinor: rows.reduce((sum, row) => sum + (row.feeMinor ?? 0), 0),
  }
}
