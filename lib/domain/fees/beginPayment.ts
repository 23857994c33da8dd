import { databaseNow } from '@/db/queries/clock'
import { lockFeeOf } from '@/db/queries/fees'
import { findPayment, insertPayment, paymentsOf, updatePayment } from '@/db/queries/payments'
import { findPerson } from '@/db/queries/people'
import type { PaymentsRow } from '@/db/tables'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import type { ActingContext } from '../context'
import { readContents } from '../proposals/readContents'
import { mayPayFee } from './policy'
import { canBeTakenUp, whyNotPayable } from './rules'

export interface BegunPayment {
  payment: PaymentsRow
  /** Of whoever began it: the firm wants the same with the same key. */
  email: string
  callNumber: number
}

/** The attempt to pay a fee that is under way, or a new one; its amount is that of the fee row. */
export async function beginPayment(tx: ActingContext, reference: string): Promise<BegunPayment> {
  const fee = await lockFeeOf(tx.db, reference)
  const contents = await readContents(tx.db, reference)
  authorize(mayPayFee(tx.actor, contents))
  if (!fee) throw refuse.closed('Nothing is owed for this proposal.')
  const why = whyNotPayable(fee.state)
  if (why) throw refuse.closed(why)

  const now = await databaseNow(tx.db)
  const attempts = await paymentsOf(tx.db, fee.id)
  let payment = attempts.find((attempt) => canBeTakenUp(attempt, now)) ?? null
  if (!payment) {
    for (const attempt of attempts.filter(({ state }) => state === 'created'))
      await updatePayment(tx.db, attempt.id, { state: 'expired' })
    const id = await insertPayment(tx.db, {
      feeId: fee.id,
      idempotencyKey: `pay-${fee.id}-${attempts.length + 1}`,
      amountMinor: fee.amount_minor,
      currency: fee.currency,
      startedBy: tx.actor.personId,
    })
    payment = await findPayment(tx.db, id)
  }
  if (!payment) throw refuse.integrity('The payment could not be begun. Try again.')
  const starter = payment.started_by === null ? null : await findPerson(tx.db, payment.started_by)
  return { payment, email: starter?.email ?? tx.actor.email, callNumber: contents.call.number }
}
