import { closeInvoice, invoicesOfFee } from '@/db/queries/invoices'
import { moveMoney } from '@/db/queries/moneyLedger'
import type { FeesRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import type { ProposalContents } from '../proposals/types'
import { issueCreditNote } from './issueCreditNote'

/**
 * Takes the open invoice of a fee back by a credit note: the fee is owed by the proposal again, and the caller, who
 * holds its lock, says what becomes of it.
 */
export async function takeBackInvoice(
  tx: Context,
  fee: FeesRow,
  contents: ProposalContents,
  reason: string,
): Promise<string> {
  const invoice = (await invoicesOfFee(tx.db, fee.id)).find(({ state }) => state === 'open')
  if (!invoice) throw refuse.integrity('This fee is called invoiced, but no open invoice is found.')
  const closed = await closeInvoice(tx.db, invoice, {
    state: 'cancelled',
    closedBy: tx.actor?.personId ?? null,
  })
  if (!closed) throw refuse.closed('The invoice has changed a moment ago. Load the page again.')
  await moveMoney(tx.db, {
    movement: `credited:${invoice.id}`,
    feeId: fee.id,
    from: 'invoiced',
    to: 'receivable',
    amountMinor: invoice.amount_minor,
    currency: invoice.currency,
  })
  return issueCreditNote(tx, {
    contents,
    fee,
    invoice,
    refundId: null,
    amountMinor: invoice.amount_minor,
    reason,
    payer: invoice.institute,
  })
}
