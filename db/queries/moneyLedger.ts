import type { Database } from '../client.ts'
import type { MoneyEntriesRow } from '../tables.ts'

export type MoneyAccount = MoneyEntriesRow['account']

export interface MoneyMovement {
  /** Unique name of the movement, e.g. 'billed:12': written twice, it fails. */
  movement: string
  feeId: number
  from: MoneyAccount
  to: MoneyAccount
  amountMinor: number
  currency: string
}

/** Two entries of the money ledger that sum to zero; nothing where nothing moves. */
export async function moveMoney(db: Database, move: MoneyMovement): Promise<void> {
  if (move.amountMinor === 0) return
  const common = { movement: move.movement, fee_id: move.feeId, currency: move.currency }
  await db('money_entries').insert([
    { ...common, account: move.to, amount_minor: move.amountMinor },
    { ...common, account: move.from, amount_minor: -move.amountMinor },
  ])
}

/** Whether a movement is in the books already. */
export async function isMoved(db: Database, movement: string): Promise<boolean> {
  return (await db('money_entries').where({ movement }).first('id')) !== undefined
}

/** Where a movement put its money; null when it is not in the books. */
export async function movedFrom(db: Database, movement: string): Promise<MoneyAccount | null> {
  const row = await db('money_entries').where({ movement }).andWhere('amount_minor', '<', 0).first('account')
  return row?.account ?? null
}
