import { affiliationOfLead, ratesOfKind } from '@/db/queries/feeRates'
import type { FeesRow } from '@/db/tables'
import type { Context } from '../context'
import type { ProposalContents } from '../proposals/types'
import { priceOf } from './priceOf'

export interface ScheduledFee {
  amountMinor: number
  currency: string
  affiliationClass: FeesRow['affiliation_class']
  /** Part of the amount asked for sending late. */
  lateMinor: number
}

/** What sending this proposal at this moment makes due, by the schedule of its call; null where nothing is. */
export async function feeFor(
  ctx: Context,
  contents: ProposalContents,
  at: Date,
): Promise<ScheduledFee | null> {
  const { call, kind } = contents
  if (call.currency === null) return null
  const affiliationClass = await affiliationOfLead(ctx.db, contents.id)
  const rates = await ratesOfKind(ctx.db, kind.id)
  const price = priceOf(
    rates.find((rate) => rate.affiliationClass === affiliationClass) ?? {
      amountMinor: kind.feeMinor,
      lateMinor: 0,
    },
    { at, closesAt: kind.closesAt ?? call.closesAt },
  )
  return price.amountMinor === 0 ? null : { ...price, currency: call.currency, affiliationClass }
}
