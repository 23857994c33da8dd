import { feeOf, lockFee, moveMoney, updateFee } from '@/db/queries/fees'
import { insertRefund, paymentsOf } from '@/db/queries/payments'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'

/**
 * Ends what a proposal owes. Unpaid: the bill is taken back. Paid: a refund in full is decided here and carried
 * out once the transaction stands, so that no money moves for a change that was undone.
 */
export async function cancelFee(
  tx: Context,
  proposalId: number,
  reason: string,
): Promise<'none' | 'kept' | 'cancelled' | 'refunded'> {
  const known = await feeOf(tx.db, proposalId)
  if (!known) return 'none'
  const fee = await lockFee(tx.db, known.id)
  if (!fee) return 'none'
  const money = { feeId: fee.id, amountMinor: fee.amount_minor, currency: fee.currency }

  if (fee.state === 'due' || fee.state === 'invoiced') {
    if (!(await updateFee(tx.db, fee, 'lapsed'))) throw moved()
    await moveMoney(tx.db, { ...money, movement: `unbilled:${fee.id}`, from: 'receivable', to: 'income' })
    return 'cancelled'
  }
  if (fee.state !== 'paid') return 'kept'

  const paid = (await paymentsOf(tx.db, fee.id)).find(({ state }) => state === 'succeeded')
  if (!paid)
    throw refuse.integrity('This fee is called paid, but no payment is found. The office has to be told.')
  if (!(await updateFee(tx.db, fee, 'refunded'))) throw moved()
  await insertRefund(tx.db, {
    paymentId: paid.id,
    idempotencyKey: `refund-${paid.id}`,
    amountMinor: paid.amount_minor,
    reason,
    madeBy: tx.actor?.personId ?? null,
  })
  return 'refunded'
}

const moved = () => refuse.closed('The fee has changed a moment ago. Load the page again.')
