import { disputesOfFee } from '@/db/queries/disputes'
import { lockFeeOf, updateFee } from '@/db/queries/fees'
import { invoicesOfFee } from '@/db/queries/invoices'
import { paymentsOf } from '@/db/queries/payments'
import { refundsOfFee } from '@/db/queries/refunds'
import { authorize } from '@/lib/auth/authorize'
import { refuse } from '@/lib/errors'
import { formatMoney } from '@/lib/format'
import type { ActingContext } from '../context'
import { inTransaction } from '../inTransaction'
import { writeLogbook } from '../logbook/writeLogbook'
import { decideRefund } from './decideRefund'
import { isGivenBackWhole } from './isGivenBackWhole'
import { isSurplusPayment } from './isSurplusPayment'
import { moneyAmount } from './moneyAmount'
import { mayHandleFees } from './policy'
import { refundFrom, sourcesOf, whyNoRefund } from './refundRules'
import { tryRefunds } from './tryRefunds'

export interface RefundFeeInput {
  reference: string
  /** As typed, in the currency of the fee. */
  amount: string
  reason: string
  /** What had been given back when the page was read: of two who press at once, one goes through. */
  givenBackMinor: number
}

/** Gives back a fee, whole or in part. It is decided under the lock of the fee; the firm is asked afterwards. */
export async function refundFee(ctx: ActingContext, input: RefundFeeInput): Promise<{ amount: string }> {
  authorize(mayHandleFees(ctx.actor))
  const amount = await inTransaction(ctx, (tx) => decide(tx, input))
  await tryRefunds(ctx)
  return { amount }
}

async function decide(tx: ActingContext, input: RefundFeeInput): Promise<string> {
  const fee = await lockFeeOf(tx.db, input.reference)
  if (!fee) throw refuse.notFound('fee')
  const refunds = await refundsOfFee(tx.db, fee.id)
  const sources = sourcesOf({
    payments: await paymentsOf(tx.db, fee.id),
    invoices: await invoicesOfFee(tx.db, fee.id),
    refunds,
    disputes: await disputesOfFee(tx.db, fee.id),
  })
  const given = sources.reduce((total, { givenBackMinor }) => total + givenBackMinor, 0)
  if (given !== input.givenBackMinor)
    throw refuse.closed(
      `${formatMoney(given, fee.currency)} stands as given back by now. Load the page again before you give back more.`,
    )
  const wishMinor = moneyAmount(input.amount, fee.currency)
  if (typeof wishMinor === 'string') throw refuse.field('amount', wishMinor)
  const source = refundFrom(sources)
  const why = whyNoRefund(source, wishMinor, fee.currency)
  if (why || !source) throw refuse.field('amount', why ?? 'Nothing was paid.')

  const id = await decideRefund(tx, fee, {
    of: source.of,
    amountMinor: wishMinor,
    isSurplus: 'paymentId' in source.of && (await isSurplusPayment(tx, source.of.paymentId)),
    reason: input.reason,
  })
  if (fee.state === 'paid' && isGivenBackWhole(fee, await refundsOfFee(tx.db, fee.id)))
    await updateFee(tx.db, fee, 'refunded')
  await writeLogbook(tx, {
    action: 'fee.decide-refund',
    subject: { kind: 'proposal', id: input.reference },
    actingAs: 'office',
    before: { givenBackMinor: given },
    after: { refund: id, amountMinor: wishMinor, currency: fee.currency, reason: input.reason },
  })
  return formatMoney(wishMinor, fee.currency)
}
