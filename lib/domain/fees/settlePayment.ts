import { databaseNow } from '@/db/queries/clock'
import { lockFee, updateFee } from '@/db/queries/fees'
import { moveMoney } from '@/db/queries/moneyLedger'
import { updatePayment } from '@/db/queries/payments'
import { findPerson } from '@/db/queries/people'
import { insertReceipt } from '@/db/queries/receipts'
import type { PaymentsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { CheckoutState } from '@/lib/services/payments/Payments'
import type { Context } from '../context'
import { writeLogbook } from '../logbook/writeLogbook'
import { readContents } from '../proposals/readContents'
import { decideRefund } from './decideRefund'
import { drawPaperNumber } from './drawPaperNumber'
import { whatMoneyMeans } from './rules'
import { sendReceipt } from './sendReceipt'
import { takeBackInvoice } from './takeBackInvoice'

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
  const number = await drawPaperNumber(tx, 'receipts')
  await insertReceipt(tx.db, {
    number,
    feeId: fee.id,
    paymentId: payment.id,
    payer: payer?.name ?? lead?.name ?? contents.reference,
  })
  const meaning = whatMoneyMeans(fee.state)
  const settles = meaning === 'settles the fee'
  if (fee.state === 'invoiced') await takeBackInvoice(tx, fee, contents, 'the fee was paid by card')
  await moveMoney(tx.db, {
    movement: `paid:${payment.id}`,
    feeId: fee.id,
    from: settles ? 'receivable' : 'owed-back',
    to: 'provider',
    amountMinor: payment.amount_minor,
    currency: payment.currency,
  })
  if (settles) await updateFee(tx.db, fee, 'paid')
  else
    await decideRefund(tx, fee, {
      of: { paymentId: payment.id },
      amountMinor: payment.amount_minor,
      isSurplus: true,
      reason: meaning,
    })
  await sendReceipt(tx, { contents, payment, meaning, number, cardLast4: checkout.cardLast4, paidAt: now })
  await writeLogbook(tx, {
    action: 'fee.pay',
    subject: { kind: 'proposal', id: contents.reference },
    actingAs: 'payment firm',
    before: { fee: fee.state },
    after: { receipt: number, amountMinor: payment.amount_minor, currency: payment.currency, meaning },
  })
  return settles ? `fee paid, receipt ${number}` : `money ${meaning}: it goes back`
}
