import { isMoved, moveMoney } from '@/db/queries/moneyLedger'
import type { PaymentsRow } from '@/db/tables'
import type { CheckoutState } from '@/lib/services/payments/Payments'
import type { Context } from '../context'

/** What the firm keeps of a payment, once it says so; it may not know yet when the money comes. */
export async function recordFirmFee(
  tx: Context,
  payment: PaymentsRow,
  checkout: CheckoutState,
): Promise<boolean> {
  const movement = `charged:${payment.id}`
  if (!checkout.firmFeeMinor || (await isMoved(tx.db, movement))) return false
  await moveMoney(tx.db, {
    movement,
    feeId: payment.fee_id,
    from: 'provider',
    to: 'firm-fees',
    amountMinor: checkout.firmFeeMinor,
    currency: payment.currency,
  })
  return true
}
