import { feeOf, lockFee, updateFee } from '@/db/queries/fees'
import { invoicesOfFee } from '@/db/queries/invoices'
import { moveMoney } from '@/db/queries/moneyLedger'
import { paymentsOf } from '@/db/queries/payments'
import { refundsOfFee } from '@/db/queries/refunds'
import { disputesOfFee } from '@/db/queries/disputes'
import type { FeesRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { readContents } from '../proposals/readContents'
import { decideRefund } from './decideRefund'
import { isSurplusPayment } from './isSurplusPayment'
import { sourcesOf } from './refundRules'
import { takeBackInvoice } from './takeBackInvoice'

/**
 * Ends what a proposal owes. Unpaid: the bill is taken back. Paid: a refund of what is left is decided here and
 * carried out once the transaction stands, so that no money moves for a change that was undone.
 */
export async function cancelFee(
  tx: Context,
  proposalId: number,
  as: { state: 'cancelled' | 'lapsed'; reason: string },
): Promise<'none' | 'kept' | 'cancelled' | 'refunded'> {
  const known = await feeOf(tx.db, proposalId)
  const fee = known && (await lockFee(tx.db, known.id))
  if (!fee) return 'none'
  if (fee.state === 'due' || fee.state === 'invoiced') {
    if (fee.state === 'invoiced')
      await takeBackInvoice(tx, fee, await readContents(tx.db, proposalId), as.reason)
    if (!(await updateFee(tx.db, fee, as.state))) throw moved()
    await moveMoney(tx.db, {
      movement: `${as.state}:${fee.id}`,
      feeId: fee.id,
      from: 'receivable',
      to: 'income',
      amountMinor: fee.amount_minor,
      currency: fee.currency,
    })
    return 'cancelled'
  }
  return fee.state === 'paid' ? giveBack(tx, fee, as.reason) : 'kept'
}

async function giveBack(tx: Context, fee: FeesRow, reason: string): Promise<'kept' | 'refunded'> {
  const sources = sourcesOf({
    payments: await paymentsOf(tx.db, fee.id),
    invoices: await invoicesOfFee(tx.db, fee.id),
    refunds: await refundsOfFee(tx.db, fee.id),
    disputes: await disputesOfFee(tx.db, fee.id),
  })
  if (sources.length === 0)
    throw refuse.integrity('This fee is called paid, but no payment is found. The office has to be told.')
  const open = sources.filter(({ leftMinor }) => leftMinor > 0)
  if (open.length === 0) return 'kept'
  if (!(await updateFee(tx.db, fee, 'refunded'))) throw moved()
  for (const { of, leftMinor } of open) {
    const isSurplus = 'paymentId' in of && (await isSurplusPayment(tx, of.paymentId))
    await decideRefund(tx, fee, { of, amountMinor: leftMinor, isSurplus, reason })
  }
  return 'refunded'
}

const moved = () => refuse.closed('The fee has changed a moment ago. Load the page again.')
