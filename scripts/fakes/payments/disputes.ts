import { ApiError } from './ApiError'
import type { Happening } from './attempts'
import { firmFee } from './balance'
import type { Charge, Dispute } from './objects'
import { newId, unixNow, type PaymentStore } from './store'

/** What the bank of the card holder does: asks for the money, or decides. */
export const disputeDeeds = ['open', 'won', 'lost'] as const
export type DisputeDeed = (typeof disputeDeeds)[number]

/** Opens a dispute about a charge, or ends the one there is; one that ends unopened is opened first. */
export function disputeCharge(store: PaymentStore, charge: Charge, deed: DisputeDeed): Happening[] {
  const known = Object.values(store.state.disputes).find((each) => each.charge === charge.id)
  const happenings: Happening[] = []
  const dispute = known ?? open(store, charge, happenings)
  if (deed !== 'open') {
    if (dispute.status !== 'needs_response') {
      throw new ApiError(400, 'invalid_request_error', `This dispute is ${dispute.status} already.`)
    }
    dispute.status = deed
    happenings.push({ type: 'charge.dispute.closed', object: dispute })
  }
  store.changed()
  return happenings
}

function open(store: PaymentStore, charge: Charge, happenings: Happening[]): Dispute {
  const dispute: Dispute = {
    id: newId('du'),
    object: 'dispute',
    amount: charge.amount_captured - charge.amount_refunded,
    balance_transactions: [
      { id: newId('txn'), object: 'balance_transaction', currency: charge.currency, fee: firmFee.dispute },
    ],
    charge: charge.id,
    created: unixNow(),
    currency: charge.currency,
    is_charge_refundable: false,
    livemode: false,
    metadata: {},
    payment_intent: charge.payment_intent,
    reason: 'fraudulent',
    status: 'needs_response',
  }
  store.state.disputes[dispute.id] = dispute
  charge.disputed = true
  happenings.push({ type: 'charge.dispute.created', object: dispute })
  return dispute
}
