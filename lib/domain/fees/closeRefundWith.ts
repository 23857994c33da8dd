import { lockFee, updateFee } from '@/db/queries/fees'
import { findInvoiceById } from '@/db/queries/invoices'
import { moveMoney } from '@/db/queries/moneyLedger'
import { findPayment } from '@/db/queries/payments'
import { findPerson } from '@/db/queries/people'
import { closeRefund } from '@/db/queries/refunds'
import { officePeople } from '@/db/queries/roleHolders'
import type { FeesRow, RefundsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'
import { writeLogbook } from '../logbook/writeLogbook'
import { refundFailed } from '../outbox/letters/refundFailed'
import { queueLetter } from '../outbox/queueLetter'
import { readContents } from '../proposals/readContents'
import type { ProposalContents } from '../proposals/types'
import { issueCreditNote } from './issueCreditNote'

export interface RefundOutcome {
  state: 'succeeded' | 'failed'
  providerRefundId: string | null
  failure: string
  actingAs: 'payment firm' | 'office'
  /** Of the transfer that gave an institute's money back. */
  bankReference?: string
}

/**
 * The money of a refund has gone back, or could not: the books, the credit note, the letters and the logbook, in the
 * caller's transaction. The refund is locked by the caller and still open.
 */
export async function closeRefundWith(
  tx: Context,
  refund: RefundsRow,
  outcome: RefundOutcome,
): Promise<void> {
  const payment = refund.payment_id === null ? null : await findPayment(tx.db, refund.payment_id)
  const invoice = refund.invoice_id === null ? null : await findInvoiceById(tx.db, refund.invoice_id)
  const fee = await lockFee(tx.db, payment?.fee_id ?? invoice?.fee_id ?? 0)
  if (!fee) throw refuse.integrity('The fee of this refund is missing.')
  const contents = await readContents(tx.db, fee.proposal_id)
  await closeRefund(tx.db, refund.id, outcome)
  const money = { feeId: fee.id, amountMinor: refund.amount_minor, currency: fee.currency }
  let note: string | null = null
  if (outcome.state === 'succeeded') {
    const from = invoice ? 'bank' : 'provider'
    await moveMoney(tx.db, { ...money, movement: `refunded:${refund.id}`, from, to: 'owed-back' })
    const payer = payment?.started_by ? await findPerson(tx.db, payment.started_by) : null
    note = await issueCreditNote(tx, {
      contents,
      fee,
      invoice,
      refundId: refund.id,
      amountMinor: refund.amount_minor,
      reason: refund.reason,
      payer: payer?.name ?? contents.people.find(({ role }) => role === 'pi')?.name ?? contents.reference,
    })
  } else await undoRefund(tx, refund, fee, contents, outcome.failure)
  await writeLogbook(tx, {
    action: 'fee.refund',
    subject: { kind: 'proposal', id: contents.reference },
    actingAs: outcome.actingAs,
    after: {
      state: outcome.state,
      amountMinor: refund.amount_minor,
      currency: fee.currency,
      ...(outcome.providerRefundId ? { refund: outcome.providerRefundId } : {}),
      ...(outcome.bankReference ? { bank: outcome.bankReference } : {}),
      ...(note ? { creditNote: note } : { failure: outcome.failure }),
    },
  })
}

/** The money is still ours: the fee counts as paid again, and the office is told to find another way. */
async function undoRefund(
  tx: Context,
  refund: RefundsRow,
  fee: FeesRow,
  contents: ProposalContents,
  failure: string,
): Promise<void> {
  if (!refund.is_surplus) {
    await moveMoney(tx.db, {
      movement: `refund-failed:${refund.id}`,
      feeId: fee.id,
      from: 'refunds',
      to: 'owed-back',
      amountMinor: refund.amount_minor,
      currency: fee.currency,
    })
    if (fee.state === 'refunded') await updateFee(tx.db, fee, 'paid')
  }
  for (const person of await officePeople(tx.db)) {
    const facts = { reference: contents.reference, amountMinor: refund.amount_minor, currency: fee.currency }
    const letter = refundFailed({ name: person.name, ...facts, failure, origin: tx.request.origin })
    await queueLetter(tx, person, letter, `refund-failed:${refund.id}`)
  }
}
