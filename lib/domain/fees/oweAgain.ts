import { findFee, setDueAt, updateFee } from '@/db/queries/fees'
import type { FeesRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import type { Context } from '../context'

/** Makes a fee owed again, until a moment. The caller holds its lock and moves the money. */
export async function oweAgain(tx: Context, fee: FeesRow, dueAt: Date): Promise<void> {
  if (!(await updateFee(tx.db, fee, 'due')))
    throw refuse.closed('The fee has changed a moment ago. Load the page again.')
  const standing = await findFee(tx.db, fee.id)
  if (standing) await setDueAt(tx.db, standing, dueAt)
}
