import { feeOf, insertFee } from '@/db/queries/fees'
import { moveMoney } from '@/db/queries/moneyLedger'
import type { FeesRow } from '@/db/tables'
import type { Context } from '../context'
import type { ProposalContents } from '../proposals/types'
import { feeFor } from './feeFor'

/**
 * The fee of a proposal being sent: its amount is that of the call's schedule, never of a form. Billed once, at the
 * first sending; null where the call asks none.
 */
export async function billProposal(
  tx: Context,
  contents: ProposalContents,
  arrivedAt: Date,
): Promise<FeesRow | null> {
  const standing = await feeOf(tx.db, contents.id)
  if (standing) return standing
  const fee = await feeFor(tx, contents, arrivedAt)
  if (!fee) return null
  const { amountMinor, currency } = fee
  const feeId = await insertFee(tx.db, { ...fee, proposalId: contents.id, dueAt: contents.call.graceUntil })
  await moveMoney(tx.db, {
    movement: `billed:${feeId}`,
    feeId,
    from: 'income',
    to: 'receivable',
    amountMinor,
    currency,
  })
  return feeOf(tx.db, contents.id)
}
