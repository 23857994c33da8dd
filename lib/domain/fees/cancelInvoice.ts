import { databaseNow } from '@/db/queries/clock'
import { lockFee, updateFee } from '@/db/queries/fees'
import { findInvoice } from '@/db/queries/invoices'
import { moveMoney } from '@/db/queries/moneyLedger'
import type { FeesRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { readContents } from '../proposals/readContents'
import { dueAgainAt } from './invoiceRules'
import { oweAgain } from './oweAgain'
import { mayHandleFees } from './policy'
import { takeBackInvoice } from './takeBackInvoice'

export interface CancelInvoiceInput {
  number: string
  reason: string
  /** The fee is owed again, to be settled another way; or nothing is owed any more. */
  then: 'due' | 'nothing'
}

/** Cancels an open invoice by a credit note of its own number; never by changing it. */
export async function cancelInvoice(
  ctx: ActingContext,
  input: CancelInvoiceInput,
): Promise<{ creditNote: string }> {
  authorize(mayHandleFees(ctx.actor))
  return inTransaction(ctx, async (tx) => {
    const known = await findInvoice(tx.db, input.number)
    const fee = known && (await lockFee(tx.db, known.fee_id))
    if (!known || !fee) throw refuse.notFound('invoice')
    if (known.state !== 'open' || fee.state !== 'invoiced')
      throw refuse.closed(`Invoice ${known.number} is ${known.state} already. Load the page again.`)
    const contents = await readContents(tx.db, fee.proposal_id)
    const creditNote = await takeBackInvoice(tx, fee, contents, input.reason)
    await (input.then === 'due'
      ? oweAgain(tx, fee, dueAgainAt(fee.due_at, await databaseNow(tx.db)))
      : drop(tx, fee))
    await writeLogbook(tx, {
      action: 'fee.cancel-invoice',
      subject: { kind: 'proposal', id: contents.reference },
      actingAs: 'office',
      before: { fee: fee.state, invoice: known.number },
      after: { creditNote, reason: input.reason, fee: input.then === 'due' ? 'due' : 'cancelled' },
    })
    return { creditNote }
  })
}

async function drop(tx: ActingContext, fee: FeesRow): Promise<void> {
  await updateFee(tx.db, fee, 'cancelled')
  await moveMoney(tx.db, {
    movement: `cancelled:${fee.id}`,
    feeId: fee.id,
    from: 'receivable',
    to: 'income',
    amountMinor: fee.amount_minor,
    currency: fee.currency,
  })
}
