import { holdsAlready, insertDatedGrant } from '@/db/queries/roleGrants'
import { seatOnPanel } from '@/db/queries/panelSeats'
import type { Context } from '../context'
import type { Role } from '../actor'

export interface RoleToGive {
  personId: number
  role: Role
  callId: number | null
  panelId: number | null
  instrumentId: number | null
  /** Null for now. */
  fromAt: Date | null
  /** Null for no end. */
  untilAt: Date | null
  grantedBy: number | null
}

/**
 * Gives a role and the seat that belongs to it, within the caller's transaction. A chair also reads and scores.
 * Returns the seat on the panel, null where there is none.
 */
export async function giveRole(
  tx: Context,
  given: RoleToGive,
): Promise<'chair' | 'deputy' | 'member' | null> {
  if (!(await holdsAlready(tx.db, given))) await insertDatedGrant(tx.db, given)
  if (given.panelId === null) return null
  const reads = { ...given, role: 'reviewer' as const }
  if (given.role === 'chair' && !(await holdsAlready(tx.db, reads))) await insertDatedGrant(tx.db, reads)
  const { panelId, personId } = given
  return seatOnPanel(tx.db, { panelId, personId, isChair: given.role === 'chair' })
}
