import {
  accountBalances,
  balanceCheck,
  bookedMovements,
  feeBooks,
  type AccountBalance,
  type BookedMovement,
  type FeeBook,
} from '@/db/queries/ledgerBook'
import { authorize } from '@/lib/auth/authorize'
import type { ActingContext } from '../context'
import { mayHandleFees } from './policy'

export interface LedgerView {
  balances: AccountBalance[]
  fees: FeeBook[]
  movements: BookedMovement[]
  check: { movements: number; unbalanced: number }
}

/** The books of fees: accounts, fees and movements, with the check that each movement and the whole balance. */
export async function readLedger(ctx: ActingContext): Promise<LedgerView> {
  authorize(mayHandleFees(ctx.actor))
  const [balances, fees, movements, check] = await Promise.all([
    accountBalances(ctx.db),
    feeBooks(ctx.db),
    bookedMovements(ctx.db),
    balanceCheck(ctx.db),
  ])
  return { balances, fees, movements, check }
}
