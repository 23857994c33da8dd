import { billingRecord } from '@/db/queries/billing'
import { databaseNow } from '@/db/queries/clock'
import { latestWaiver, lockFeeOf, updateFee } from '@/db/queries/fees'
import { insertInvoice } from '@/db/queries/invoices'
import { moveMoney } from '@/db/queries/moneyLedger'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import { holds } from '../actor'
import { payTo } from '../billing/payTo'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { invoiceIssued } from '../outbox/letters/invoiceIssued'
import { queueLetter } from '../outbox/queueLetter'
import { readContents } from '../proposals/readContents'
import { drawPaperNumber } from './drawPaperNumber'
import { invoiceDueAt, whyNoInvoice } from './invoiceRules'
import { mayAskForInvoice } from './policy'

export interface AskForInvoiceInput {
  reference: string
  institute: string
  address: string
  purchaseOrder: string
  sendTo: string
}

/**
 * Writes an invoice to an institute for a fee that is due, with the next number, and mails it. While it is open the
 * proposal does not lapse.
 */
export async function askForInvoice(
  ctx: ActingContext,
  input: AskForInvoiceInput,
): Promise<{ number: string }> {
  return inTransaction(ctx, async (tx) => {
    const fee = await lockFeeOf(tx.db, input.reference)
    const contents = await readContents(tx.db, input.reference)
    authorize(mayAskForInvoice(tx.actor, contents))
    if (!fee) throw refuse.closed('Nothing is owed for this proposal.')
    const waiver = await latestWaiver(tx.db, fee.id)
    const why = whyNoInvoice(fee.state, waiver?.state === 'asked')
    if (why) throw refuse.closed(why)

    const billing = await billingRecord(tx.db)
    if (!billing)
      throw refuse.closed(
        'The office has not said yet where invoices are paid to. Write to it, and name the reference.',
      )

    const dueAt = invoiceDueAt(await databaseNow(tx.db))
    const number = await drawPaperNumber(tx, 'invoices')
    const money = { amountMinor: fee.amount_minor, currency: fee.currency }
    const { reference, ...addressed } = input
    const id = await insertInvoice(tx.db, {
      ...addressed,
      ...money,
      number,
      billingRecordId: billing.id,
      feeId: fee.id,
      dueAt,
      askedBy: tx.actor.personId,
    })
    if (!(await updateFee(tx.db, fee, 'invoiced')))
      throw refuse.closed('The fee has changed a moment ago. Load the page again.')
    await moveMoney(tx.db, {
      ...money,
      movement: `invoiced:${id}`,
      feeId: fee.id,
      from: 'receivable',
      to: 'invoiced',
    })
    const facts = {
      ...addressed,
      ...money,
      payTo: payTo(billing.facts),
      number,
      dueAt,
      reference,
      title: contents.title,
    }
    const url = `${tx.request.origin}${paths.proposalSent(reference)}`
    const readers = [
      ...contents.people.filter(({ role }) => role === 'pi'),
      { personId: null, email: input.sendTo, name: input.institute },
    ]
    for (const reader of readers)
      await queueLetter(tx, reader, invoiceIssued({ ...facts, name: reader.name, url }), `invoice:${number}`)
    await writeLogbook(tx, {
      action: 'fee.invoice',
      subject: { kind: 'proposal', id: reference },
      actingAs: holds(tx.actor, 'office') ? 'office' : 'investigator',
      before: { fee: fee.state },
      after: { invoice: number, institute: input.institute, ...money, dueAt },
    })
    return { number }
  })
}
