import { databaseNow } from '@/db/queries/clock'
import { lockFee, moveMoney, updateFee } from '@/db/queries/fees'
import { insertRefund, updatePayment } from '@/db/queries/payments'
import { findPerson } from '@/db/queries/people'
import { drawNumber, insertReceipt } from '@/db/queries/receipts'
import type { PaymentsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { CheckoutState } from '@/lib/services/payments/Payments'
import type { Context } from '../context'
import { writeLogbook } from '../logbook/writeLogbook'
import { readContents } from '../proposals/readContents'
import { receiptNumber, whatMoneyMeans } from './rules'
import { sendReceipt } from './sendReceipt'

/** Money has come: the payment, its receipt, both sides of the ledger and the fee, all in the caller's transaction. */
export async function settlePayment(
  tx: Context,
  payment: PaymentsRow,
  checkout: CheckoutState,
): Promise<string> {
  const fee = await lockFee(tx.db, payment.fee_id)
  if (!fee) throw refuse.integrity('The fee of this payment is missing.')
  const contents = await readContents(tx.db, fee.proposal_id)
  const now = await databaseNow(tx.db)
  await updatePayment(tx.db, payment.id, {
    state: 'succeeded',
    provider_session_id: checkout.sessionId,
    provider_payment_id: checkout.paymentId,
    card_last4: checkout.cardLast4,
    failure: null,
    succeeded_at: now,
  })
  const payer = payment.started_by === null ? null : await findPerson(tx.db, payment.started_by)
  const lead = contents.people.find(({ role }) => role === 'pi') ?? contents.people[0]
  const year = now.getUTCFullYear()
  const number = receiptNumber(year, await drawNumber(tx.db, `receipts-${year}`))
  await insertReceipt(tx.db, {
    number,
    feeId: fee.id,
    paymentId: payment.id,
    payer: payer?.name ?? lead?.name ?? contents.reference,
  })
  await moveMoney(tx.db, {
    movement: `paid:${payment.id}`,
    feeId: fee.id,
    from: 'receivable',
    to: 'provider',
    amountMinor: payment.amount_minor,
    currency: payment.currency,
  })

  const meaning = whatMoneyMeans(fee.state)
  if (meaning === 'settles the fee') await updateFee(tx.db, fee, 'paid')
  else {
    if (meaning === 'came too late') await updateFee(tx.db, fee, 'refunded')
    await insertRefund(tx.db, {
      paymentId: payment.id,
      idempotencyKey: `refund-${payment.id}`,
      amountMinor: payment.amount_minor,
      reason: meaning,
      madeBy: null,
    })
  }
  await sendReceipt(tx, { contents, payment, meaning, number, cardLast4: checkout.cardLast4, paidAt: now })
  await writeLogbook(tx, {
    action: 'fee.pay',
    subject: { kind: 'proposal', id: contents.reference },
    actingAs: 'payment firm',
    before: { fee: fee.state },
    after: { receipt: number, amountMinor: payment.amount_minor, currency: payment.currency, meaning },
  })
  return meaning === 'settles the fee' ? `fee paid, receipt ${number}` : `money ${meaning}: it goes back`
}
