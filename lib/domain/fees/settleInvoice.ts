import { databaseNow } from '@/db/queries/clock'
import { lockFee, updateFee } from '@/db/queries/fees'
import { closeInvoice, findInvoice } from '@/db/queries/invoices'
import { moveMoney } from '@/db/queries/moneyLedger'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { formatMoney } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { invoiceSettled } from '../outbox/letters/invoiceSettled'
import { queueLetter } from '../outbox/queueLetter'
import { readContents } from '../proposals/readContents'
import { whyNotThatDay } from './invoiceRules'
import { moneyAmount } from './moneyAmount'
import { mayHandleFees } from './policy'

export interface SettleInvoiceInput {
  number: string
  /** As typed, in the currency of the invoice. */
  amount: string
  /** Day the money reached the bank, `2027-04-02`. */
  paidOn: string
  bankReference: string
}

/** Puts on record that the bank has an institute's money: the fee is paid, and the investigators are told. */
export async function settleInvoice(ctx: ActingContext, input: SettleInvoiceInput): Promise<void> {
  authorize(mayHandleFees(ctx.actor))
  await inTransaction(ctx, async (tx) => {
    const known = await findInvoice(tx.db, input.number)
    const fee = known && (await lockFee(tx.db, known.fee_id))
    const invoice = fee && (await findInvoice(tx.db, input.number))
    if (!fee || !invoice) throw refuse.notFound('invoice')
    if (invoice.state !== 'open')
      throw refuse.closed(`Invoice ${invoice.number} is ${invoice.state} already. Load the page again.`)
    const amountMinor = moneyAmount(input.amount, invoice.currency)
    if (typeof amountMinor === 'string') throw refuse.field('amount', amountMinor)
    if (amountMinor !== invoice.amount_minor)
      throw refuse.field(
        'amount',
        `The invoice is for ${formatMoney(invoice.amount_minor, invoice.currency)}. Settle it when that has come; another sum is for you to clear with the institute.`,
      )
    const notThen = whyNotThatDay(input.paidOn, invoice.created_at, await databaseNow(tx.db))
    if (notThen) throw refuse.field('paidOn', notThen)

    const outcome = { settledOn: input.paidOn, reference: input.bankReference, closedBy: tx.actor.personId }
    const isFirst =
      (await closeInvoice(tx.db, invoice, { state: 'settled', ...outcome })) &&
      (await updateFee(tx.db, fee, 'paid'))
    if (!isFirst) throw refuse.closed('The invoice has changed a moment ago. Load the page again.')
    await moveMoney(tx.db, {
      movement: `settled:${invoice.id}`,
      feeId: fee.id,
      from: 'invoiced',
      to: 'bank',
      amountMinor,
      currency: invoice.currency,
    })
    const contents = await readContents(tx.db, fee.proposal_id)
    const { reference, title } = contents
    const url = `${tx.request.origin}${paths.proposalSent(reference)}`
    const facts = { number: invoice.number, institute: invoice.institute, reference, title, url }
    for (const person of contents.people.filter(({ role }) => role === 'pi')) {
      const letter = invoiceSettled({ ...facts, name: person.name, amountMinor, currency: invoice.currency })
      await queueLetter(tx, person, letter, `settled:${invoice.number}`)
    }
    await writeLogbook(tx, {
      action: 'fee.settle-invoice',
      subject: { kind: 'proposal', id: reference },
      actingAs: 'office',
      before: { fee: fee.state, invoice: invoice.number },
      after: { amountMinor, currency: invoice.currency, paidOn: input.paidOn, bank: input.bankReference },
    })
  })
}
