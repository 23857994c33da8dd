import { closeDispute } from '@/db/queries/disputes'
import { updateFee } from '@/db/queries/fees'
import { moveMoney } from '@/db/queries/moneyLedger'
import type { DisputesRow, FeesRow } from '@/db/tables'
import type { Context } from '../context'
import { readContents } from '../proposals/readContents'
import { decideRefund } from './decideRefund'
import { whatMoneyMeans } from './rules'
import { takeBackInvoice } from './takeBackInvoice'

/**
 * A bank changes its mind after the office had decided on a lost dispute: the money is there as any payment is. It
 * settles a fee that was asked for again; where that is settled, or nothing is owed any more, it goes back.
 */
export async function wonAfterAll(tx: Context, fee: FeesRow, dispute: DisputesRow): Promise<void> {
  const meaning = whatMoneyMeans(fee.state)
  const settles = meaning === 'settles the fee'
  const money = { amountMinor: dispute.amount_minor, currency: fee.currency }
  await closeDispute(tx.db, dispute.id, 'won')
  if (fee.state === 'invoiced')
    await takeBackInvoice(
      tx,
      fee,
      await readContents(tx.db, fee.proposal_id),
      'the first payment stands after all',
    )
  await moveMoney(tx.db, {
    ...money,
    movement: `paid-after-all:${dispute.id}`,
    feeId: fee.id,
    from: settles ? 'receivable' : 'owed-back',
    to: 'provider',
  })
  if (settles) await updateFee(tx.db, fee, 'paid')
  else
    await decideRefund(tx, fee, {
      of: { paymentId: dispute.payment_id },
      amountMinor: dispute.amount_minor,
      isSurplus: true,
      reason: meaning,
    })
}
