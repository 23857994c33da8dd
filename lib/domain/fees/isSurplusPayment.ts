import { movedFrom } from '@/db/queries/moneyLedger'
import type { Context } from '../context'

/** Whether a payment came when nothing was owed: the books hold it as money to be given back. */
export async function isSurplusPayment(tx: Context, paymentId: number): Promise<boolean> {
  return (await movedFrom(tx.db, `paid:${paymentId}`)) === 'owed-back'
}
