import { feeOf, insertFee, moveMoney } from '@/db/queries/fees'
import type { FeesRow } from '@/db/tables'
import type { Context } from '../context'
import type { ProposalContents } from '../proposals/types'

/**
 * The fee of a proposal being sent: its amount is that of the call's kind, never of a form. Billed once, at the
 * first sending; null where the call asks none.
 */
export async function billProposal(tx: Context, contents: ProposalContents): Promise<FeesRow | null> {
  const { call, kind } = contents
  const standing = await feeOf(tx.db, contents.id)
  if (standing || call.currency === null || kind.feeMinor === 0) return standing
  const money = { amountMinor: kind.feeMinor, currency: call.currency }
  const feeId = await insertFee(tx.db, { ...money, proposalId: contents.id, dueAt: call.graceUntil })
  await moveMoney(tx.db, { ...money, movement: `billed:${feeId}`, feeId, from: 'income', to: 'receivable' })
  return feeOf(tx.db, contents.id)
}
