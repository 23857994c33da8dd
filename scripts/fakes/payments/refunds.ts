import { invalid, missing } from './ApiError'
import type { Happening } from './attempts'
import { integerOf, metadataOf, textOf, type FormTree } from './form'
import type { Charge, Refund } from './objects'
import { newId, unixNow, type PaymentStore } from './store'

export interface RefundHappening {
  refund: Refund
  happenings: Happening[]
}

const reasons = ['duplicate', 'fraudulent', 'requested_by_customer']

/** POST /v1/refunds: whole or in part, never more than was paid. */
export function createRefund(store: PaymentStore, form: FormTree): RefundHappening {
  const charge = chargeOf(store, form)
  const left = charge.amount_captured - charge.amount_refunded
  if (charge.refunded) {
    throw invalid(`Charge ${charge.id} has already been refunded.`, undefined, 'charge_already_refunded')
  }
  if (charge.disputed && !isWon(store, charge))
    throw invalid(`Charge ${charge.id} has been charged back.`, undefined, 'charge_disputed')
  const amount = integerOf(form, 'amount') ?? left
  if (amount < 1) throw invalid('Invalid positive integer', 'amount', 'parameter_invalid_integer')
  if (amount > left) {
    throw invalid(`Refund amount (${amount}) is greater than unrefunded amount on charge (${left})`, 'amount')
  }
  const reason = textOf(form, 'reason')
  if (reason !== null && !reasons.includes(reason))
    throw invalid(`reason is one of ${reasons.join(', ')}.`, 'reason')
  const refund: Refund = {
    id: newId('re'),
    object: 'refund',
    amount,
    balance_transaction: newId('txn'),
    charge: charge.id,
    created: unixNow(),
    currency: charge.currency,
    metadata: metadataOf(form),
    payment_intent: charge.payment_intent,
    reason,
    receipt_number: null,
    status: store.state.refundsTurn,
  }
  store.state.refunds[refund.id] = refund
  const happenings: Happening[] = [{ type: 'refund.created', object: refund }]
  if (refund.status === 'failed') refund.failure_reason = 'expired_or_canceled_card'
  else happenings.push(...count(charge, amount))
  store.changed()
  return { refund, happenings }
}

/** A refund under way counts from the beginning; one that fails in the end is taken off again. */
function count(charge: Charge, amount: number): Happening[] {
  charge.amount_refunded += amount
  charge.refunded = charge.amount_refunded === charge.amount_captured
  return amount > 0 ? [{ type: 'charge.refunded', object: charge }] : []
}

/** Ends a refund that is under way. */
export function finishRefund(
  store: PaymentStore,
  refund: Refund,
  status: 'succeeded' | 'failed',
): Happening[] {
  refund.status = status
  const charge = store.state.charges[refund.charge]
  const isFailed = status === 'failed'
  if (isFailed) refund.failure_reason = 'expired_or_canceled_card'
  if (isFailed && charge) count(charge, -refund.amount)
  store.changed()
  return [{ type: isFailed ? 'refund.failed' : 'refund.updated', object: refund }]
}

function isWon(store: PaymentStore, charge: Charge): boolean {
  return Object.values(store.state.disputes).some(
    (dispute) => dispute.charge === charge.id && dispute.status === 'won',
  )
}

function chargeOf(store: PaymentStore, form: FormTree): Charge {
  const intentId = textOf(form, 'payment_intent')
  const intent = intentId === null ? undefined : store.state.intents[intentId]
  if (intentId !== null && !intent) throw missing('payment_intent', intentId)
  const chargeId = textOf(form, 'charge') ?? intent?.latest_charge ?? null
  if (chargeId === null) {
    throw invalid(
      'One of the following params should be provided for this request: payment_intent or charge.',
    )
  }
  const charge = store.state.charges[chargeId]
  if (!charge) throw missing('charge', chargeId)
  if (!charge.paid) throw invalid('This payment did not succeed, so it cannot be refunded.', 'payment_intent')
  return charge
}
